import { ID, TIME } from '../column-types';
import { tableMigration } from '../migration';

/** A session is the family of all refresh tokens that came from one sign-in. */
export const sessions = tableMigration(
  '004',
  'sessions',
  `id ${ID} NOT NULL,
   company_id ${ID} NOT NULL,
   user_id ${ID} NOT NULL,
   created_at ${TIME} NOT NULL,
   last_used_at ${TIME} NOT NULL,
   revoked_at ${TIME} NULL,
   PRIMARY KEY (id),
   KEY sessions_last_used (last_used_at),
   CONSTRAINT sessions_membership FOREIGN KEY (company_id, user_id)
     REFERENCES memberships (company_id, user_id) ON DELETE CASCADE`,
);
