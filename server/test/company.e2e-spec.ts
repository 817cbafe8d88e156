import type { NestExpressApplication } from '@nestjs/platform-express';
import { DEFAULT_SETTINGS } from '@fairlead/shared';
import type { CompanySettings, RunAnalysis } from '@fairlead/shared';
import { PULL_RUNS } from '../../shared/test/pull-runs';
import { EngineUpgradeService } from '../src/runs/engine-upgrade.service';
import { api } from './api';
import { createTestApp } from './create-test-app';
import { factories } from './factories';
import type { Factories } from './factories';

let app: NestExpressApplication;
let make: Factories;

beforeAll(async () => {
  app = await createTestApp();
  make = factories(app);
});
afterAll(() => app.close());

const withFeed = (feedTension: number): CompanySettings => ({
  ...DEFAULT_SETTINGS,
  maxDegrees: 300,
  pull: { ...DEFAULT_SETTINGS.pull, feedTension },
});
const save = (by: { token?: string }, baseVersion: number, settings: unknown) =>
  api(app)('put', '/company/settings', by, { baseVersion, settings });

describe('the settings of a company', () => {
  it('are the defaults until the owner changes them', async () => {
    const owner = await make.buildPerson();
    const { status, body } = await api(app)('get', '/company', owner);
    expect(status).toBe(200);
    expect(body).toMatchObject({
      id: owner.companyId,
      settings: DEFAULT_SETTINGS,
      version: 1,
      can: { updateSettings: true },
    });
  });

  it('are read by everybody and saved by the owner alone', async () => {
    const owner = await make.buildPerson();
    const crew = await make.buildPerson({ role: 'crew', companyId: owner.companyId });
    expect((await save(crew, 1, withFeed(7))).status).toBe(403);
    expect((await save(owner, 1, withFeed(7))).body).toMatchObject({ version: 2 });
    const { body } = await api(app)('get', '/company', crew);
    expect(body.settings.pull.feedTension).toBe(7);
    expect(body.can.updateSettings).toBe(false);
    const other = await make.buildPerson();
    expect((await api(app)('get', '/company', other)).body.settings).toEqual(DEFAULT_SETTINGS);
  });

  it('saved by two: the second is told, and shown what stands', async () => {
    const owner = await make.buildPerson();
    await save(owner, 1, withFeed(7));
    const { status, body } = await save(owner, 1, withFeed(9));
    expect([status, body.code]).toEqual([409, 'stale-version']);
    expect(body.current.settings.pull.feedTension).toBe(7);
  });

  it.each([
    [undefined, '/settings'],
    [{ ...DEFAULT_SETTINGS, code: 'NEC-1999' }, '/settings/code'],
    [{ ...DEFAULT_SETTINGS, pull: null }, '/settings/pull'],
  ])('are refused where they make no sense %#', async (settings, pointer) => {
    const owner = await make.buildPerson();
    const { status, body } = await save(owner, 1, settings);
    expect([status, body.problems[0].pointer]).toEqual([400, pointer]);
    expect((await save(owner, undefined as unknown as number, DEFAULT_SETTINGS)).status).toBe(400);
  });

  it('judge the drafts of the company anew, and of nobody else', async () => {
    const run = await make.buildStoredRun();
    const other = await make.buildStoredRun();
    const read = async (each: typeof run) =>
      (await api(app)('get', `/runs/${each.id}`, each.by)).body.analysis as RunAnalysis;
    const document = { ...PULL_RUNS.branch(), tag: 'F-1' };
    for (const each of [run, other]) {
      await api(app)('put', `/runs/${each.id}/document`, each.by, { baseVersion: 1, document });
    }
    const listed = async (each: typeof run) =>
      (await api(app)('get', `/jobs/${each.jobId}/runs`, each.by)).body.items[0].summary;
    expect((await listed(run)).remainingDegrees).toBe(30);
    await save(run.by, 1, withFeed(5));
    await app.get(EngineUpgradeService).run();
    expect((await read(run)).pulls[0]?.forward.feed).toBe(5);
    expect((await read(other)).pulls[0]?.forward.feed).toBe(1);
    expect((await listed(run)).remainingDegrees).toBe(-30);
    expect((await listed(other)).remainingDegrees).toBe(30);
  });
});
