import { MIGRATIONS } from '../src/database/migrations/all';
import { startProcess } from './server-process';
import { emptyDatabase, onServer, testDatabase } from './test-database';

const database = testDatabase('_boot');

beforeEach(() => emptyDatabase(database));
afterAll(() => onServer((query) => query(`DROP DATABASE IF EXISTS ${database.name}`)));

it('two processes on an empty database migrate once, and both serve', async () => {
  const processes = [startProcess('src/main.ts', database), startProcess('src/main.ts', database)];
  try {
    for (const { ready } of processes) {
      const health = await fetch(`${await ready}/api/health`);
      expect([health.status, await health.json()]).toEqual([200, { status: 'ok' }]);
    }
    const ran = await onServer<{ name: string }[]>((query) =>
      query(`SELECT name FROM ${database.name}.schema_migrations ORDER BY name`),
    );
    expect(ran.map(({ name }) => name)).toEqual(MIGRATIONS.map(({ name }) => name));
  } finally {
    for (const server of processes) server.kill('SIGTERM');
    for (const { ended } of processes) expect((await ended).code).toBe(0);
  }
});

it('SIGTERM ends it cleanly within five seconds, open connections or not', async () => {
  const server = startProcess('src/main.ts', database);
  // The client keeps its connection open.
  await (await fetch(`${await server.ready}/api/health`)).text();
  const start = performance.now();
  server.kill('SIGTERM');
  expect((await server.ended).code).toBe(0);
  expect(performance.now() - start).toBeLessThan(5000);
});

it('ends by itself when its parent is another than it was told', async () => {
  const server = startProcess('src/main.ts', database, { FAIRLEAD_PARENT_PID: '1' });
  expect((await server.ended).code).toBe(0);
});

it.each([
  ['missing', '', 'JWT_SECRET: missing'],
  ['short', 'x'.repeat(31), 'JWT_SECRET: too short'],
])('does not start in production with a %s secret', async (_name, secret, fault) => {
  const { code, output } = await startProcess('src/main.ts', database, { JWT_SECRET: secret })
    .ended;
  expect(code).toBe(1);
  expect(output).toContain(fault);
  expect(output).not.toContain('ready');
});

it('says so and ends when there is no database', async () => {
  const { code, output } = await startProcess('src/main.ts', { ...database, port: 1 }).ended;
  expect(code).toBe(1);
  expect(output).toContain('ECONNREFUSED');
});

it('migrates by hand', async () => {
  const { code, output } = await startProcess('src/database/migrate.ts', database).ended;
  expect(code).toBe(0);
  expect(output).toContain('001-companies');
  const again = await startProcess('src/database/migrate.ts', database).ended;
  expect(again.output).toContain('nothing to do');
});
