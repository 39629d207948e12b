import { Module } from '@nestjs/common';
import { PoolModule } from '../diagnosis/pool.module';
import { CircuitsController } from './circuits.controller';
import { CircuitsService } from './circuits.service';

@Module({ imports: [PoolModule], controllers: [CircuitsController], providers: [CircuitsService] })
export class CircuitsModule {}
