import type { NestExpressApplication } from '@nestjs/platform-express';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { newId } from '../src/common/new-id';
import { api } from './api';
import type { Api } from './api';
import { createSecondApp, createTestApp } from './create-test-app';
import { factories } from './factories';
import type { Factories, TestPerson } from './factories';

let app: NestExpressApplication;
let call: Api;
let make: Factories;

beforeAll(async () => {
  app = await createTestApp();
  call = api(app);
  make = factories(app);
});
afterAll(() => app.close());

const newJob = (number = newId().slice(0, 30)) => ({ id: newId(), number, name: 'Roof units' });

async function jobCount({ companyId }: TestPerson): Promise<number> {
  const [row] = await app
    .get(Sequelize)
    .query<{ n: number }>('SELECT COUNT(*) AS n FROM jobs WHERE company_id = :companyId', {
      replacements: { companyId },
      type: QueryTypes.SELECT,
    });
  return row?.n ?? -1;
}

it('asks each signed-in write for a key', async () => {
  const owner = await make.buildPerson();
  for (const key of ['', 'x', newId().toUpperCase(), "' OR 1=1"]) {
    const { body } = await call('post', '/jobs', owner, newJob(), key);
    expect(body).toMatchObject({ status: 400, code: 'idempotency-key-missing' });
  }
  expect(await jobCount(owner)).toBe(0);
});

it('gives a repeated write its first answer and no second effect', async () => {
  const owner = await make.buildPerson();
  const [job, key] = [newJob(), newId()];
  const first = await call('post', '/jobs', owner, job, key);
  await call('patch', `/jobs/${job.id}`, owner, { baseVersion: 1, name: 'Changed since' });
  const again = await call('post', '/jobs', owner, job, key);
  expect(again.status).toBe(201);
  expect(again.body).toEqual(first.body);
  expect(again.headers['idempotency-replayed']).toBe('true');
  expect(await jobCount(owner)).toBe(1);
});

it('repeats an answer that has no body', async () => {
  const job = await make.buildJob();
  const key = newId();
  for (let time = 0; time < 3; time += 1) {
    const { status, text } = await call('delete', `/jobs/${job.id}`, job.by, undefined, key);
    expect([status, text]).toEqual([204, '']);
  }
});

it('refuses the key of another body or another address', async () => {
  const owner = await make.buildPerson();
  const [job, key] = [newJob(), newId()];
  await call('post', '/jobs', owner, job, key);
  const otherBody = await call('post', '/jobs', owner, { ...job, name: 'Basement' }, key);
  expect(otherBody.body).toMatchObject({ status: 422, code: 'idempotency-key-reused' });
  const otherRoute = await call('post', `/jobs/${job.id}/restore`, owner, job, key);
  expect(otherRoute.body.code).toBe('idempotency-key-reused');
});

it('keeps keys of different people apart', async () => {
  const owner = await make.buildPerson();
  const foreman = await make.buildPerson({ role: 'foreman', companyId: owner.companyId });
  const key = newId();
  expect((await call('post', '/jobs', owner, newJob(), key)).status).toBe(201);
  expect((await call('post', '/jobs', foreman, newJob(), key)).status).toBe(201);
  expect(await jobCount(owner)).toBe(2);
});

it('has one effect and one answer when twenty arrive at once, on two servers', async () => {
  const owner = await make.buildPerson();
  const other = await createSecondApp();
  try {
    const [job, key] = [newJob(), newId()];
    const answers = await Promise.all(
      Array.from({ length: 20 }, (_, index) =>
        api(index % 2 ? app : other)('post', '/jobs', owner, job, key),
      ),
    );
    expect(new Set(answers.map(({ status }) => status))).toEqual(new Set([201]));
    expect(new Set(answers.map(({ text }) => text)).size).toBe(1);
    expect(answers.filter(({ headers }) => headers['idempotency-replayed'])).toHaveLength(19);
    expect(await jobCount(owner)).toBe(1);
  } finally {
    await other.close();
  }
});

it('forgets the key of a write that was refused, so that it can be sent again', async () => {
  const taken = await make.buildJob();
  const [job, key] = [newJob(taken.number), newId()];
  expect((await call('post', '/jobs', taken.by, job, key)).status).toBe(409);
  await call('delete', `/jobs/${taken.id}`, taken.by);
  expect((await call('post', '/jobs', taken.by, job, key)).status).toBe(201);
});
