import type { NestExpressApplication } from '@nestjs/platform-express';
import type { ApiError, Job, Page } from '@fairlead/shared';
import { newId } from '../src/common/new-id';
import { api, missingId } from './api';
import type { Api } from './api';
import { createTestApp } from './create-test-app';
import { factories } from './factories';
import type { Factories } from './factories';

let app: NestExpressApplication;
let call: Api;
let make: Factories;

beforeAll(async () => {
  app = await createTestApp();
  call = api(app);
  make = factories(app);
});
afterAll(() => app.close());

describe('creating a job', () => {
  const body = () => ({ id: newId(), number: `J-${newId()}`.slice(0, 32), name: 'Roof units' });

  it('answers with the job, its version and what the person may do', async () => {
    const owner = await make.buildPerson();
    const sent = { ...body(), address: '1 Main St', status: 'bidding', dueDate: '2027-02-28' };
    const { status, body: job } = await call('post', '/jobs', owner, sent);
    expect(status).toBe(201);
    expect(job).toMatchObject({ ...sent, version: 1, people: [], runCount: 0 });
    expect(job.can).toEqual({ update: true, delete: true, assignPeople: true, createRuns: true });
    expect((await call('get', `/jobs/${job.id}`, owner)).body).toEqual(job);
  });

  it('refuses nobody and crew', async () => {
    expect((await call('post', '/jobs', {}, body())).body.code).toBe('not-signed-in');
    const crew = await make.buildPerson({ role: 'crew' });
    expect((await call('post', '/jobs', crew, body())).body).toMatchObject({
      status: 403,
      code: 'forbidden',
    });
  });

  it.each([
    ['/name', { name: '' }],
    ['/name', { name: 'x'.repeat(161) }],
    ['/name', { name: 7 }],
    ['/name', { name: ['a'] }],
    ['/name', { name: 'two\nlines' }],
    ['/number', { number: undefined }],
    ['/number', { number: { $gt: '' } }],
    ['/status', { status: 'won' }],
    ['/dueDate', { dueDate: '2027-02-29' }],
    ['/dueDate', { dueDate: '28.02.2027' }],
    ['/id', { id: '1 or 1=1' }],
    ['/id', { id: undefined }],
    ['/version', { version: 9 }],
    ['/companyId', { companyId: newId() }],
    ['/deletedAt', { deletedAt: '2020-01-01' }],
  ])('says that %s is wrong (%#)', async (pointer, wrong) => {
    const owner = await make.buildPerson();
    const { status, body: error } = await call('post', '/jobs', owner, { ...body(), ...wrong });
    expect(status).toBe(400);
    expect(error.code).toBe('validation-failed');
    expect((error as ApiError).problems?.map((problem) => problem.pointer)).toEqual([pointer]);
  });

  it('refuses a number that stands on another job, and gives it back once that one is deleted', async () => {
    const job = await make.buildJob();
    const again = { ...body(), number: job.number };
    const refused = await call('post', '/jobs', job.by, again);
    expect(refused.body).toMatchObject({ status: 409, code: 'already-exists' });
    expect(refused.body.problems[0].pointer).toBe('/number');
    await call('delete', `/jobs/${job.id}`, job.by);
    expect((await call('post', '/jobs', job.by, again)).status).toBe(201);
    const restored = await call('post', `/jobs/${job.id}/restore`, job.by);
    expect(restored.body.problems[0].pointer).toBe('/number');
  });

  it('compares numbers exactly', async () => {
    const job = await make.buildJob({ number: 'a-1' });
    for (const number of ['A-1', 'a-1 b', 'ä-1']) {
      expect((await call('post', '/jobs', job.by, { ...body(), number })).status).toBe(201);
    }
  });

  it('lets two companies use one id and one number', async () => {
    const theirs = await make.buildJob();
    const owner = await make.buildPerson();
    const sent = { ...body(), id: theirs.id, number: theirs.number };
    expect((await call('post', '/jobs', owner, sent)).status).toBe(201);
    expect((await call('get', `/jobs/${theirs.id}`, theirs.by)).body.name).toBe(theirs.name);
  });
});

describe('changing a job', () => {
  it('moves the version and refuses who started from an older one, with what stands now', async () => {
    const job = await make.buildJob();
    const path = `/jobs/${job.id}`;
    const first = await call('patch', path, job.by, { baseVersion: 1, name: 'Roof, east' });
    expect(first.body).toMatchObject({ name: 'Roof, east', number: job.number, version: 2 });
    const second = await call('patch', path, job.by, { baseVersion: 1, name: 'Roof, west' });
    expect(second.body).toMatchObject({ status: 409, code: 'stale-version' });
    expect(second.body.current).toEqual(first.body);
  });

  it('asks for the version that the change started from', async () => {
    const job = await make.buildJob();
    const { body } = await call('patch', `/jobs/${job.id}`, job.by, { name: 'Roof' });
    expect(body).toMatchObject({ status: 400, code: 'base-version-missing' });
  });

  it('clears a due date with null and leaves it without', async () => {
    const job = await make.buildJob({ dueDate: '2027-01-31' });
    const path = `/jobs/${job.id}`;
    const kept = await call('patch', path, job.by, { baseVersion: 1, name: 'Roof' });
    expect(kept.body.dueDate).toBe('2027-01-31');
    const cleared = await call('patch', path, job.by, { baseVersion: 2, dueDate: null });
    expect(cleared.body.dueDate).toBeNull();
  });

  it('loses no save when eight people write at once', async () => {
    const job = await make.buildJob();
    let acknowledged = 0;
    await Promise.all(
      Array.from({ length: 8 }, async () => {
        for (let round = 0; round < 5; round += 1) {
          const now = await call('get', `/jobs/${job.id}`, job.by);
          const change = { baseVersion: now.body.version, name: `Roof ${round}` };
          const { status } = await call('patch', `/jobs/${job.id}`, job.by, change);
          expect([200, 409]).toContain(status);
          if (status === 200) acknowledged += 1;
        }
      }),
    );
    const { body } = await call('get', `/jobs/${job.id}`, job.by);
    expect(acknowledged).toBeGreaterThan(0);
    expect(body.version).toBe(1 + acknowledged);
  });
});

describe('deleting a job', () => {
  it('hides it with its runs, and undo brings both back', async () => {
    const run = await make.buildStoredRun();
    const job = `/jobs/${run.jobId}`;
    expect((await call('delete', job, run.by)).status).toBe(204);
    for (const path of [job, `${job}/runs`, `/runs/${run.id}`]) {
      expect((await call('get', path, run.by)).status).toBe(404);
    }
    expect((await call('get', '/jobs', run.by)).body.items).toEqual([]);
    const restored = await call('post', `${job}/restore`, run.by);
    expect(restored.body).toMatchObject({ id: run.jobId, runCount: 1 });
    expect((await call('get', `/runs/${run.id}`, run.by)).status).toBe(200);
  });
});

describe('the people of a job', () => {
  it('are assigned and taken off, twice as well as once', async () => {
    const job = await make.buildJob();
    const crew = await make.buildPerson({ role: 'crew', companyId: job.by.companyId });
    const path = `/jobs/${job.id}/people/${crew.userId}`;
    for (const method of ['put', 'put'] as const) {
      const { body } = await call(method, path, job.by);
      expect(body.people).toEqual([{ id: crew.userId, name: crew.name, role: 'crew' }]);
    }
    for (const method of ['delete', 'delete'] as const) {
      expect((await call(method, path, job.by)).body.people).toEqual([]);
    }
  });

  it('are of the company; anyone else is as missing as nobody', async () => {
    const job = await make.buildJob();
    const stranger = await make.buildPerson();
    for (const userId of [stranger.userId, missingId()]) {
      expect((await call('put', `/jobs/${job.id}/people/${userId}`, job.by)).status).toBe(404);
    }
  });

  it('decide what crew see: the others are missing, in lists as well', async () => {
    const mine = await make.buildJob();
    const { by: owner } = mine;
    const crew = await make.buildPerson({ role: 'crew', companyId: owner.companyId });
    const other = await make.buildJob({ by: owner });
    await call('put', `/jobs/${mine.id}/people/${crew.userId}`, owner);
    const { body } = await call('get', '/jobs', crew);
    expect((body as Page<Job>).items.map(({ id }) => id)).toEqual([mine.id]);
    expect(body.total).toBe(1);
    expect(body.items[0].can).toEqual({
      update: false,
      delete: false,
      assignPeople: false,
      createRuns: true,
    });
    const hidden = await call('get', `/jobs/${other.id}`, crew);
    const missing = await call('get', `/jobs/${missingId()}`, crew);
    expect({ ...hidden.body, requestId: '' }).toEqual({ ...missing.body, requestId: '' });
  });

  it('are listed to whoever may assign them', async () => {
    const owner = await make.buildPerson({ name: 'Bo' });
    const { companyId } = owner;
    const crew = await make.buildPerson({ name: 'Al', role: 'crew', companyId });
    await make.buildPerson();
    expect((await call('get', '/people', owner)).body).toEqual([
      { id: crew.userId, name: 'Al', role: 'crew' },
      { id: owner.userId, name: 'Bo', role: 'owner' },
    ]);
    expect((await call('get', '/people', crew)).status).toBe(403);
  });
});
