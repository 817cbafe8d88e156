import { Injectable } from '@nestjs/common';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import type { RevisionState, RunSort } from '@fairlead/shared';
import { keysetClause, readCursor } from '../common/lists/keyset';
import type { Sort, SortColumn } from '../common/lists/keyset';
import { containing } from '../common/lists/like';
import type { ListedRow } from '../common/lists/page-of';
import type { ListRunsDto } from './dto/list-runs.dto';
import type { SummaryColumns } from './revision-columns';

/** Each stands first, after company and job, in an index of `run_revisions`. */
export const RUN_SORT_COLUMNS: Readonly<Record<RunSort, SortColumn>> = {
  updatedAt: { sql: 'v.saved_at', kind: 'time', index: 'run_revisions_by_updated' },
  tag: { sql: 'v.tag', kind: 'text', index: 'run_revisions_by_tag' },
  status: { sql: 'v.status_rank', kind: 'number', index: 'run_revisions_by_status' },
  length: { sql: 'v.length_sort', kind: 'number', index: 'run_revisions_by_length' },
  degrees: { sql: 'v.degrees_sort', kind: 'number', index: 'run_revisions_by_degrees' },
  fill: { sql: 'v.fill_sort', kind: 'number', index: 'run_revisions_by_fill' },
};

export interface ListedRun extends ListedRow, Omit<SummaryColumns, 'engineVersion'> {
  jobId: string;
  tag: string;
  title: string;
  area: string;
  system: string;
  number: number;
  state: RevisionState;
  savedAt: Date;
  savedByName: string;
}

/** The reads of runs that need more than one table. */
@Injectable()
export class RunQueries {
  constructor(private readonly sequelize: Sequelize) {}

  /**
   * One row more than `limit` when another page follows. The page is cut from the index alone and joined after: a hundred
   * rows instead of the whole job. The document stays where it is.
   */
  page(
    companyId: string,
    jobId: string,
    query: ListRunsDto,
    sort: Sort,
    limit: number,
  ): Promise<ListedRun[]> {
    const filter = filterOf(companyId, jobId, query);
    const after = query.cursor ? readCursor(query.cursor, sort) : null;
    const keyset = keysetClause(sort, 'v.run_id', after);
    return this.sequelize.query<ListedRun>(
      `SELECT v.run_id AS id, v.listed_job_id AS jobId, v.tag, v.title, r.area, r.system,
              v.number, v.state, v.status, v.length_inches AS lengthInches, v.degrees,
              v.worst_section_degrees AS worstSectionDegrees,
              v.remaining_degrees AS remainingDegrees, v.fill_percent AS fillPercent,
              v.sections, v.pull_points AS pullPoints, v.raceway_type AS racewayType,
              v.trade_size AS tradeSize, v.from_label AS fromLabel, v.to_label AS toLabel,
              v.strip, v.saved_at AS savedAt, u.name AS savedByName,
              ${sort.column.sql} AS sortValue
       FROM (
         SELECT v.company_id, v.id FROM run_revisions v FORCE INDEX (${sort.column.index})
         WHERE ${filter.where} AND ${keyset.where}
         ORDER BY ${keyset.orderBy} LIMIT :rows
       ) page
       JOIN run_revisions v ON v.company_id = page.company_id AND v.id = page.id
       JOIN runs r ON r.company_id = v.company_id AND r.id = v.run_id
       JOIN users u ON u.id = v.saved_by
       ORDER BY ${keyset.orderBy}`,
      {
        replacements: { ...filter.replacements, ...keyset.replacements, rows: limit + 1 },
        type: QueryTypes.SELECT,
      },
    );
  }

  async count(companyId: string, jobId: string, query: ListRunsDto): Promise<number> {
    const { where, replacements } = filterOf(companyId, jobId, query);
    // A search has to read the rows; everything else is counted in the index alone.
    const index = query.search ? '' : 'FORCE INDEX (run_revisions_in_status)';
    const [row] = await this.sequelize.query<{ total: number }>(
      `SELECT COUNT(*) AS total FROM run_revisions v ${index} WHERE ${where}`,
      { replacements, type: QueryTypes.SELECT },
    );
    return row?.total ?? 0;
  }
}

function filterOf(companyId: string, jobId: string, query: ListRunsDto) {
  const parts = ['v.company_id = :companyId', 'v.listed_job_id = :jobId'];
  if (query.status) parts.push('v.status = :status');
  if (query.search) {
    parts.push(
      `(v.tag COLLATE utf8mb4_unicode_ci LIKE :search ESCAPE '!' OR v.title LIKE :search ESCAPE '!')`,
    );
  }
  return {
    where: parts.join(' AND '),
    replacements: {
      companyId,
      jobId,
      status: query.status ?? '',
      search: containing(query.search ?? ''),
    },
  };
}
