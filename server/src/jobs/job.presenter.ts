import type { Job, Person } from '@fairlead/shared';
import type { Viewer } from '../common/viewer';
import { canAssignPeople, canCreateRuns, canDeleteJob, canUpdateJob } from './job.policy';
import type { Job as JobRow } from './models/job.model';

type JobColumns = Pick<
  JobRow,
  | 'companyId'
  | 'id'
  | 'number'
  | 'name'
  | 'address'
  | 'status'
  | 'dueDate'
  | 'version'
  | 'createdAt'
  | 'updatedAt'
>;

/** A job and the people assigned to it. */
export interface JobView {
  job: JobColumns;
  people: Person[];
}

export function presentJob({ job, people }: JobView, runCount: number, viewer: Viewer): Job {
  const facts = { companyId: job.companyId, people: people.map(({ id }) => id) };
  return {
    id: job.id,
    number: job.number,
    name: job.name,
    address: job.address,
    status: job.status,
    dueDate: job.dueDate,
    people,
    runCount,
    version: job.version,
    createdAt: job.createdAt.toISOString(),
    updatedAt: job.updatedAt.toISOString(),
    can: {
      update: canUpdateJob(viewer, facts),
      delete: canDeleteJob(viewer, facts),
      assignPeople: canAssignPeople(viewer, facts),
      createRuns: canCreateRuns(viewer, facts),
    },
  };
}
