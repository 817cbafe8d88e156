import { HASH, ID, TIME } from '../column-types';
import { tableMigration } from '../migration';

/** `answer` is the JSON that was sent, deflated: autosaves answer with whole documents. */
export const idempotencyKeys = tableMigration(
  '007',
  'idempotency_keys',
  `company_id ${ID} NOT NULL,
   user_id ${ID} NOT NULL,
   idempotency_key ${ID} NOT NULL,
   route VARCHAR(200) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
   request_hash ${HASH} NOT NULL,
   status SMALLINT UNSIGNED NULL,
   answer MEDIUMBLOB NULL,
   created_at ${TIME} NOT NULL,
   PRIMARY KEY (company_id, user_id, idempotency_key),
   KEY idempotency_keys_created (created_at),
   CONSTRAINT idempotency_keys_membership FOREIGN KEY (company_id, user_id)
     REFERENCES memberships (company_id, user_id) ON DELETE CASCADE`,
);
