import { migrateDown, migrateUp } from '../src/database/migrator';
import { MIGRATIONS } from '../src/database/migrations/all';
import { withNamedLock } from '../src/database/named-lock';
import { emptyDatabase, onServer, testDatabase } from './test-database';

const database = testDatabase('_migrations');

beforeEach(() => emptyDatabase(database));
afterAll(() => onServer((query) => query(`DROP DATABASE IF EXISTS ${database.name}`)));

/** Every table's own statement. */
async function schema(): Promise<Record<string, string>> {
  const tables = await onServer<{ name: string }[]>((query) =>
    query(
      `SELECT table_name AS name FROM information_schema.tables
       WHERE table_schema = '${database.name}' AND table_name <> 'schema_migrations' ORDER BY name`,
    ),
  );
  const statements: Record<string, string> = {};
  for (const { name } of tables) {
    const [row] = await onServer<Record<string, string>[]>((query) =>
      query(`SHOW CREATE TABLE ${database.name}.${name}`),
    );
    statements[name] = row?.['Create Table'] ?? '';
  }
  return statements;
}

/** Every step makes one, but 012, which adds columns. */
const TABLES = MIGRATIONS.length - 1;

it('go up, down and up again to the same schema', async () => {
  const names = MIGRATIONS.map(({ name }) => name);
  expect(await migrateUp(database)).toEqual(names);
  const first = await schema();
  expect(Object.keys(first)).toHaveLength(TABLES);
  expect(await migrateUp(database)).toEqual([]);
  expect((await migrateDown(database)).reverse()).toEqual(names);
  expect(await schema()).toEqual({});
  await migrateUp(database);
  expect(await schema()).toEqual(first);
});

it('come back one at a time', async () => {
  await migrateUp(database);
  const last = MIGRATIONS.at(-1)?.name;
  expect(await migrateDown(database, 1)).toEqual([last]);
  expect(await migrateUp(database)).toEqual([last]);
});

it('carry on where a killed process stopped between a table and its note', async () => {
  await migrateUp(database);
  const whole = await schema();
  await onServer((query) =>
    query(`DELETE FROM ${database.name}.schema_migrations WHERE name >= '008'`),
  );
  const later = MIGRATIONS.filter(({ name }) => name >= '008').length;
  expect(await migrateUp(database)).toHaveLength(later);
  expect(await schema()).toEqual(whole);
});

it('run once when ten start together', async () => {
  const runs = await Promise.all(Array.from({ length: 10 }, () => migrateUp(database)));
  expect(runs.flat().sort()).toEqual(MIGRATIONS.map(({ name }) => name));
});

it('keep every table in InnoDB with a primary key, and every tenant table under its company', async () => {
  await migrateUp(database);
  const statements = await schema();
  const global = ['companies', 'users', 'rate_limits', 'refresh_tokens', 'sessions'];
  for (const [table, statement] of Object.entries(statements)) {
    expect([table, statement]).toEqual([table, expect.stringContaining('PRIMARY KEY')]);
    expect(statement).toContain('ENGINE=InnoDB');
    if (global.includes(table)) continue;
    expect([table, statement]).toEqual([
      table,
      expect.stringContaining('PRIMARY KEY (`company_id`,'),
    ]);
    const foreign = statement.match(/FOREIGN KEY \(`\w+`/g) ?? [];
    expect(foreign.filter((key) => !key.includes('`company_id`'))).toEqual(
      table === 'memberships' ? ['FOREIGN KEY (`user_id`'] : [],
    );
  }
});

it('a named lock keeps a second holder out until the first is done', async () => {
  await withNamedLock(database, 'test', 0, async () => {
    expect(await withNamedLock(database, 'test', 0, async () => 'in')).toBeNull();
    expect(await withNamedLock(database, 'other', 0, async () => 'in')).toBe('in');
  });
  expect(await withNamedLock(database, 'test', 0, async () => 'in')).toBe('in');
});
