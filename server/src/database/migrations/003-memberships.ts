import { ID, TIME, WORD } from '../column-types';
import { tableMigration } from '../migration';

/** One role per person and company. */
export const memberships = tableMigration(
  '003',
  'memberships',
  `company_id ${ID} NOT NULL,
   user_id ${ID} NOT NULL,
   role ${WORD} NOT NULL,
   created_at ${TIME} NOT NULL,
   PRIMARY KEY (company_id, user_id),
   KEY memberships_user (user_id, created_at),
   CONSTRAINT memberships_company FOREIGN KEY (company_id) REFERENCES companies (id),
   CONSTRAINT memberships_user FOREIGN KEY (user_id) REFERENCES users (id)`,
);
