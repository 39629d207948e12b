import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { RefreshToken } from '../auth/refresh-token.model';
import { PeopleController } from './people.controller';
import { PeopleService } from './people.service';
import { Person } from './person.model';
import { Shop } from './shop.model';

@Module({
  imports: [SequelizeModule.forFeature([Person, Shop, RefreshToken])],
  controllers: [PeopleController],
  providers: [PeopleService],
  exports: [SequelizeModule],
})
export class PeopleModule {}
