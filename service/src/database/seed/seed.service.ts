import { Inject, Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import bcrypt from 'bcryptjs';
import type { Transaction } from 'sequelize';
import { Case } from '../../cases/case.model';
import { ConfirmedFault } from '../../cases/confirmed-fault.model';
import { SETTINGS, type Settings } from '../../config/settings';
import { Family } from '../../families/family.model';
import { FamilyVersion } from '../../families/family-version.model';
import { Person } from '../../people/person.model';
import { Shop } from '../../people/shop.model';
import { placeOf, ReadingRow } from '../../readings/reading.model';
import { DatabaseService } from '../database.service';
import { type DemoCase, OPEN_CASES, SOLVED_CASES } from './demo-cases';
import { DEMO_PEOPLE, DEMO_SHOP } from './demo-people';

const DAY = 86_400_000;

/** Makes the demo shop on an empty database. Everything in it is invented. */
@Injectable()
export class SeedService {
  constructor(
    private readonly database: DatabaseService,
    @Inject(SETTINGS) private readonly settings: Settings,
    @InjectModel(Shop) private readonly shops: typeof Shop,
    @InjectModel(Person) private readonly people: typeof Person,
    @InjectModel(Family) private readonly families: typeof Family,
    @InjectModel(FamilyVersion) private readonly versions: typeof FamilyVersion,
    @InjectModel(Case) private readonly cases: typeof Case,
    @InjectModel(ConfirmedFault) private readonly faults: typeof ConfirmedFault,
    @InjectModel(ReadingRow) private readonly readings: typeof ReadingRow,
  ) {}

  /**
   * Fills an empty database with the demo shop, unless SEED is none.
   *
   * @returns true when the database holds the demo shop, made now or before.
   */
  async seedIfEmpty(): Promise<boolean> {
    const isEmpty = (await this.people.count()) === 0;
    if (isEmpty && this.settings.seed === 'demo') await this.seed();
    const owner = await this.people.findOne({ where: { email: DEMO_PEOPLE[0].email } });
    return owner !== null;
  }

  private async seed(): Promise<void> {
    const hashes = await Promise.all(DEMO_PEOPLE.map(({ password }) => bcrypt.hash(password, 10)));
    await this.database.write(async (transaction) => {
      await this.shops.create({ name: DEMO_SHOP }, { transaction });
      const people: Person[] = [];
      for (const [i, { name, email, role }] of DEMO_PEOPLE.entries()) {
        people.push(
          await this.people.create({ name, email, role, passwordHash: hashes[i] }, { transaction }),
        );
      }
      const [, senior, technician, trainee] = people;
      let number = 0;
      for (const demo of SOLVED_CASES) {
        number += 1;
        await this.addCase(demo, number, number % 3 === 0 ? senior : technician, transaction);
      }
      for (const [i, demo] of OPEN_CASES.entries()) {
        number += 1;
        await this.addCase(demo, number, i === 1 ? trainee : technician, transaction);
      }
    });
  }

  private async addCase(
    demo: DemoCase,
    number: number,
    by: Person,
    transaction: Transaction,
  ): Promise<void> {
    const family = await this.families.findOne({ where: { slug: demo.family }, transaction });
    if (!family) return;
    const newest = await this.versions.findOne({
      where: { familyId: family.id },
      order: [['version', 'DESC']],
      transaction,
    });
    const opened = new Date(Date.now() - demo.daysAgo * DAY);
    const isClosed = demo.state === 'closed';
    const made = await this.cases.create(
      {
        number: `${opened.getFullYear()}-${String(number).padStart(4, '0')}`,
        setName: demo.set,
        complaint: demo.complaint,
        earlierWork: demo.earlierWork ?? '',
        state: demo.state,
        lineVolts: demo.lineVolts,
        familyId: family.id,
        familyVersion: newest!.version,
        netlist: newest!.netlist,
        asFound: demo.asFound ?? [],
        openedById: by.id,
        assignedToId: by.id,
        outcome: demo.outcome ?? null,
        closingNote: demo.note ?? null,
        closedAt: isClosed ? new Date(opened.getTime() + 3 * DAY) : null,
        closedById: isClosed ? by.id : null,
        createdAt: opened,
      },
      { transaction },
    );
    for (const { part, mode } of demo.faults ?? []) {
      await this.faults.create({ caseId: made.id, part, mode }, { transaction });
    }
    for (const reading of demo.readings) {
      await this.readings.create(
        {
          caseId: made.id,
          take: reading.take,
          place: placeOf(reading),
          red: reading.at?.[0] ?? null,
          black: reading.at?.[1] ?? null,
          part: reading.part ?? null,
          value: String(reading.value),
          takenById: by.id,
        },
        { transaction },
      );
    }
  }
}
