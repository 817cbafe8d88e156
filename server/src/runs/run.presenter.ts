import type { Run, RunListItem } from '@fairlead/shared';
import type { Viewer } from '../common/viewer';
import type { JobFacts } from '../jobs/job.policy';
import type { Job as JobRow } from '../jobs/models/job.model';
import type { Run as RunRow } from './models/run.model';
import type { RunRevision } from './models/run-revision.model';
import { revisionLetter } from './revision-letter';
import { summaryOf } from './revision-columns';
import { canDeleteRun, canUpdateRun } from './run.policy';
import type { RunFacts } from './run.policy';
import type { AnalyzedDocument } from './analyze-document';
import type { ListedRun } from './run-queries';

/** A run with what stands in other tables. */
export interface RunView {
  run: Pick<RunRow, 'id' | 'area' | 'system'>;
  revision: RunRevision;
  job: Pick<JobRow, 'id' | 'number' | 'name'>;
  jobFacts: JobFacts;
  savedByName: string;
}

export function presentRun(
  { run, revision, job, jobFacts, savedByName }: RunView,
  { document, analysis, settings }: AnalyzedDocument,
  viewer: Viewer,
): Run {
  return {
    id: run.id,
    jobId: job.id,
    job: { id: job.id, number: job.number, name: job.name },
    area: run.area,
    system: run.system,
    revision: {
      id: revision.id,
      number: revision.number,
      letter: revisionLetter(revision.number),
      state: revision.state,
      version: revision.version,
      document,
      savedAt: revision.savedAt.toISOString(),
      savedBy: savedByName,
    },
    analysis,
    settings,
    can: presentCan(viewer, { job: jobFacts, state: revision.state }),
  };
}

export function presentRunListItem(
  row: ListedRun,
  jobFacts: JobFacts,
  viewer: Viewer,
): RunListItem {
  return {
    id: row.id,
    jobId: row.jobId,
    tag: row.tag,
    title: row.title,
    area: row.area,
    system: row.system,
    revision: { number: row.number, letter: revisionLetter(row.number), state: row.state },
    summary: summaryOf(row),
    updatedAt: row.savedAt.toISOString(),
    updatedBy: row.savedByName,
    can: presentCan(viewer, { job: jobFacts, state: row.state }),
  };
}

function presentCan(viewer: Viewer, facts: RunFacts) {
  return { update: canUpdateRun(viewer, facts), delete: canDeleteRun(viewer, facts) };
}
