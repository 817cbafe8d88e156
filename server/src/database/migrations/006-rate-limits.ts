import { HASH, TIME } from '../column-types';
import { tableMigration } from '../migration';

/** Counted in the database, so that all processes share one limit. */
export const rateLimits = tableMigration(
  '006',
  'rate_limits',
  `bucket ${HASH} NOT NULL,
   window_start ${TIME} NOT NULL,
   hits INT UNSIGNED NOT NULL,
   PRIMARY KEY (bucket),
   KEY rate_limits_window (window_start)`,
);
