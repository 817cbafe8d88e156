import { LIMITS } from '@fairlead/shared';
import { ID, TIME, WORD, exactText, text } from '../column-types';
import { tableMigration } from '../migration';

/**
 * `listed_job_id` is the job whose list shows the row: set on the current revision of a run that stands, NULL on older
 * revisions and deleted runs. It carries the list's indexes and makes a tag unique among the runs a job shows.
 * The sort columns are exact decimals that are never NULL, so that a page can continue after any value; a run without
 * a length or a fill counts as -1.
 */
export const runRevisions = tableMigration(
  '011',
  'run_revisions',
  `company_id ${ID} NOT NULL,
   id ${ID} NOT NULL,
   run_id ${ID} NOT NULL,
   listed_job_id ${ID} NULL,
   number INT UNSIGNED NOT NULL,
   state ${WORD} NOT NULL,
   version INT UNSIGNED NOT NULL,
   document LONGTEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL CHECK (JSON_VALID(document)),
   engine_version VARCHAR(32) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
   tag ${exactText(LIMITS.tag)} NOT NULL,
   title ${text(LIMITS.title)} NOT NULL,
   status ${WORD} NOT NULL,
   length_inches DOUBLE NULL,
   degrees DOUBLE NOT NULL,
   worst_section_degrees DOUBLE NOT NULL,
   remaining_degrees DOUBLE NOT NULL,
   fill_percent DOUBLE NULL,
   sections INT UNSIGNED NOT NULL,
   pull_points INT UNSIGNED NOT NULL,
   raceway_type ${WORD} NOT NULL,
   trade_size ${WORD} NULL,
   from_label ${text(LIMITS.label * 2)} NOT NULL,
   to_label ${text(LIMITS.label * 2)} NOT NULL,
   strip LONGTEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL CHECK (JSON_VALID(strip)),
   created_at ${TIME} NOT NULL,
   saved_at ${TIME} NOT NULL,
   saved_by ${ID} NOT NULL,
   status_rank TINYINT AS (CASE status
     WHEN 'ok' THEN 0 WHEN 'no-answer' THEN 1 WHEN 'watch' THEN 2 ELSE 3 END) PERSISTENT,
   length_sort DECIMAL(16,4) AS (COALESCE(ROUND(length_inches, 4), -1)) PERSISTENT,
   degrees_sort DECIMAL(16,4) AS (ROUND(degrees, 4)) PERSISTENT,
   fill_sort DECIMAL(16,4) AS (COALESCE(ROUND(fill_percent, 4), -1)) PERSISTENT,
   PRIMARY KEY (company_id, id),
   UNIQUE KEY run_revisions_number (company_id, run_id, number),
   UNIQUE KEY run_revisions_tag (company_id, listed_job_id, tag),
   KEY run_revisions_by_updated (company_id, listed_job_id, saved_at, run_id),
   KEY run_revisions_by_tag (company_id, listed_job_id, tag, run_id),
   KEY run_revisions_by_status (company_id, listed_job_id, status_rank, run_id),
   KEY run_revisions_by_length (company_id, listed_job_id, length_sort, run_id),
   KEY run_revisions_by_degrees (company_id, listed_job_id, degrees_sort, run_id),
   KEY run_revisions_by_fill (company_id, listed_job_id, fill_sort, run_id),
   KEY run_revisions_in_status (company_id, listed_job_id, status, saved_at, run_id),
   KEY run_revisions_engine (engine_version, state),
   CONSTRAINT run_revisions_run FOREIGN KEY (company_id, run_id)
     REFERENCES runs (company_id, id) ON DELETE CASCADE,
   CONSTRAINT run_revisions_job FOREIGN KEY (company_id, listed_job_id)
     REFERENCES jobs (company_id, id) ON DELETE CASCADE,
   CONSTRAINT run_revisions_saver FOREIGN KEY (company_id, saved_by)
     REFERENCES memberships (company_id, user_id)`,
);
