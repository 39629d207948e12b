import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { PartType } from './part-type.model';
import { PartsDataController } from './parts-data.controller';
import { PartsDataService } from './parts-data.service';

@Module({
  imports: [SequelizeModule.forFeature([PartType])],
  controllers: [PartsDataController],
  providers: [PartsDataService],
  exports: [PartsDataService],
})
export class PartsDataModule {}
