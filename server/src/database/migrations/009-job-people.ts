import { ID, TIME } from '../column-types';
import { tableMigration } from '../migration';

export const jobPeople = tableMigration(
  '009',
  'job_people',
  `company_id ${ID} NOT NULL,
   job_id ${ID} NOT NULL,
   user_id ${ID} NOT NULL,
   assigned_at ${TIME} NOT NULL,
   PRIMARY KEY (company_id, job_id, user_id),
   KEY job_people_user (company_id, user_id, job_id),
   CONSTRAINT job_people_job FOREIGN KEY (company_id, job_id)
     REFERENCES jobs (company_id, id) ON DELETE CASCADE,
   CONSTRAINT job_people_member FOREIGN KEY (company_id, user_id)
     REFERENCES memberships (company_id, user_id) ON DELETE CASCADE`,
);
