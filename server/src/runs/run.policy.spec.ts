import { REVISION_STATES, ROLES } from '@fairlead/shared';
import type { RevisionState, Role } from '@fairlead/shared';
import { canDeleteRun, canReadRun, canUpdateRun } from './run.policy';

const viewer = (role: Role, companyId = 'ours') => ({ userId: 'me', role, companyId });
const run = (state: RevisionState, people: string[] = ['me']) => ({
  state,
  job: { companyId: 'ours', people },
});

it.each(ROLES)('a %s draws on drafts, reads the rest', (role) => {
  for (const state of REVISION_STATES) {
    expect(canReadRun(viewer(role), run(state))).toBe(true);
    expect(canUpdateRun(viewer(role), run(state))).toBe(state === 'draft');
    expect(canDeleteRun(viewer(role), run(state))).toBe(state === 'draft');
  }
});

it('a run is as visible as its job', () => {
  expect(canReadRun(viewer('crew'), run('draft', []))).toBe(false);
  expect(canUpdateRun(viewer('crew'), run('draft', []))).toBe(false);
  expect(canReadRun(viewer('foreman'), run('draft', []))).toBe(true);
  expect(canReadRun(viewer('owner', 'theirs'), run('draft'))).toBe(false);
  expect(canDeleteRun(viewer('owner', 'theirs'), run('draft'))).toBe(false);
});
