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
import type { Page, Run, RunListItem } from '@fairlead/shared';
import { Can } from '../common/decorators/access';
import { CurrentViewer } from '../common/decorators/viewer';
import { IdPipe } from '../common/pipes/id.pipe';
import type { Viewer } from '../common/viewer';
import { CreateRunDto } from './dto/create-run.dto';
import { ListRunsDto } from './dto/list-runs.dto';
import { SaveRunDto } from './dto/save-run.dto';
import { UpdateRunDto } from './dto/update-run.dto';
import { RunsService } from './runs.service';

@Controller()
export class RunsController {
  constructor(private readonly runs: RunsService) {}

  @Can('run.read')
  @Get('jobs/:jobId/runs')
  list(
    @CurrentViewer() viewer: Viewer,
    @Param('jobId', IdPipe) jobId: string,
    @Query() query: ListRunsDto,
  ): Promise<Page<RunListItem>> {
    return this.runs.list(viewer, jobId, query);
  }

  @Can('run.create')
  @Post('jobs/:jobId/runs')
  create(
    @CurrentViewer() viewer: Viewer,
    @Param('jobId', IdPipe) jobId: string,
    @Body() body: CreateRunDto,
  ): Promise<Run> {
    return this.runs.create(viewer, jobId, body);
  }

  @Can('run.read')
  @Get('runs/:runId')
  get(@CurrentViewer() viewer: Viewer, @Param('runId', IdPipe) runId: string): Promise<Run> {
    return this.runs.get(viewer, runId);
  }

  @Can('run.update')
  @Patch('runs/:runId')
  update(
    @CurrentViewer() viewer: Viewer,
    @Param('runId', IdPipe) runId: string,
    @Body() body: UpdateRunDto,
  ): Promise<Run> {
    return this.runs.update(viewer, runId, body);
  }

  @Can('run.update')
  @Put('runs/:runId/document')
  save(
    @CurrentViewer() viewer: Viewer,
    @Param('runId', IdPipe) runId: string,
    @Body() body: SaveRunDto,
  ): Promise<Run> {
    return this.runs.save(viewer, runId, body);
  }

  @Can('run.delete')
  @Delete('runs/:runId')
  @HttpCode(204)
  remove(@CurrentViewer() viewer: Viewer, @Param('runId', IdPipe) runId: string): Promise<void> {
    return this.runs.remove(viewer, runId);
  }

  @Can('run.delete')
  @Post('runs/:runId/restore')
  @HttpCode(200)
  restore(@CurrentViewer() viewer: Viewer, @Param('runId', IdPipe) runId: string): Promise<Run> {
    return this.runs.restore(viewer, runId);
  }
}
