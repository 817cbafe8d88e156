import type { Migration } from '../migration';
import { companies } from './001-companies';
import { users } from './002-users';
import { memberships } from './003-memberships';
import { sessions } from './004-sessions';
import { refreshTokens } from './005-refresh-tokens';
import { rateLimits } from './006-rate-limits';
import { idempotencyKeys } from './007-idempotency-keys';
import { jobs } from './008-jobs';
import { jobPeople } from './009-job-people';
import { runs } from './010-runs';
import { runRevisions } from './011-run-revisions';
import { companySettings } from './012-company-settings';

/** In the order they run. A landed step never changes; the next one is added below. */
export const MIGRATIONS: readonly Migration[] = [
  companies,
  users,
  memberships,
  sessions,
  refreshTokens,
  rateLimits,
  idempotencyKeys,
  jobs,
  jobPeople,
  runs,
  runRevisions,
  companySettings,
];
