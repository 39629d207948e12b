import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { CasesModule } from '../cases/cases.module';
import { MetersModule } from '../meters/meters.module';
import { ReadingRow } from './reading.model';
import { ReadingsController } from './readings.controller';
import { ReadingsService } from './readings.service';

@Module({
  imports: [CasesModule, MetersModule, SequelizeModule.forFeature([ReadingRow])],
  controllers: [ReadingsController],
  providers: [ReadingsService],
  exports: [ReadingsService],
})
export class ReadingsModule {}
