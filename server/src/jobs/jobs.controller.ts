import {
  Body,
  Controller,
  Delete,
  Get,
  HttpCode,
  Param,
  Patch,
  Post,
  Put,
  Query,
} from '@nestjs/common';
import type { Job, Page } from '@fairlead/shared';
import { Can } from '../common/decorators/access';
import { CurrentViewer } from '../common/decorators/viewer';
import { IdPipe } from '../common/pipes/id.pipe';
import type { Viewer } from '../common/viewer';
import { CreateJobDto } from './dto/create-job.dto';
import { ListJobsDto } from './dto/list-jobs.dto';
import { UpdateJobDto } from './dto/update-job.dto';
import { JobsService } from './jobs.service';

@Controller('jobs')
export class JobsController {
  constructor(private readonly jobs: JobsService) {}

  @Can('job.read')
  @Get()
  list(@CurrentViewer() viewer: Viewer, @Query() query: ListJobsDto): Promise<Page<Job>> {
    return this.jobs.list(viewer, query);
  }

  @Can('job.create')
  @Post()
  create(@CurrentViewer() viewer: Viewer, @Body() body: CreateJobDto): Promise<Job> {
    return this.jobs.create(viewer, body);
  }

  @Can('job.read')
  @Get(':jobId')
  get(@CurrentViewer() viewer: Viewer, @Param('jobId', IdPipe) jobId: string): Promise<Job> {
    return this.jobs.get(viewer, jobId);
  }

  @Can('job.update')
  @Patch(':jobId')
  update(
    @CurrentViewer() viewer: Viewer,
    @Param('jobId', IdPipe) jobId: string,
    @Body() body: UpdateJobDto,
  ): Promise<Job> {
    return this.jobs.update(viewer, jobId, body);
  }

  @Can('job.delete')
  @Delete(':jobId')
  @HttpCode(204)
  remove(@CurrentViewer() viewer: Viewer, @Param('jobId', IdPipe) jobId: string): Promise<void> {
    return this.jobs.remove(viewer, jobId);
  }

  @Can('job.delete')
  @Post(':jobId/restore')
  @HttpCode(200)
  restore(@CurrentViewer() viewer: Viewer, @Param('jobId', IdPipe) jobId: string): Promise<Job> {
    return this.jobs.restore(viewer, jobId);
  }

  @Can('job.assign')
  @Put(':jobId/people/:userId')
  assign(
    @CurrentViewer() viewer: Viewer,
    @Param('jobId', IdPipe) jobId: string,
    @Param('userId', IdPipe) userId: string,
  ): Promise<Job> {
    return this.jobs.assign(viewer, jobId, userId);
  }

  @Can('job.assign')
  @Delete(':jobId/people/:userId')
  unassign(
    @CurrentViewer() viewer: Viewer,
    @Param('jobId', IdPipe) jobId: string,
    @Param('userId', IdPipe) userId: string,
  ): Promise<Job> {
    return this.jobs.unassign(viewer, jobId, userId);
  }
}
