import { holds } from '../common/access/rights';
import type { Viewer } from '../common/viewer';

/** What a decision about a job needs to know of it. */
export interface JobFacts {
  companyId: string;
  /** Ids of the people assigned to it. */
  people: readonly string[];
}

type Asker = Pick<Viewer, 'userId' | 'companyId' | 'role'>;

/** Crew see the jobs they are assigned to, everyone else all jobs of their company. */
export function canReadJob(viewer: Asker, job: JobFacts): boolean {
  if (viewer.companyId !== job.companyId || !holds(viewer.role, 'job.read')) return false;
  return viewer.role !== 'crew' || job.people.includes(viewer.userId);
}

export function canCreateJobs(viewer: Asker): boolean {
  return holds(viewer.role, 'job.create');
}

export function canUpdateJob(viewer: Asker, job: JobFacts): boolean {
  return canReadJob(viewer, job) && holds(viewer.role, 'job.update');
}

export function canDeleteJob(viewer: Asker, job: JobFacts): boolean {
  return canReadJob(viewer, job) && holds(viewer.role, 'job.delete');
}

export function canAssignPeople(viewer: Asker, job: JobFacts): boolean {
  return canReadJob(viewer, job) && holds(viewer.role, 'job.assign');
}

/** Whoever sees a job may draw runs in it. */
export function canCreateRuns(viewer: Asker, job: JobFacts): boolean {
  return canReadJob(viewer, job) && holds(viewer.role, 'run.create');
}
