import type { RevisionState } from '@fairlead/shared';
import { holds } from '../common/access/rights';
import type { Viewer } from '../common/viewer';
import { canReadJob } from '../jobs/job.policy';
import type { JobFacts } from '../jobs/job.policy';

/** What a decision about a run needs to know of it. */
export interface RunFacts {
  job: JobFacts;
  state: RevisionState;
}

type Asker = Pick<Viewer, 'userId' | 'companyId' | 'role'>;

/** A run is as visible as its job. */
export function canReadRun(viewer: Asker, run: RunFacts): boolean {
  return canReadJob(viewer, run.job) && holds(viewer.role, 'run.read');
}

/** Only a draft can be drawn on; what was checked or released stays as it was. */
export function canUpdateRun(viewer: Asker, run: RunFacts): boolean {
  return canReadRun(viewer, run) && holds(viewer.role, 'run.update') && run.state === 'draft';
}

/** A draft may be thrown away by whoever may draw it; the deletion can be undone. */
export function canDeleteRun(viewer: Asker, run: RunFacts): boolean {
  return canReadRun(viewer, run) && holds(viewer.role, 'run.delete') && run.state === 'draft';
}
