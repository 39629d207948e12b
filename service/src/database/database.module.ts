import { mkdirSync } from 'node:fs';
import { dirname } from 'node:path';
import { Global, Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { Sequelize } from 'sequelize-typescript';
import { SETTINGS, type Settings } from '../config/settings';
import { DatabaseService } from './database.service';
import { runMigrations } from './migrator';
import { tunedSqlite } from './tuned-sqlite';

/**
 * The database file. Migrations run while the service is put together, so that every module finds
 * the schema it expects.
 */
@Global()
@Module({
  imports: [
    SequelizeModule.forRootAsync({
      inject: [SETTINGS],
      useFactory: ({ databaseFile }: Settings) => {
        mkdirSync(dirname(databaseFile), { recursive: true });
        return {
          dialect: 'sqlite' as const,
          dialectModule: tunedSqlite,
          storage: databaseFile,
          autoLoadModels: true,
          synchronize: false,
          logging: false,
          define: { underscored: true },
        };
      },
    }),
  ],
  providers: [
    {
      provide: DatabaseService,
      inject: [Sequelize],
      useFactory: async (sequelize: Sequelize) => {
        await runMigrations(sequelize);
        return new DatabaseService(sequelize);
      },
    },
  ],
  exports: [DatabaseService],
})
export class DatabaseModule {}
