import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { UniqueConstraintError } from 'sequelize';
import { LIMITS } from '@fairlead/shared';
import type {
  CreateRunBody,
  Page,
  Run as RunAnswer,
  RunDocument,
  RunListItem,
  SaveRunBody,
  UpdateRunBody,
} from '@fairlead/shared';
import { alreadyExists, forbidden, notFound, staleVersion } from '../common/api-exception';
import { readSort } from '../common/lists/keyset';
import { pageOf } from '../common/lists/page-of';
import { newId } from '../common/new-id';
import type { Viewer } from '../common/viewer';
import { CompanySettingsService } from '../company/company-settings.service';
import { Transactions } from '../database/transactions';
import { canCreateRuns } from '../jobs/job.policy';
import { JobsService, factsOf } from '../jobs/jobs.service';
import { PeopleService } from '../people/people.service';
import { analyzeDocument, readDocument } from './analyze-document';
import type { ListRunsDto } from './dto/list-runs.dto';
import { RunRevision } from './models/run-revision.model';
import { Run } from './models/run.model';
import { documentColumns } from './revision-columns';
import { canDeleteRun, canReadRun, canUpdateRun } from './run.policy';
import type { RunFacts } from './run.policy';
import { presentRun, presentRunListItem } from './run.presenter';
import type { RunView } from './run.presenter';
import { RUN_SORT_COLUMNS, RunQueries } from './run-queries';

const DEFAULT_PAGE = 50;

@Injectable()
export class RunsService {
  constructor(
    @InjectModel(Run) private readonly runs: typeof Run,
    @InjectModel(RunRevision) private readonly revisions: typeof RunRevision,
    private readonly queries: RunQueries,
    private readonly jobs: JobsService,
    private readonly people: PeopleService,
    private readonly settings: CompanySettingsService,
    private readonly transactions: Transactions,
  ) {}

  async list(viewer: Viewer, jobId: string, query: ListRunsDto): Promise<Page<RunListItem>> {
    const job = factsOf(await this.jobs.load(viewer, jobId));
    const sort = readSort(query.sort ?? '-updatedAt', RUN_SORT_COLUMNS);
    const limit = Math.min(query.limit ?? DEFAULT_PAGE, LIMITS.pageSize);
    const [rows, total] = await Promise.all([
      this.queries.page(viewer.companyId, jobId, query, sort, limit),
      this.queries.count(viewer.companyId, jobId, query),
    ]);
    return pageOf(rows, limit, sort, total, (row) => presentRunListItem(row, job, viewer));
  }

  async get(viewer: Viewer, runId: string): Promise<RunAnswer> {
    return this.present(await this.load(viewer, runId), viewer);
  }

  async create(viewer: Viewer, jobId: string, body: CreateRunBody): Promise<RunAnswer> {
    const job = await this.jobs.load(viewer, jobId);
    if (!canCreateRuns(viewer, factsOf(job))) throw forbidden();
    const { companyId, userId } = viewer;
    const analyzed = readDocument(body.document, await this.settings.of(companyId));
    const revisionId = newId();
    const now = new Date();
    await this.unlessTaken(body, () =>
      this.transactions.run(async () => {
        await this.runs.create({
          companyId,
          id: body.id,
          jobId,
          area: body.area ?? '',
          system: body.system ?? '',
          currentRevisionId: revisionId,
          createdBy: userId,
          createdAt: now,
          deletedAt: null,
        });
        await this.revisions.create({
          ...documentColumns(analyzed),
          companyId,
          id: revisionId,
          runId: body.id,
          listedJobId: jobId,
          number: 1,
          state: 'draft',
          version: 1,
          createdAt: now,
          savedAt: now,
          savedBy: userId,
        });
      }),
    );
    return this.get(viewer, body.id);
  }

  async save(viewer: Viewer, runId: string, body: SaveRunBody): Promise<RunAnswer> {
    const view = await this.load(viewer, runId);
    if (!canUpdateRun(viewer, factsOfRun(view))) throw forbidden();
    const analyzed = readDocument(body.document, await this.settings.of(viewer.companyId));
    const saved = await this.unlessTaken({ ...body, id: runId }, async () => {
      const [count] = await this.revisions.update(
        {
          ...documentColumns(analyzed),
          version: body.baseVersion + 1,
          savedAt: new Date(),
          savedBy: viewer.userId,
        },
        {
          where: {
            companyId: viewer.companyId,
            id: view.revision.id,
            version: body.baseVersion,
            state: 'draft',
          },
        },
      );
      return count > 0;
    });
    const now = await this.get(viewer, runId);
    if (!saved) throw staleVersion(now);
    return now;
  }

  /** Where the run belongs; the drawing has its own way in. */
  async update(viewer: Viewer, runId: string, body: UpdateRunBody): Promise<RunAnswer> {
    const view = await this.load(viewer, runId);
    if (!canUpdateRun(viewer, factsOfRun(view))) throw forbidden();
    const { companyId, userId } = viewer;
    await this.transactions.run(async () => {
      await this.runs.update(body, { where: { companyId, id: runId } });
      await this.revisions.update(
        { savedAt: new Date(), savedBy: userId },
        { where: { companyId, id: view.revision.id } },
      );
    });
    return this.get(viewer, runId);
  }

  async remove(viewer: Viewer, runId: string): Promise<void> {
    const view = await this.load(viewer, runId);
    if (!canDeleteRun(viewer, factsOfRun(view))) throw forbidden();
    await this.setListed(viewer, view, { deletedAt: new Date(), listedJobId: null });
  }

  /** Undo of `remove`; restoring what stands changes nothing. */
  async restore(viewer: Viewer, runId: string): Promise<RunAnswer> {
    const view = await this.load(viewer, runId, { deleted: true });
    if (!canDeleteRun(viewer, factsOfRun(view))) throw forbidden();
    const { tag } = view.revision;
    await this.unlessTaken({ id: runId, document: { tag } }, () =>
      this.setListed(viewer, view, { deletedAt: null, listedJobId: view.job.id }),
    );
    return this.get(viewer, runId);
  }

  private async setListed(
    { companyId }: Viewer,
    { run, revision }: RunView,
    { deletedAt, listedJobId }: { deletedAt: Date | null; listedJobId: string | null },
  ): Promise<void> {
    await this.transactions.run(async () => {
      await this.runs.update({ deletedAt }, { where: { companyId, id: run.id } });
      await this.revisions.update({ listedJobId }, { where: { companyId, id: revision.id } });
    });
  }

  /** A run the viewer may see, or 404: another company's is as missing as one that never was. */
  private async load(viewer: Viewer, runId: string, { deleted = false } = {}): Promise<RunView> {
    const { companyId } = viewer;
    const where = { companyId, id: runId, ...(deleted ? {} : { deletedAt: null }) };
    const run = await this.runs.findOne({ where });
    if (!run) throw notFound();
    const [jobView, revision] = await Promise.all([
      this.jobs.load(viewer, run.jobId),
      this.revisions.findOne({
        where: { companyId, id: run.currentRevisionId },
        rejectOnEmpty: true,
      }),
    ]);
    const jobFacts = factsOf(jobView);
    if (!canReadRun(viewer, { job: jobFacts, state: revision.state })) throw notFound();
    const savedByName = await this.people.nameOf(revision.savedBy);
    return { run, revision, job: jobView.job, jobFacts, savedByName };
  }

  private async present(view: RunView, viewer: Viewer): Promise<RunAnswer> {
    const settings = await this.settings.of(viewer.companyId);
    return presentRun(view, analyzeDocument(view.revision.document, settings), viewer);
  }

  /** The database decides whether a tag or an id is free, so that two requests cannot both take it. */
  private async unlessTaken<T>(
    { id, document }: { id: string; document: Pick<RunDocument, 'tag'> },
    act: () => Promise<T>,
  ): Promise<T> {
    try {
      return await act();
    } catch (thrown) {
      if (!(thrown instanceof UniqueConstraintError)) throw thrown;
      if (JSON.stringify(thrown.fields).includes('tag')) {
        throw alreadyExists('/document/tag', document.tag);
      }
      throw alreadyExists('/id', id);
    }
  }
}

function factsOfRun({ jobFacts, revision }: RunView): RunFacts {
  return { job: jobFacts, state: revision.state };
}
