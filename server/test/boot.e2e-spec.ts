import { spawn } from 'node:child_process';
import { setTimeout as wait } from 'node:timers/promises';
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

it('ends by itself once the process that started it is gone', async () => {
  const starter = spawn(process.execPath, ['-e', 'setTimeout(() => {}, 60_000)']);
  const env = { FAIRLEAD_PARENT_PID: String(starter.pid) };
  const server = startProcess('src/main.ts', database, env);
  const address = await server.ready;
  // Longer than it takes to look.
  await wait(1000);
  expect((await fetch(`${address}/api/health`)).status).toBe(200);
  starter.kill('SIGKILL');
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

it('writes no password, token or cookie into its log, not even at the finest level', async () => {
  const server = startProcess('src/main.ts', database, { LOG_LEVEL: 'trace' });
  const address = await server.ready;
  const canary = 'canary-7f3a91';
  const headers = {
    'Content-Type': 'application/json',
    Authorization: `Bearer ${canary}`,
    Cookie: `fairlead_refresh=${canary}`,
    'Idempotency-Key': canary,
  };
  const person = { name: 'Ann', email: `${canary}@shop.test`, companyName: 'Shop' };
  const post = (path: string, body: object) =>
    fetch(`${address}/api/${path}`, { method: 'POST', headers, body: JSON.stringify(body) });
  const password = `${canary} and more`;
  expect((await post('auth/sign-up', { ...person, password })).status).toBe(201);
  expect((await post('auth/sign-in', { ...person, password: canary })).status).toBe(400);
  expect((await post(`jobs?search=${canary}`, { password })).status).toBe(401);
  server.kill('SIGTERM');
  const { output } = await server.ended;
  // It did log: each request is a line of its own.
  expect(output).toContain('"path":"/api/auth/sign-up"');
  expect(output).not.toContain(canary);
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
