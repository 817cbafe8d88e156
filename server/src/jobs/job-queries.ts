import { Injectable } from '@nestjs/common';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import type { JobSort, Person } from '@fairlead/shared';
import { keysetClause, readCursor } from '../common/lists/keyset';
import type { Sort, SortColumn } from '../common/lists/keyset';
import { containing } from '../common/lists/like';
import type { ListedRow } from '../common/lists/page-of';
import type { Viewer } from '../common/viewer';
import type { ListJobsDto } from './dto/list-jobs.dto';
import type { Job } from './models/job.model';

/** Each stands first, after company and deletion, in an index of the table. */
export const JOB_SORT_COLUMNS: Readonly<Record<JobSort, SortColumn>> = {
  updatedAt: { sql: 'j.updated_at', kind: 'time', index: 'jobs_by_updated' },
  number: { sql: 'j.number', kind: 'text', index: 'jobs_by_number' },
  name: { sql: 'j.name', kind: 'text', index: 'jobs_by_name' },
  dueDate: { sql: 'j.due_sort', kind: 'day', index: 'jobs_by_due' },
  status: { sql: 'j.status_rank', kind: 'number', index: 'jobs_by_status' },
};

export type ListedJob = ListedRow & Job;

interface Filter {
  where: string;
  replacements: Record<string, unknown>;
}

/** The reads of jobs that need more than one table. */
@Injectable()
export class JobQueries {
  constructor(private readonly sequelize: Sequelize) {}

  /** One row more than `limit` when another page follows. */
  page(viewer: Viewer, query: ListJobsDto, sort: Sort, limit: number): Promise<ListedJob[]> {
    const filter = filterOf(viewer, query);
    const after = query.cursor ? readCursor(query.cursor, sort) : null;
    const keyset = keysetClause(sort, 'j.id', after);
    return this.sequelize.query<ListedJob>(
      `SELECT j.company_id AS companyId, j.id, j.number, j.name, j.address, j.status,
              j.due_date AS dueDate, j.version, j.created_at AS createdAt,
              j.updated_at AS updatedAt, ${sort.column.sql} AS sortValue
       FROM jobs j FORCE INDEX (${sort.column.index}) WHERE ${filter.where} AND ${keyset.where}
       ORDER BY ${keyset.orderBy} LIMIT :rows`,
      {
        replacements: { ...filter.replacements, ...keyset.replacements, rows: limit + 1 },
        type: QueryTypes.SELECT,
      },
    );
  }

  async count(viewer: Viewer, query: ListJobsDto): Promise<number> {
    const { where, replacements } = filterOf(viewer, query);
    const [row] = await this.sequelize.query<{ total: number }>(
      `SELECT COUNT(*) AS total FROM jobs j WHERE ${where}`,
      { replacements, type: QueryTypes.SELECT },
    );
    return row?.total ?? 0;
  }

  async peopleOf(companyId: string, jobIds: string[]): Promise<Map<string, Person[]>> {
    const people = new Map(jobIds.map((id): [string, Person[]] => [id, []]));
    if (jobIds.length === 0) return people;
    const rows = await this.sequelize.query<Person & { jobId: string }>(
      `SELECT p.job_id AS jobId, u.id, u.name, m.role
       FROM job_people p
       JOIN memberships m ON m.company_id = p.company_id AND m.user_id = p.user_id
       JOIN users u ON u.id = p.user_id
       WHERE p.company_id = :companyId AND p.job_id IN (:jobIds) ORDER BY u.name, u.id`,
      { replacements: { companyId, jobIds }, type: QueryTypes.SELECT },
    );
    for (const { jobId, ...person } of rows) people.get(jobId)?.push(person);
    return people;
  }

  async runCountsOf(companyId: string, jobIds: string[]): Promise<Map<string, number>> {
    if (jobIds.length === 0) return new Map();
    const rows = await this.sequelize.query<{ jobId: string; runs: number }>(
      `SELECT listed_job_id AS jobId, COUNT(*) AS runs
       FROM run_revisions FORCE INDEX (run_revisions_in_status)
       WHERE company_id = :companyId AND listed_job_id IN (:jobIds) GROUP BY listed_job_id`,
      { replacements: { companyId, jobIds }, type: QueryTypes.SELECT },
    );
    return new Map(rows.map(({ jobId, runs }) => [jobId, runs]));
  }
}

/** The rows `canReadJob` allows, said once more in SQL, because a page cannot be filtered after it was cut. */
function filterOf({ companyId, userId, role }: Viewer, query: ListJobsDto): Filter {
  const parts = ['j.company_id = :companyId', 'j.deleted_at IS NULL'];
  if (role === 'crew') {
    parts.push(
      `EXISTS (SELECT 1 FROM job_people p WHERE p.company_id = j.company_id
               AND p.job_id = j.id AND p.user_id = :userId)`,
    );
  }
  if (query.status) parts.push('j.status = :status');
  if (query.search) {
    parts.push(
      `(j.number COLLATE utf8mb4_unicode_ci LIKE :search ESCAPE '!'
        OR j.name LIKE :search ESCAPE '!' OR j.address LIKE :search ESCAPE '!')`,
    );
  }
  return {
    where: parts.join(' AND '),
    replacements: {
      companyId,
      userId,
      status: query.status ?? '',
      search: containing(query.search ?? ''),
    },
  };
}
