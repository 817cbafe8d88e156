import { Global, Module } from '@nestjs/common';
import type { DynamicModule } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { APP_CONFIG } from '../config/config.module';
import type { AppConfig } from '../config/environment';
import { migrateUp } from './migrator';
import { MODELS } from './models';
import { sequelizeOptions } from './sequelize-options';
import { useTransactionContext } from './transaction-context';
import { Transactions } from './transactions';

/** Migrates before the first connection of the pool opens, so no query ever meets an older schema. */
@Global()
@Module({})
export class DatabaseModule {
  static register(): DynamicModule {
    useTransactionContext();
    return {
      module: DatabaseModule,
      imports: [
        SequelizeModule.forRootAsync({
          inject: [APP_CONFIG],
          useFactory: async ({ database }: AppConfig) => {
            await migrateUp(database);
            return { ...sequelizeOptions(database), models: [...MODELS], retryAttempts: 0 };
          },
        }),
      ],
      providers: [Transactions],
      exports: [Transactions],
    };
  }
}
