import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { PeopleModule } from '../people/people.module';
import { JobQueries } from './job-queries';
import { JobsController } from './jobs.controller';
import { JobsService } from './jobs.service';
import { JobPerson } from './models/job-person.model';
import { Job } from './models/job.model';

@Module({
  imports: [SequelizeModule.forFeature([Job, JobPerson]), PeopleModule],
  controllers: [JobsController],
  providers: [JobQueries, JobsService],
  exports: [JobsService],
})
export class JobsModule {}
