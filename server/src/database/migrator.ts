import type { Connection } from 'mariadb';
import { Umzug } from 'umzug';
import type { MigrationParams, UmzugStorage } from 'umzug';
import type { DatabaseConfig } from '../config/environment';
import { createTable } from './migration';
import { MIGRATIONS } from './migrations/all';
import { withNamedLock } from './named-lock';

const LOCK = 'fairlead-migrate';
/** Long enough for another process to finish a large migration. */
const LOCK_WAIT_SECONDS = 120;

/** Remembers what ran. Umzug's own Sequelize storage would create its table by `sync()`. */
const storage: UmzugStorage<Connection> = {
  async executed({ context }) {
    await context.query(
      createTable(
        'schema_migrations',
        'name VARCHAR(120) CHARACTER SET ascii NOT NULL, ran_at DATETIME(3) NOT NULL, PRIMARY KEY (name)',
      ),
    );
    const rows = await context.query<{ name: string }[]>(
      'SELECT name FROM schema_migrations ORDER BY name',
    );
    return rows.map((row) => row.name);
  },
  async logMigration({ name, context }) {
    await context.query(
      'INSERT INTO schema_migrations (name, ran_at) VALUES (?, UTC_TIMESTAMP(3))',
      [name],
    );
  },
  async unlogMigration({ name, context }) {
    await context.query('DELETE FROM schema_migrations WHERE name = ?', [name]);
  },
};

function createMigrator(connection: Connection): Umzug<Connection> {
  return new Umzug({
    migrations: MIGRATIONS.map(({ name, up, down }) => ({
      name,
      up: ({ context }: MigrationParams<Connection>) => up(context),
      down: ({ context }: MigrationParams<Connection>) => down(context),
    })),
    context: connection,
    storage,
    logger: undefined,
  });
}

/** Brings the database to the newest schema; returns the names of the steps this process ran. */
export function migrateUp(database: DatabaseConfig): Promise<string[]> {
  return underLock(database, (migrator) => migrator.up());
}

/** Takes back the newest `steps`, or everything. */
export function migrateDown(database: DatabaseConfig, steps?: number): Promise<string[]> {
  return underLock(database, (migrator) =>
    steps === undefined ? migrator.down({ to: 0 }) : migrator.down({ step: steps }),
  );
}

async function underLock(
  database: DatabaseConfig,
  work: (migrator: Umzug<Connection>) => Promise<{ name: string }[]>,
): Promise<string[]> {
  const done = await withNamedLock(database, LOCK, LOCK_WAIT_SECONDS, (connection) =>
    work(createMigrator(connection)),
  );
  if (done === null) throw new Error('another process has been migrating for two minutes');
  return done.map(({ name }) => name);
}
