import { LIMITS } from '@fairlead/shared';
import { ID, TIME, WORD, exactText, text } from '../column-types';
import { tableMigration } from '../migration';

/**
 * Ids belong to their company (the key starts with it), so an id that another company uses is as free as any other.
 * Lists sort by columns that are never NULL: a job without a due date comes after the others, statuses go in their
 * own order. `live_number` is NULL once deleted, which takes the row out of the unique key.
 */
export const jobs = tableMigration(
  '008',
  'jobs',
  `company_id ${ID} NOT NULL,
   id ${ID} NOT NULL,
   number ${exactText(LIMITS.jobNumber)} NOT NULL,
   name ${text(LIMITS.jobName)} NOT NULL,
   address ${text(LIMITS.jobAddress)} NOT NULL,
   status ${WORD} NOT NULL,
   due_date DATE NULL,
   version INT UNSIGNED NOT NULL,
   created_by ${ID} NOT NULL,
   created_at ${TIME} NOT NULL,
   updated_at ${TIME} NOT NULL,
   deleted_at ${TIME} NULL,
   live_number ${exactText(LIMITS.jobNumber)} AS (IF(deleted_at IS NULL, number, NULL)) PERSISTENT,
   status_rank TINYINT AS (CASE status
     WHEN 'bidding' THEN 0 WHEN 'active' THEN 1 WHEN 'on-hold' THEN 2 ELSE 3 END) PERSISTENT,
   due_sort DATE AS (COALESCE(due_date, '9999-12-31')) PERSISTENT,
   PRIMARY KEY (company_id, id),
   UNIQUE KEY jobs_live_number (company_id, live_number),
   KEY jobs_by_updated (company_id, deleted_at, updated_at, id),
   KEY jobs_by_number (company_id, deleted_at, number, id),
   KEY jobs_by_name (company_id, deleted_at, name, id),
   KEY jobs_by_due (company_id, deleted_at, due_sort, id),
   KEY jobs_by_status (company_id, deleted_at, status_rank, id),
   KEY jobs_in_status (company_id, deleted_at, status, updated_at, id),
   KEY jobs_deleted (deleted_at),
   CONSTRAINT jobs_company FOREIGN KEY (company_id) REFERENCES companies (id),
   CONSTRAINT jobs_creator FOREIGN KEY (company_id, created_by)
     REFERENCES memberships (company_id, user_id)`,
);
