import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { CasesModule } from '../cases/cases.module';
import { FamiliesModule } from '../families/families.module';
import { PartsDataModule } from '../parts-data/parts-data.module';
import { ReadingsModule } from '../readings/readings.module';
import { RulesModule } from '../rules/rules.module';
import { DiagnosisController } from './diagnosis.controller';
import { DiagnosisRow } from './diagnosis.model';
import { DiagnosisService } from './diagnosis.service';
import { PoolModule } from './pool.module';

@Module({
  imports: [
    PoolModule,
    CasesModule,
    ReadingsModule,
    FamiliesModule,
    PartsDataModule,
    RulesModule,
    SequelizeModule.forFeature([DiagnosisRow]),
  ],
  controllers: [DiagnosisController],
  providers: [DiagnosisService],
})
export class DiagnosisModule {}
