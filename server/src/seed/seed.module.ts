import { Module } from '@nestjs/common';
import { AuthModule } from '../auth/auth.module';
import { JobsModule } from '../jobs/jobs.module';
import { PeopleModule } from '../people/people.module';
import { RunsModule } from '../runs/runs.module';
import { DemoSeeder } from './demo-seeder';

@Module({
  imports: [AuthModule, JobsModule, PeopleModule, RunsModule],
  providers: [DemoSeeder],
})
export class SeedModule {}
