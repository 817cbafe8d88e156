import { RefreshToken } from '../auth/models/refresh-token.model';
import { Session } from '../auth/models/session.model';
import { IdempotencyKey } from '../idempotency/models/idempotency-key.model';
import { JobPerson } from '../jobs/models/job-person.model';
import { Job } from '../jobs/models/job.model';
import { Company } from '../people/models/company.model';
import { Membership } from '../people/models/membership.model';
import { User } from '../people/models/user.model';
import { RunRevision } from '../runs/models/run-revision.model';
import { Run } from '../runs/models/run.model';

export const MODELS = [
  Company,
  User,
  Membership,
  Session,
  RefreshToken,
  IdempotencyKey,
  Job,
  JobPerson,
  Run,
  RunRevision,
] as const;
