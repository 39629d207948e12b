import { Module } from '@nestjs/common';
import { CasesModule } from '../../cases/cases.module';
import { FamiliesModule } from '../../families/families.module';
import { PeopleModule } from '../../people/people.module';
import { SeedService } from './seed.service';

@Module({
  imports: [PeopleModule, FamiliesModule, CasesModule],
  providers: [SeedService],
  exports: [SeedService],
})
export class SeedModule {}
