import type { Migration } from '../migration';

/** null: nobody changed the defaults yet. */
export const companySettings: Migration = {
  name: '012-company-settings',
  up: (connection) =>
    connection.query(
      `ALTER TABLE companies
         ADD COLUMN IF NOT EXISTS settings JSON NULL,
         ADD COLUMN IF NOT EXISTS settings_version INT UNSIGNED NOT NULL DEFAULT 1`,
    ),
  down: (connection) =>
    connection.query(
      `ALTER TABLE companies DROP COLUMN IF EXISTS settings, DROP COLUMN IF EXISTS settings_version`,
    ),
};
