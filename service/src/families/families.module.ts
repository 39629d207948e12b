import { join } from 'node:path';
import { Logger, Module, type OnModuleInit } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { Case } from '../cases/case.model';
import { ConfirmedFault } from '../cases/confirmed-fault.model';
import { PROJECT_ROOT } from '../config/settings';
import { FamiliesController } from './families.controller';
import { FamiliesService } from './families.service';
import { Family } from './family.model';
import { FamilyVersion } from './family-version.model';
import { readNetlistFiles } from './netlist-files';

@Module({
  imports: [SequelizeModule.forFeature([Family, FamilyVersion, Case, ConfirmedFault])],
  controllers: [FamiliesController],
  providers: [FamiliesService],
  exports: [FamiliesService, SequelizeModule],
})
export class FamiliesModule implements OnModuleInit {
  private readonly logger = new Logger(FamiliesModule.name);

  constructor(private readonly families: FamiliesService) {}

  /** Takes the netlists that ship with the project. */
  async onModuleInit(): Promise<void> {
    const { files, refused } = readNetlistFiles(join(PROJECT_ROOT, 'netlists'));
    for (const { file, reason } of refused)
      this.logger.warn(`netlists/${file} was refused: ${reason}`);
    for (const file of files) await this.families.takeFile(file);
  }
}
