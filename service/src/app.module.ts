import { Module } from '@nestjs/common';
import { ThrottlerGuard, ThrottlerModule } from '@nestjs/throttler';
import { APP_GUARD } from '@nestjs/core';
import { AuthModule } from './auth/auth.module';
import { CasesModule } from './cases/cases.module';
import { CircuitsModule } from './circuits/circuits.module';
import { SettingsModule } from './config/settings.module';
import { DatabaseModule } from './database/database.module';
import { SeedModule } from './database/seed/seed.module';
import { DiagnosisModule } from './diagnosis/diagnosis.module';
import { FamiliesModule } from './families/families.module';
import { HealthModule } from './health/health.module';
import { MetersModule } from './meters/meters.module';
import { PartsDataModule } from './parts-data/parts-data.module';
import { PeopleModule } from './people/people.module';
import { ReadingsModule } from './readings/readings.module';
import { RulesModule } from './rules/rules.module';

/** Far above what a bench needs; stops a runaway script. */
const REQUESTS = [{ name: 'default', limit: 1200, ttl: 60_000 }];

@Module({
  imports: [
    SettingsModule,
    DatabaseModule,
    ThrottlerModule.forRoot({ throttlers: REQUESTS }),
    AuthModule,
    PeopleModule,
    PartsDataModule,
    RulesModule,
    FamiliesModule,
    CircuitsModule,
    CasesModule,
    ReadingsModule,
    MetersModule,
    DiagnosisModule,
    SeedModule,
    HealthModule,
  ],
  providers: [{ provide: APP_GUARD, useClass: ThrottlerGuard }],
})
export class AppModule {}
