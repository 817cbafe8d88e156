import type { Role } from '@fairlead/shared';

const OFFICE_AND_FOREMAN: readonly Role[] = ['owner', 'estimator', 'foreman'];
const EVERYONE: readonly Role[] = ['owner', 'estimator', 'foreman', 'crew'];

/**
 * Which roles hold a right at all. Whether it reaches one particular row (crew: only jobs they are assigned to; only
 * drafts can be edited) is for the policy beside the model.
 */
export const RIGHTS = {
  'company.read': EVERYONE,
  'company.settings': ['owner'],
  'people.list': OFFICE_AND_FOREMAN,
  'job.read': EVERYONE,
  'job.create': OFFICE_AND_FOREMAN,
  'job.update': OFFICE_AND_FOREMAN,
  'job.delete': OFFICE_AND_FOREMAN,
  'job.assign': OFFICE_AND_FOREMAN,
  'run.read': EVERYONE,
  'run.create': EVERYONE,
  'run.update': EVERYONE,
  'run.delete': EVERYONE,
} as const satisfies Record<string, readonly Role[]>;

export type Right = keyof typeof RIGHTS;

export function holds(role: Role, right: Right): boolean {
  return (RIGHTS[right] as readonly Role[]).includes(role);
}
