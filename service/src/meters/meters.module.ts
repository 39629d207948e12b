import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { MeterRow } from './meter.model';
import { MetersController } from './meters.controller';
import { MetersService } from './meters.service';

@Module({
  imports: [SequelizeModule.forFeature([MeterRow])],
  controllers: [MetersController],
  providers: [MetersService],
  exports: [MetersService],
})
export class MetersModule {}
