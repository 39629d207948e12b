import 'reflect-metadata';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { AppModule } from '../app.module';
import { describeApi, setUp } from '../app-setup';
import { PROJECT_ROOT } from '../config/settings';

/** Writes the API description without a port and without touching a real database. */
async function main(): Promise<void> {
  const folder = mkdtempSync(join(tmpdir(), 'ohmstead-'));
  process.env.DATABASE_FILE = join(folder, 'openapi.sqlite');
  const app = await NestFactory.create<NestExpressApplication>(AppModule, { logger: false });
  const description = describeApi(setUp(app));
  writeFileSync(
    join(PROJECT_ROOT, 'service', 'openapi.json'),
    `${JSON.stringify(description, null, 2)}\n`,
  );
  await app.close();
  rmSync(folder, { recursive: true, force: true });
}

void main();
