import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { UniqueConstraintError } from 'sequelize';
import { LIMITS } from '@fairlead/shared';
import type { CreateJobBody, Job as JobAnswer, Page, UpdateJobBody } from '@fairlead/shared';
import { alreadyExists, forbidden, notFound, staleVersion } from '../common/api-exception';
import { readSort } from '../common/lists/keyset';
import { pageOf } from '../common/lists/page-of';
import type { Viewer } from '../common/viewer';
import { Transactions } from '../database/transactions';
import { PeopleService } from '../people/people.service';
import type { ListJobsDto } from './dto/list-jobs.dto';
import {
  canAssignPeople,
  canCreateJobs,
  canDeleteJob,
  canReadJob,
  canUpdateJob,
} from './job.policy';
import { presentJob } from './job.presenter';
import type { JobView } from './job.presenter';
import { JOB_SORT_COLUMNS, JobQueries } from './job-queries';
import { JobPerson } from './models/job-person.model';
import { Job } from './models/job.model';

const DEFAULT_PAGE = 50;

@Injectable()
export class JobsService {
  constructor(
    @InjectModel(Job) private readonly jobs: typeof Job,
    @InjectModel(JobPerson) private readonly jobPeople: typeof JobPerson,
    private readonly queries: JobQueries,
    private readonly people: PeopleService,
    private readonly transactions: Transactions,
  ) {}

  async list(viewer: Viewer, query: ListJobsDto): Promise<Page<JobAnswer>> {
    const sort = readSort(query.sort ?? '-updatedAt', JOB_SORT_COLUMNS);
    const limit = Math.min(query.limit ?? DEFAULT_PAGE, LIMITS.pageSize);
    const rows = await this.queries.page(viewer, query, sort, limit);
    const ids = rows.map(({ id }) => id);
    const [total, people, runCounts] = await Promise.all([
      this.queries.count(viewer, query),
      this.queries.peopleOf(viewer.companyId, ids),
      this.queries.runCountsOf(viewer.companyId, ids),
    ]);
    return pageOf(rows, limit, sort, total, (job) =>
      presentJob({ job, people: people.get(job.id) ?? [] }, runCounts.get(job.id) ?? 0, viewer),
    );
  }

  async get(viewer: Viewer, jobId: string): Promise<JobAnswer> {
    const view = await this.load(viewer, jobId);
    const runCounts = await this.queries.runCountsOf(viewer.companyId, [jobId]);
    return presentJob(view, runCounts.get(jobId) ?? 0, viewer);
  }

  async create(viewer: Viewer, body: CreateJobBody): Promise<JobAnswer> {
    if (!canCreateJobs(viewer)) throw forbidden();
    const now = new Date();
    const job = await this.unlessTaken(body, () =>
      this.jobs.create({
        companyId: viewer.companyId,
        id: body.id,
        number: body.number,
        name: body.name,
        address: body.address ?? '',
        status: body.status ?? 'active',
        dueDate: body.dueDate ?? null,
        version: 1,
        createdBy: viewer.userId,
        createdAt: now,
        updatedAt: now,
        deletedAt: null,
      }),
    );
    return presentJob({ job, people: [] }, 0, viewer);
  }

  async update(viewer: Viewer, jobId: string, body: UpdateJobBody): Promise<JobAnswer> {
    const view = await this.load(viewer, jobId);
    if (!canUpdateJob(viewer, factsOf(view))) throw forbidden();
    const { baseVersion, ...changes } = body;
    const where = { companyId: viewer.companyId, id: jobId, version: baseVersion, deletedAt: null };
    const [saved] = await this.unlessTaken(body, () =>
      this.jobs.update({ ...changes, version: baseVersion + 1, updatedAt: new Date() }, { where }),
    );
    const now = await this.get(viewer, jobId);
    if (saved === 0) throw staleVersion(now);
    return now;
  }

  async remove(viewer: Viewer, jobId: string): Promise<void> {
    const view = await this.load(viewer, jobId);
    if (!canDeleteJob(viewer, factsOf(view))) throw forbidden();
    await this.jobs.update(
      { deletedAt: new Date() },
      { where: { companyId: viewer.companyId, id: jobId } },
    );
  }

  /** Undo of `remove`; restoring what stands changes nothing. */
  async restore(viewer: Viewer, jobId: string): Promise<JobAnswer> {
    const view = await this.load(viewer, jobId, { deleted: true });
    if (!canDeleteJob(viewer, factsOf(view))) throw forbidden();
    await this.unlessTaken(view.job, () =>
      this.jobs.update({ deletedAt: null }, { where: { companyId: viewer.companyId, id: jobId } }),
    );
    return this.get(viewer, jobId);
  }

  /** Assigning a person twice changes nothing. */
  async assign(viewer: Viewer, jobId: string, userId: string): Promise<JobAnswer> {
    return this.changePeople(viewer, jobId, userId, (key) =>
      this.jobPeople.upsert({ ...key, assignedAt: new Date() }),
    );
  }

  async unassign(viewer: Viewer, jobId: string, userId: string): Promise<JobAnswer> {
    return this.changePeople(viewer, jobId, userId, (where) => this.jobPeople.destroy({ where }));
  }

  /** A job the viewer may see, or 404: another company's is as missing as one that never was. */
  async load(viewer: Viewer, jobId: string, { deleted = false } = {}): Promise<JobView> {
    const { companyId } = viewer;
    const where = { companyId, id: jobId, ...(deleted ? {} : { deletedAt: null }) };
    const [job, people] = await Promise.all([
      this.jobs.findOne({ where }),
      this.queries.peopleOf(companyId, [jobId]),
    ]);
    if (!job) throw notFound();
    const view = { job, people: people.get(jobId) ?? [] };
    if (!canReadJob(viewer, factsOf(view))) throw notFound();
    return view;
  }

  private async changePeople(
    viewer: Viewer,
    jobId: string,
    userId: string,
    act: (key: { companyId: string; jobId: string; userId: string }) => Promise<unknown>,
  ): Promise<JobAnswer> {
    const view = await this.load(viewer, jobId);
    if (!(await this.people.isMember(viewer.companyId, userId))) throw notFound();
    if (!canAssignPeople(viewer, factsOf(view))) throw forbidden();
    return this.transactions.run(async () => {
      await act({ companyId: viewer.companyId, jobId, userId });
      return this.get(viewer, jobId);
    });
  }

  /** The database decides whether a number or an id is free, so that two requests cannot both take it. */
  private async unlessTaken<T>(
    { id, number }: { id?: string; number?: string },
    act: () => Promise<T>,
  ): Promise<T> {
    try {
      return await act();
    } catch (thrown) {
      if (!(thrown instanceof UniqueConstraintError)) throw thrown;
      if (JSON.stringify(thrown.fields).includes('live_number')) {
        throw alreadyExists('/number', number);
      }
      throw alreadyExists('/id', id);
    }
  }
}

export function factsOf({ job, people }: JobView) {
  return { companyId: job.companyId, people: people.map(({ id }) => id) };
}
