import { LIMITS } from '@fairlead/shared';
import { ID, TIME, text } from '../column-types';
import { tableMigration } from '../migration';

export const companies = tableMigration(
  '001',
  'companies',
  `id ${ID} NOT NULL,
   name ${text(LIMITS.companyName)} NOT NULL,
   time_zone VARCHAR(64) CHARACTER SET ascii NOT NULL,
   created_at ${TIME} NOT NULL,
   PRIMARY KEY (id)`,
);
