import type { NestExpressApplication } from '@nestjs/platform-express';
import { LIMITS, analyzeRun, buildRun, pullPoint, straight } from '@fairlead/shared';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { PULL_RUNS } from '../../shared/test/pull-runs';
import { RATE_LIMITS, RateLimitsService } from '../src/rate-limits/rate-limits.service';
import { api } from './api';
import { createSecondApp, createTestApp } from './create-test-app';

let app: NestExpressApplication;

beforeAll(async () => {
  app = await createTestApp();
});
afterAll(() => app.close());
afterEach(() => app.get(Sequelize).query('DELETE FROM rate_limits'));

const analyze = (document: unknown, on = app) => api(on)('post', '/analyses', {}, { document });

/** Rows of every table but the one that counts. */
async function rowsByTable(): Promise<Record<string, number>> {
  const sequelize = app.get(Sequelize);
  const tables = await sequelize.query<{ name: string }>(
    `SELECT table_name AS name FROM information_schema.tables
     WHERE table_schema = DATABASE() AND table_name <> 'rate_limits'`,
    { type: QueryTypes.SELECT },
  );
  expect(tables.length).toBeGreaterThan(5);
  const rows: Record<string, number> = {};
  for (const { name } of tables) {
    const [row] = await sequelize.query<{ rows: number }>(
      `SELECT COUNT(*) AS \`rows\` FROM \`${name}\``,
      { type: QueryTypes.SELECT },
    );
    rows[name] = row?.rows ?? -1;
  }
  return rows;
}

describe('a run judged for nobody', () => {
  it.each(Object.keys(PULL_RUNS) as (keyof typeof PULL_RUNS)[])(
    'answers as the engine does: %s',
    async (name) => {
      const document = PULL_RUNS[name]();
      const { status, body } = await analyze(document);
      expect(status).toBe(200);
      expect(body).toEqual({ analysis: JSON.parse(JSON.stringify(analyzeRun(document))) });
    },
  );

  it('keeps nothing', async () => {
    const before = await rowsByTable();
    expect((await analyze(PULL_RUNS.branch())).status).toBe(200);
    expect((await analyze({ path: [] })).status).toBe(400);
    expect(await rowsByTable()).toEqual(before);
  });

  it('says what is wrong with a document, and where', async () => {
    const { status, body } = await analyze({
      ...buildRun(),
      path: [pullPoint({ id: 'a' }), straight({ id: 'b', length: -1 }), pullPoint({ id: 'c' })],
    });
    expect(status).toBe(400);
    expect(body.code).toBe('invalid-document');
    expect(body.problems).toEqual([
      expect.objectContaining({ pointer: '/document/path/1/length' }),
    ]);
  });

  it('refuses what is too long, too deep or too large', async () => {
    const many = Array.from({ length: LIMITS.elements }, () => straight());
    const long = { ...buildRun(), path: [pullPoint(), ...many, pullPoint()] };
    expect((await analyze(long)).status).toBe(400);

    const deep = Array.from({ length: LIMITS.depth }).reduce((inner: object) => ({ inner }), {});
    expect((await analyze({ ...buildRun(), rules: deep })).status).toBe(400);

    const large = { ...buildRun(), title: 'x'.repeat(LIMITS.documentBytes + 64 * 1024) };
    expect((await analyze(large)).status).toBe(413);

    for (const nothing of [undefined, null, 7, 'run', []]) {
      expect((await analyze(nothing)).status).toBe(400);
    }
  });

  it('counts one address over all processes, and says how long to wait', async () => {
    const { hits } = RATE_LIMITS.analyses;
    const other = await createSecondApp();
    try {
      const limits = app.get(RateLimitsService);
      for (let hit = 0; hit < hits - 2; hit += 1) {
        await limits.hit(RATE_LIMITS.analyses, '127.0.0.1');
      }
      expect((await analyze(PULL_RUNS.branch())).status).toBe(200);
      expect((await analyze(PULL_RUNS.branch(), other)).status).toBe(200);
      for (const server of [app, other]) {
        const { status, body, headers } = await analyze(PULL_RUNS.branch(), server);
        expect([status, body.code]).toEqual([429, 'too-many-requests']);
        expect(Number(headers['retry-after'])).toBeGreaterThan(0);
      }
    } finally {
      await other.close();
    }
  });
});
