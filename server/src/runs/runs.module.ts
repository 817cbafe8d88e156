import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { CompanySettingsModule } from '../company/company-settings.module';
import { JobsModule } from '../jobs/jobs.module';
import { PeopleModule } from '../people/people.module';
import { EngineUpgradeService } from './engine-upgrade.service';
import { RunRevision } from './models/run-revision.model';
import { Run } from './models/run.model';
import { RunQueries } from './run-queries';
import { RunsController } from './runs.controller';
import { RunsService } from './runs.service';

@Module({
  imports: [
    SequelizeModule.forFeature([Run, RunRevision]),
    CompanySettingsModule,
    JobsModule,
    PeopleModule,
  ],
  controllers: [RunsController],
  providers: [EngineUpgradeService, RunQueries, RunsService],
  exports: [EngineUpgradeService, RunsService],
})
export class RunsModule {}
