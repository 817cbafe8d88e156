import { ROLES } from '@fairlead/shared';
import type { Role } from '@fairlead/shared';
import {
  canAssignPeople,
  canCreateJobs,
  canCreateRuns,
  canDeleteJob,
  canReadJob,
  canUpdateJob,
} from './job.policy';

const viewer = (role: Role, companyId = 'ours') => ({ userId: 'me', role, companyId });
const assigned = { companyId: 'ours', people: ['somebody', 'me'] };
const unassigned = { companyId: 'ours', people: ['somebody'] };

const RULES = { canReadJob, canUpdateJob, canDeleteJob, canAssignPeople, canCreateRuns };

it.each(['owner', 'estimator', 'foreman'] as const)('a %s may do everything with a job', (role) => {
  for (const rule of Object.values(RULES)) expect(rule(viewer(role), unassigned)).toBe(true);
  expect(canCreateJobs(viewer(role))).toBe(true);
});

it('crew read and draw where they are assigned, and nothing else', () => {
  const allowed = Object.entries(RULES).filter(([, rule]) => rule(viewer('crew'), assigned));
  expect(allowed.map(([name]) => name)).toEqual(['canReadJob', 'canCreateRuns']);
  for (const rule of Object.values(RULES)) expect(rule(viewer('crew'), unassigned)).toBe(false);
  expect(canCreateJobs(viewer('crew'))).toBe(false);
});

it.each(ROLES)('a %s of another company may do nothing, assigned by a mistake or not', (role) => {
  for (const rule of Object.values(RULES)) {
    expect(rule(viewer(role, 'theirs'), assigned)).toBe(false);
  }
});
