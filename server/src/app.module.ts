import { Module, RequestMethod } from '@nestjs/common';
import type { DynamicModule } from '@nestjs/common';
import { APP_FILTER, APP_GUARD, APP_PIPE, DiscoveryModule } from '@nestjs/core';
import { ServeStaticModule } from '@nestjs/serve-static';
import { LoggerModule } from 'nestjs-pino';
import { AnalysesModule } from './analyses/analyses.module';
import { AuthModule } from './auth/auth.module';
import { AccessCheck } from './common/access/access-check';
import { ApiErrorFilter } from './common/filters/api-error.filter';
import { AccessGuard } from './common/guards/access.guard';
import { createValidationPipe } from './common/pipes/validation.pipe';
import { CompanyModule } from './company/company.module';
import { ConfigModule } from './config/config.module';
import type { AppConfig } from './config/environment';
import { loggerOptions } from './config/logger-options';
import { staticOptions } from './config/static-options';
import { DatabaseModule } from './database/database.module';
import { HealthModule } from './health/health.module';
import { HousekeepingModule } from './housekeeping/housekeeping.module';
import { IdempotencyModule } from './idempotency/idempotency.module';
import { JobsModule } from './jobs/jobs.module';
import { PeopleModule } from './people/people.module';
import { RunsModule } from './runs/runs.module';

@Module({})
export class AppModule {
  static register(config: AppConfig): DynamicModule {
    return {
      module: AppModule,
      imports: [
        ConfigModule.register(config),
        LoggerModule.forRoot({
          pinoHttp: loggerOptions(config),
          forRoutes: [{ path: '{*splat}', method: RequestMethod.ALL }],
        }),
        DatabaseModule.register(),
        DiscoveryModule,
        IdempotencyModule,
        AuthModule,
        PeopleModule,
        CompanyModule,
        JobsModule,
        RunsModule,
        AnalysesModule,
        HealthModule,
        HousekeepingModule,
        ...(config.clientDir ? [ServeStaticModule.forRoot(staticOptions(config.clientDir))] : []),
      ],
      providers: [
        AccessCheck,
        { provide: APP_GUARD, useClass: AccessGuard },
        { provide: APP_PIPE, useFactory: createValidationPipe },
        { provide: APP_FILTER, useClass: ApiErrorFilter },
      ],
    };
  }
}
