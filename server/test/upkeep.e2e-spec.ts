import type { NestExpressApplication } from '@nestjs/platform-express';
import { getModelToken } from '@nestjs/sequelize';
import { ENGINE_VERSION } from '@fairlead/shared';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { withNamedLock } from '../src/database/named-lock';
import { HousekeepingService } from '../src/housekeeping/housekeeping.service';
import { EngineUpgradeService } from '../src/runs/engine-upgrade.service';
import { RunRevision } from '../src/runs/models/run-revision.model';
import { api } from './api';
import { createTestApp, testConfig } from './create-test-app';
import { factories } from './factories';
import type { Factories } from './factories';

let app: NestExpressApplication;
let make: Factories;
let revisions: typeof RunRevision;

beforeAll(async () => {
  app = await createTestApp();
  make = factories(app);
  revisions = app.get<typeof RunRevision>(getModelToken(RunRevision));
});
afterAll(() => app.close());

const DAY = 24 * 60 * 60 * 1000;

async function count(table: string, where: string, replacements: object): Promise<number> {
  const [row] = await app
    .get(Sequelize)
    .query<{ n: number }>(`SELECT COUNT(*) AS n FROM ${table} WHERE ${where}`, {
      replacements: { ...replacements },
      type: QueryTypes.SELECT,
    });
  return row?.n ?? -1;
}

describe('after an engine upgrade', () => {
  const upgrade = () => app.get(EngineUpgradeService).run();

  it('drafts of an older engine get their columns made again, version and time untouched', async () => {
    const run = await make.buildStoredRun();
    const where = { id: run.revision.id };
    const before = await revisions.findOne({ where, raw: true });
    await revisions.update({ engineVersion: '0.9', status: 'over', degrees: 999 }, { where });
    expect(await upgrade()).toBe(1);
    expect(await revisions.findOne({ where, raw: true })).toEqual(before);
    expect(await upgrade()).toBe(0);
  });

  it('more than one batch is worked through', async () => {
    const run = await make.buildStoredRun();
    const row = await revisions.findOne({ where: { id: run.revision.id }, rejectOnEmpty: true });
    const old = { ...row.get(), listedJobId: null, engineVersion: '0.1', degrees: 999 };
    const copies = Array.from({ length: 205 }, (_, index) => ({
      ...old,
      id: `00000000-0000-7000-8000-${String(index).padStart(12, '0')}`,
      number: index + 2,
    }));
    await revisions.bulkCreate(copies);
    expect(await upgrade()).toBe(205);
    expect(await count('run_revisions', 'run_id = :id AND degrees = 999', { id: run.id })).toBe(0);
  });

  it('what was released, pulled or superseded, and what a newer engine made, stays as it is', async () => {
    const stored = { engineVersion: '0.9', degrees: 999 };
    for (const change of [
      { ...stored, state: 'released' },
      { ...stored, state: 'pulled' },
      { ...stored, state: 'superseded' },
      { ...stored, engineVersion: '999.0' },
    ]) {
      const run = await make.buildStoredRun();
      const where = { id: run.revision.id };
      await revisions.update(change, { where });
      await upgrade();
      expect(await revisions.findOne({ where })).toMatchObject(change);
    }
  });

  it('one process at a time does it', async () => {
    const run = await make.buildStoredRun();
    await revisions.update({ engineVersion: '0.9' }, { where: { id: run.revision.id } });
    await withNamedLock(testConfig().database, 'fairlead-engine', 0, async () => {
      expect(await upgrade()).toBe(0);
    });
    expect(await upgrade()).toBe(1);
    const stored = await revisions.findOne({ where: { id: run.revision.id } });
    expect(stored?.engineVersion).toBe(ENGINE_VERSION);
  });
});

describe('the purge', () => {
  const purgeIn = (days: number) =>
    app.get(HousekeepingService).purge(new Date(Date.now() + days * DAY));

  it('takes deleted runs and jobs after 30 days, and never what stands', async () => {
    const standing = await make.buildStoredRun();
    const goneRun = await make.buildStoredRun({ by: standing.by, jobId: standing.jobId });
    const goneJob = await make.buildStoredRun({ by: standing.by });
    await api(app)('delete', `/runs/${goneRun.id}`, standing.by);
    await api(app)('delete', `/jobs/${goneJob.jobId}`, standing.by);
    const left = () => count('run_revisions', 'company_id = :id', { id: standing.by.companyId });
    await purgeIn(29.9);
    expect(await left()).toBe(3);
    await purgeIn(30.1);
    expect(await left()).toBe(1);
    const ids = { id: standing.by.companyId };
    expect(await count('runs', 'company_id = :id', ids)).toBe(1);
    expect(await count('jobs', 'company_id = :id', ids)).toBe(1);
  });

  it('forgets idempotency keys and sessions after 14 days', async () => {
    const job = await make.buildJob();
    await api(app)('patch', `/jobs/${job.id}`, job.by, { baseVersion: 1, name: 'Roof' });
    const ids = { id: job.by.companyId };
    const left = async () => [
      await count('idempotency_keys', 'company_id = :id', ids),
      await count('sessions', 'company_id = :id', ids),
    ];
    await purgeIn(13.9);
    expect(await left()).toEqual([1, 1]);
    await purgeIn(14.1);
    expect(await left()).toEqual([0, 0]);
  });
});
