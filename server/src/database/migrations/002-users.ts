import { LIMITS } from '@fairlead/shared';
import { ID, TIME, exactText, text } from '../column-types';
import { tableMigration } from '../migration';

/** Addresses are stored as `EmailField` leaves them (trimmed, NFC, lower case), so an exact index suffices. */
export const users = tableMigration(
  '002',
  'users',
  `id ${ID} NOT NULL,
   name ${text(LIMITS.personName)} NOT NULL,
   email ${exactText(LIMITS.email)} NOT NULL,
   password_hash CHAR(60) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
   created_at ${TIME} NOT NULL,
   PRIMARY KEY (id),
   UNIQUE KEY users_email (email)`,
);
