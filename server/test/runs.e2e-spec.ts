import type { NestExpressApplication } from '@nestjs/platform-express';
import { getModelToken } from '@nestjs/sequelize';
import { analyzeRun, bend, buildRun, offset, pullPoint, straight } from '@fairlead/shared';
import type { ApiError, Run as RunAnswer, RunDocument } from '@fairlead/shared';
import { newId } from '../src/common/new-id';
import { RunRevision } from '../src/runs/models/run-revision.model';
import { api } from './api';
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

/** What JSON keeps of a document: a field that is `undefined` does not travel. */
const travelled = <T>(value: T): T => JSON.parse(JSON.stringify(value)) as T;

describe('creating a run', () => {
  it('answers with the document as sent, revision A and the analysis of the engine', async () => {
    const job = await make.buildJob();
    const document = buildRun({ tag: 'F-12', title: 'Feeder to roof unit 3' });
    const sent = { id: newId(), document, area: 'Roof', system: 'Power' };
    const { status, body: run } = await call('post', `/jobs/${job.id}/runs`, job.by, sent);
    expect(status).toBe(201);
    expect(run).toMatchObject({
      id: sent.id,
      jobId: job.id,
      job: { id: job.id, number: job.number, name: job.name },
      area: 'Roof',
      system: 'Power',
      revision: { number: 1, letter: 'A', state: 'draft', version: 1, savedBy: job.by.name },
      can: { update: true, delete: true },
    });
    expect(run.revision.document).toEqual(travelled(document));
    expect(run.analysis).toEqual(travelled(analyzeRun(document)));
    expect((await call('get', `/runs/${run.id}`, job.by)).body).toEqual(run);
  });

  it('shows in the list with the columns the engine made', async () => {
    const run = await make.buildStoredRun({ area: 'Roof' });
    const { body } = await call('get', `/jobs/${run.jobId}/runs`, run.by);
    const { analysis } = run;
    expect(body.items).toMatchObject([
      {
        id: run.id,
        jobId: run.jobId,
        tag: run.revision.document.tag,
        title: '',
        area: 'Roof',
        system: '',
        revision: { number: 1, letter: 'A', state: 'draft' },
        updatedBy: run.by.name,
        updatedAt: run.revision.savedAt,
        summary: {
          status: analysis.status,
          lengthInches: analysis.totals.length,
          degrees: 90,
          worstSectionDegrees: 90,
          remainingDegrees: 270,
          fillPercent: null,
          sections: 1,
          pullPoints: 2,
          racewayType: 'EMT',
          tradeSize: '3/4',
        },
      },
    ]);
    expect(body.items[0].summary.strip.bends).toHaveLength(1);
  });

  it('reports everything that is wrong with a document, each with its place', async () => {
    const job = await make.buildJob();
    const document = {
      ...buildRun({ tag: '' }),
      surprise: 1,
      path: [pullPoint({ id: 'a' }), straight({ id: 'b', length: -1 }), pullPoint({ id: 'c' })],
    };
    const { status, body } = await call('post', `/jobs/${job.id}/runs`, job.by, {
      id: newId(),
      document,
    });
    expect([status, body.code]).toEqual([400, 'invalid-document']);
    const pointers = (body as ApiError).problems?.map(({ pointer }) => pointer);
    expect(pointers).toEqual(
      expect.arrayContaining(['/document/tag', '/document/surprise', '/document/path/1/length']),
    );
  });

  it.each([
    ['/document', { document: undefined }],
    ['/document', { document: [] }],
    ['/document', { document: 'x' }],
    ['/document', { document: null }],
    ['/id', { id: 7 }],
    ['/area', { area: 'x'.repeat(81) }],
    ['/state', { state: 'released' }],
  ])('says that %s is wrong (%#)', async (pointer, wrong) => {
    const job = await make.buildJob();
    const body = { id: newId(), document: buildRun(), ...wrong };
    const answer = await call('post', `/jobs/${job.id}/runs`, job.by, body);
    expect(answer.body.code).toBe('validation-failed');
    expect(answer.body.problems[0].pointer).toBe(pointer);
  });

  it('keeps a tag for one run of a job, until that one is deleted', async () => {
    const run = await make.buildStoredRun();
    const { tag } = run.revision.document;
    const again = { id: newId(), document: buildRun({ tag }) };
    const path = `/jobs/${run.jobId}/runs`;
    const refused = await call('post', path, run.by, again);
    expect(refused.body).toMatchObject({ status: 409, code: 'already-exists' });
    expect(refused.body.problems[0].pointer).toBe('/document/tag');
    expect((await call('get', path, run.by)).body.total).toBe(1);
    const elsewhere = await make.buildJob({ by: run.by });
    expect((await call('post', `/jobs/${elsewhere.id}/runs`, run.by, again)).status).toBe(201);
    await call('delete', `/runs/${run.id}`, run.by);
    const free = { ...again, id: newId() };
    expect((await call('post', path, run.by, free)).status).toBe(201);
    const restored = await call('post', `/runs/${run.id}/restore`, run.by);
    expect(restored.body.problems[0].pointer).toBe('/document/tag');
  });

  it('compares tags exactly', async () => {
    const run = await make.buildStoredRun({ document: buildRun({ tag: 'f-1' }) });
    for (const tag of ['F-1', 'f-1x', 'ƒ-1']) {
      const sent = { id: newId(), document: buildRun({ tag }) };
      expect((await call('post', `/jobs/${run.jobId}/runs`, run.by, sent)).status).toBe(201);
    }
  });
});

describe('saving a run', () => {
  const longer = (document: RunDocument) => ({
    ...document,
    path: [
      pullPoint({ id: 'p1' }),
      straight({ id: 's1', length: 240 }),
      bend({ id: 'b1' }),
      straight({ id: 's2', length: 120.015625 }),
      pullPoint({ id: 'p2' }),
    ],
  });

  it('stores the document, analyses it again and moves the version', async () => {
    const run = await make.buildStoredRun();
    const document = longer(run.revision.document);
    const path = `/runs/${run.id}/document`;
    const { status, body } = await call('put', path, run.by, { baseVersion: 1, document });
    expect(status).toBe(200);
    expect(body.revision).toMatchObject({ version: 2, document });
    expect(body.analysis).toEqual(travelled(analyzeRun(document)));
    expect((await call('get', `/runs/${run.id}`, run.by)).body).toEqual(body);
  });

  it('gives the second of two people 409 and the run as it stands', async () => {
    const run = await make.buildStoredRun();
    const other = await make.buildPerson({ role: 'foreman', companyId: run.by.companyId });
    const path = `/runs/${run.id}/document`;
    const mine = { ...run.revision.document, title: 'Mine' };
    const theirs = { ...run.revision.document, title: 'Theirs' };
    const first = await call('put', path, run.by, { baseVersion: 1, document: mine });
    const second = await call('put', path, other, { baseVersion: 1, document: theirs });
    expect(second.body).toMatchObject({ status: 409, code: 'stale-version' });
    const current = second.body.current as RunAnswer;
    expect(current.revision).toEqual(first.body.revision);
    expect(current.revision.document.title).toBe('Mine');
    const chosen = { baseVersion: current.revision.version, document: theirs };
    expect((await call('put', path, other, chosen)).body.revision).toMatchObject({
      version: 3,
      savedBy: other.name,
    });
  });

  it('lets exactly one of many simultaneous saves through', async () => {
    const run = await make.buildStoredRun();
    const answers = await Promise.all(
      Array.from({ length: 12 }, (_, index) =>
        call('put', `/runs/${run.id}/document`, run.by, {
          baseVersion: 1,
          document: { ...run.revision.document, title: `Hand ${index}` },
        }),
      ),
    );
    const statuses = answers.map(({ status }) => status).sort();
    expect(statuses).toEqual([200, ...new Array<number>(11).fill(409)]);
    const winner = answers.find(({ status }) => status === 200);
    const { body } = await call('get', `/runs/${run.id}`, run.by);
    expect(body.revision).toEqual(winner?.body.revision);
  });

  it('asks for the version that the change started from', async () => {
    const run = await make.buildStoredRun();
    const { document } = run.revision;
    const { body } = await call('put', `/runs/${run.id}/document`, run.by, { document });
    expect(body).toMatchObject({ status: 400, code: 'base-version-missing' });
    for (const baseVersion of [0, -1, 1.5, '1', null, [1]]) {
      const sent = { document, baseVersion };
      const refused = await call('put', `/runs/${run.id}/document`, run.by, sent);
      expect(refused.body).toMatchObject({ status: 400, code: 'validation-failed' });
    }
  });

  it('stores nothing of a document that is refused', async () => {
    const run = await make.buildStoredRun();
    const document = { ...longer(run.revision.document), path: [] };
    const sent = { baseVersion: 1, document };
    expect((await call('put', `/runs/${run.id}/document`, run.by, sent)).status).toBe(400);
    const { body } = await call('get', `/runs/${run.id}`, run.by);
    expect(body.revision).toEqual(travelled(run.revision));
  });

  it('refuses a tag that another run of the job has', async () => {
    const run = await make.buildStoredRun();
    const other = await make.buildStoredRun({ by: run.by, jobId: run.jobId });
    const document = { ...run.revision.document, tag: other.revision.document.tag };
    const { body } = await call('put', `/runs/${run.id}/document`, run.by, {
      baseVersion: 1,
      document,
    });
    expect(body).toMatchObject({ status: 409, code: 'already-exists' });
    expect(body.problems[0].pointer).toBe('/document/tag');
  });

  it('refuses to draw on anything but a draft', async () => {
    const run = await make.buildStoredRun();
    const revisions = app.get<typeof RunRevision>(getModelToken(RunRevision));
    const sent = { baseVersion: 1, document: run.revision.document };
    for (const state of ['checked', 'released', 'pulled', 'superseded'] as const) {
      await revisions.update({ state }, { where: { id: run.revision.id } });
      expect((await call('put', `/runs/${run.id}/document`, run.by, sent)).status).toBe(403);
      expect((await call('patch', `/runs/${run.id}`, run.by, { area: 'x' })).status).toBe(403);
      expect((await call('delete', `/runs/${run.id}`, run.by)).status).toBe(403);
      const { body } = await call('get', `/runs/${run.id}`, run.by);
      expect(body.can).toEqual({ update: false, delete: false });
    }
  });

  it('takes the largest document there may be, and says no to a larger one', async () => {
    const run = await make.buildStoredRun();
    const offsets = Array.from({ length: 498 }, (_, index) =>
      offset({ id: `offset-${index}`, angle: 0.25 }),
    );
    const document = buildRun({ tag: 'Long', path: [pullPoint(), ...offsets, pullPoint()] });
    const saved = await call('put', `/runs/${run.id}/document`, run.by, {
      baseVersion: 1,
      document,
    });
    expect(saved.status).toBe(200);
    expect(saved.body.revision.document.path).toHaveLength(500);
    const huge = { ...document, title: 'x'.repeat(400_000) };
    const refused = await call('put', `/runs/${run.id}/document`, run.by, {
      baseVersion: 2,
      document: huge,
    });
    expect(refused.body).toMatchObject({ status: 413, code: 'too-large' });
  });
});

describe('moving and deleting a run', () => {
  it('changes its area and system and leaves the drawing', async () => {
    const run = await make.buildStoredRun();
    const { body } = await call('patch', `/runs/${run.id}`, run.by, { area: 'East wing' });
    expect(body).toMatchObject({ area: 'East wing', system: '', revision: { version: 1 } });
    const wrong = await call('patch', `/runs/${run.id}`, run.by, { tag: 'F-9' });
    expect(wrong.body.problems).toMatchObject([{ pointer: '/tag', code: 'unknown-field' }]);
  });

  it('can be undone', async () => {
    const run = await make.buildStoredRun();
    expect((await call('delete', `/runs/${run.id}`, run.by)).status).toBe(204);
    expect((await call('get', `/runs/${run.id}`, run.by)).status).toBe(404);
    const sent = { baseVersion: 1, document: run.revision.document };
    expect((await call('put', `/runs/${run.id}/document`, run.by, sent)).status).toBe(404);
    const restored = await call('post', `/runs/${run.id}/restore`, run.by);
    expect(restored.body.revision).toEqual(travelled(run.revision));
    expect((await call('post', `/runs/${run.id}/restore`, run.by)).status).toBe(200);
  });
});

describe('crew', () => {
  it('draw on the jobs they are assigned to, and find nothing elsewhere', async () => {
    const owner = await make.buildPerson();
    const crew = await make.buildPerson({ role: 'crew', companyId: owner.companyId });
    const mine = await make.buildJob({ by: owner, people: [crew] });
    const other = await make.buildStoredRun({ by: owner });
    const sent = { id: newId(), document: buildRun({ tag: 'F-7' }) };
    const created = await call('post', `/jobs/${mine.id}/runs`, crew, sent);
    expect(created.status).toBe(201);
    expect(created.body.can).toEqual({ update: true, delete: true });
    const save = { baseVersion: 1, document: sent.document };
    expect((await call('put', `/runs/${sent.id}/document`, crew, save)).status).toBe(200);
    const hidden = [
      await call('get', `/jobs/${other.jobId}/runs`, crew),
      await call('post', `/jobs/${other.jobId}/runs`, crew, { ...sent, id: newId() }),
      await call('get', `/runs/${other.id}`, crew),
      await call('put', `/runs/${other.id}/document`, crew, save),
      await call('patch', `/runs/${other.id}`, crew, { area: 'x' }),
      await call('delete', `/runs/${other.id}`, crew),
      await call('post', `/runs/${other.id}/restore`, crew),
    ];
    expect(hidden.map(({ status }) => status)).toEqual(hidden.map(() => 404));
  });
});
