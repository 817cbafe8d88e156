import {
  DEMO_PASSWORD,
  DEMO_PEOPLE,
  ELEMENT_KINDS,
  FITTINGS,
  ROLES,
  analyzeRun,
} from '@fairlead/shared';
import type { Job, Page, RunListItem, SessionAnswer } from '@fairlead/shared';
import { DEMO_JOBS } from '../src/seed/demo-jobs';
import { startProcess } from './server-process';
import { emptyDatabase, onServer, testDatabase } from './test-database';

const database = testDatabase('_seed');
afterAll(() => onServer((query) => query(`DROP DATABASE IF EXISTS ${database.name}`)));

async function seed(): Promise<{ outcome: string; people: unknown[]; password: string }> {
  const { code, output } = await startProcess('src/seed/seed-demo.ts', database).ended;
  expect([code, output]).toEqual([0, expect.stringMatching(/^demo \{.*\}$/m)]);
  return JSON.parse(/^demo (\{.*\})$/m.exec(output)?.[1] ?? '');
}

const runs = DEMO_JOBS.flatMap((job) => job.runs);

it('shows every kind of element and every status', () => {
  const elements = runs.flatMap(({ document }) => document.path);
  expect(new Set(elements.map(({ kind }) => kind))).toEqual(new Set(ELEMENT_KINDS));
  const statuses = new Set(runs.map(({ document }) => analyzeRun(document).status));
  expect(statuses).toEqual(new Set(['ok', 'watch', 'over', 'no-answer']));
  const fittings = elements.flatMap((element) =>
    element.kind === 'fitting' ? [element.fitting] : [],
  );
  expect(FITTINGS).toEqual(expect.arrayContaining(fittings));
  expect(runs.length).toBeGreaterThanOrEqual(12);
});

it('has one person per role', () => {
  expect(DEMO_PEOPLE.map(({ role }) => role)).toEqual(ROLES);
});

it('fills an empty database once; everybody can sign in and find the jobs of the role', async () => {
  await emptyDatabase(database);
  const first = await seed();
  expect(first).toEqual({ outcome: 'seeded', people: DEMO_PEOPLE, password: DEMO_PASSWORD });
  expect((await seed()).outcome).toBe('present');
  const server = startProcess('src/main.ts', database);
  const address = await server.ready;
  const jobCounts: Record<string, number> = {};
  for (const { email, role } of DEMO_PEOPLE) {
    const { accessToken } = await read<SessionAnswer>(`${address}/api/auth/sign-in`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json' },
      body: JSON.stringify({ email, password: DEMO_PASSWORD }),
    });
    const headers = { Authorization: `Bearer ${accessToken}` };
    const jobs = await read<Page<Job>>(`${address}/api/jobs`, { headers });
    jobCounts[role] = jobs.total;
    for (const job of jobs.items) {
      const list = await read<Page<RunListItem>>(`${address}/api/jobs/${job.id}/runs`, { headers });
      expect(list.total).toBe(DEMO_JOBS.find(({ number }) => number === job.number)?.runs.length);
    }
  }
  expect(jobCounts).toEqual({ owner: 3, estimator: 3, foreman: 3, crew: 1 });
  server.kill('SIGTERM');
  expect((await server.ended).code).toBe(0);
});

it('leaves a database with other people in it alone', async () => {
  await emptyDatabase(database);
  await startProcess('src/database/migrate.ts', database).ended;
  await onServer((query) =>
    query(
      `INSERT INTO ${database.name}.companies (id, name, time_zone, created_at)
       VALUES ('00000000-0000-7000-8000-000000000000', 'A real shop', 'UTC', NOW(3))`,
    ),
  );
  expect(await seed()).toMatchObject({ outcome: 'not-empty', people: [] });
  const users = await onServer((query) => query(`SELECT id FROM ${database.name}.users`));
  expect(users).toHaveLength(0);
});

async function read<T>(address: string, init: RequestInit): Promise<T> {
  const response = await fetch(address, init);
  expect(response.status).toBe(200);
  return (await response.json()) as T;
}
