import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { FamiliesModule } from '../families/families.module';
import { Person } from '../people/person.model';
import { ReadingRow } from '../readings/reading.model';
import { Case } from './case.model';
import { CasesController } from './cases.controller';
import { CasesService } from './cases.service';
import { CautionAcknowledgement } from './caution-acknowledgement.model';
import { ConfirmedFault } from './confirmed-fault.model';

@Module({
  imports: [
    FamiliesModule,
    SequelizeModule.forFeature([Case, ConfirmedFault, CautionAcknowledgement, ReadingRow, Person]),
  ],
  controllers: [CasesController],
  providers: [CasesService],
  exports: [CasesService, SequelizeModule],
})
export class CasesModule {}
