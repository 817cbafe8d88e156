import { HASH, ID, TIME } from '../column-types';
import { tableMigration } from '../migration';

/** Only SHA-256 of the token is kept. A superseded one stays, so that its replay is recognised. */
export const refreshTokens = tableMigration(
  '005',
  'refresh_tokens',
  `token_hash ${HASH} NOT NULL,
   session_id ${ID} NOT NULL,
   created_at ${TIME} NOT NULL,
   superseded_at ${TIME} NULL,
   PRIMARY KEY (token_hash),
   CONSTRAINT refresh_tokens_session FOREIGN KEY (session_id)
     REFERENCES sessions (id) ON DELETE CASCADE`,
);
