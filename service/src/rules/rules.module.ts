import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { RuleRow } from './rule.model';
import { RulesController } from './rules.controller';
import { RulesService } from './rules.service';

@Module({
  imports: [SequelizeModule.forFeature([RuleRow])],
  controllers: [RulesController],
  providers: [RulesService],
  exports: [RulesService],
})
export class RulesModule {}
