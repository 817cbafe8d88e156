// A page of 100 from 20 000 runs: through the API, and by the plain query of the same rows.
import { randomUUID } from 'node:crypto';
import { createRequire } from 'node:module';
import { report, timed } from './figures.mjs';
import { longRun } from './long-run.mjs';

const RUNS = 20_000;
const BATCH = 500;

async function connect(env) {
  const require = createRequire(new URL('../../server/package.json', import.meta.url));
  return require('mariadb').createConnection({
    host: env.DATABASE_HOST,
    port: Number(env.DATABASE_PORT),
    user: env.DATABASE_USER,
    password: env.DATABASE_PASSWORD,
    database: env.DATABASE_NAME,
    bigIntAsNumber: true,
  });
}

/** Twenty thousand copies of one run that the API made, so that each row is what the API would have written. */
async function fill(db, runId) {
  const names = async (table) => {
    const rows = await db.query(
      `SELECT column_name AS name FROM information_schema.columns
       WHERE table_schema = DATABASE() AND table_name = ? AND is_generated = 'NEVER'`,
      [table],
    );
    return rows.map(({ name }) => name);
  };
  const [runColumns, revisionColumns] = [await names('runs'), await names('run_revisions')];
  const [run] = await db.query(`SELECT ${runColumns.join(', ')} FROM runs WHERE id = ?`, [runId]);
  const [revision] = await db.query(
    `SELECT ${revisionColumns.join(', ')} FROM run_revisions WHERE run_id = ?`,
    [runId],
  );
  const insert = (table, columns) =>
    `INSERT INTO ${table} (${columns.join(', ')}) VALUES (${columns.map(() => '?').join(', ')})`;
  for (let made = 0; made < RUNS; made += BATCH) {
    const batch = Array.from({ length: BATCH }, (_, index) => {
      const [id, revisionId] = [randomUUID(), randomUUID()];
      const saved = new Date(Date.UTC(2026, 0, 1) + (made + index) * 1000);
      return {
        run: { ...run, id, current_revision_id: revisionId },
        revision: {
          ...revision,
          id: revisionId,
          run_id: id,
          tag: `R-${made + index}`,
          saved_at: saved,
          degrees: (made + index) % 720,
        },
      };
    });
    await db.beginTransaction();
    await db.batch(
      insert('runs', runColumns),
      batch.map(({ run: row }) => runColumns.map((name) => row[name])),
    );
    await db.batch(
      insert('run_revisions', revisionColumns),
      batch.map(({ revision: row }) => revisionColumns.map((name) => row[name])),
    );
    await db.commit();
  }
  await db.query('ANALYZE TABLE runs, run_revisions');
}

export async function benchList(env, demo) {
  const url = env.PUBLIC_URL;
  const call = async (method, path, body, token) => {
    const response = await fetch(url + path, {
      method,
      headers: {
        'content-type': 'application/json',
        origin: url,
        'idempotency-key': randomUUID(),
        ...(token && { authorization: `Bearer ${token}` }),
      },
      body: body && JSON.stringify(body),
    });
    if (!response.ok)
      throw new Error(`${method} ${path}: ${response.status} ${await response.text()}`);
    return response.json();
  };
  const owner = demo.people.find(({ role }) => role === 'owner');
  const session = await call('POST', '/api/auth/sign-in', {
    email: owner.email,
    password: demo.password,
  });
  const token = session.accessToken;
  const job = await call(
    'POST',
    '/api/jobs',
    { id: randomUUID(), number: 'BENCH', name: 'Bench' },
    token,
  );
  const made = { id: randomUUID(), document: longRun('R-first') };
  await call('POST', `/api/jobs/${job.id}/runs`, made, token);
  const db = await connect(env);
  await fill(db, made.id);

  for (const sort of ['-updatedAt', 'tag', '-degrees']) {
    const path = `/api/jobs/${job.id}/runs?limit=100&sort=${sort}`;
    const api = await timed(40, () => call('GET', path, undefined, token));
    const order = {
      '-updatedAt': 'saved_at DESC, run_id DESC',
      tag: 'tag, run_id',
      '-degrees': 'degrees_sort DESC, run_id DESC',
    };
    const plain = await timed(40, () =>
      db.query(
        `SELECT * FROM run_revisions WHERE company_id = ? AND listed_job_id = ? ORDER BY ${order[sort]} LIMIT 100`,
        [session.me.company.id, job.id],
      ),
    );
    report(
      `a page of 100 from ${RUNS} runs by ${sort}, through the API`,
      api,
      plain,
      'the plain query of the same rows',
    );
  }
  await db.end();
}
