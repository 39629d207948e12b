import { createPeople } from './20261201100000-create-people';
import { createFamilies } from './20261201100100-create-families';
import { createCases } from './20261201100200-create-cases';
import { createReadings } from './20261201100300-create-readings';
import { createDiagnoses } from './20261201100400-create-diagnoses';
import { createRules } from './20261201100500-create-rules';
import { createPartsData } from './20261201100600-create-parts-data';
import type { Migration } from './migration';

/** All migrations, oldest first. */
export const MIGRATIONS: Migration[] = [
  createPeople,
  createFamilies,
  createCases,
  createReadings,
  createDiagnoses,
  createRules,
  createPartsData,
];
