import { Module } from '@nestjs/common';
import { DiagnosisPool } from './diagnosis-pool';

@Module({ providers: [DiagnosisPool], exports: [DiagnosisPool] })
export class PoolModule {}
