import { LIMITS } from '@fairlead/shared';
import { ID, TIME, text } from '../column-types';
import { tableMigration } from '../migration';

/** Identity only; what was drawn stands in `run_revisions`. */
export const runs = tableMigration(
  '010',
  'runs',
  `company_id ${ID} NOT NULL,
   id ${ID} NOT NULL,
   job_id ${ID} NOT NULL,
   area ${text(LIMITS.area)} NOT NULL,
   system ${text(LIMITS.system)} NOT NULL,
   current_revision_id ${ID} NOT NULL,
   created_by ${ID} NOT NULL,
   created_at ${TIME} NOT NULL,
   deleted_at ${TIME} NULL,
   PRIMARY KEY (company_id, id),
   KEY runs_deleted (deleted_at),
   CONSTRAINT runs_job FOREIGN KEY (company_id, job_id)
     REFERENCES jobs (company_id, id) ON DELETE CASCADE,
   CONSTRAINT runs_creator FOREIGN KEY (company_id, created_by)
     REFERENCES memberships (company_id, user_id)`,
);
