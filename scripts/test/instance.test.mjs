import { existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { findProgram } from '../../docker-free-db/install.mjs';
import { runningPid, startInstance } from '../../docker-free-db/instance.mjs';
import { answers } from '../../docker-free-db/ready.mjs';
import { must, run } from '../lib/run.mjs';

let folder;
beforeEach(() => {
  folder = join(mkdtempSync(join(tmpdir(), 'fairlead-db-')), 'mariadb');
});
afterEach(() => rmSync(join(folder, '..'), { recursive: true, force: true }));

const sql = (db, text) =>
  must(findProgram('mariadb'), [
    '--no-defaults',
    '-N',
    '-h127.0.0.1',
    `-P${db.port}`,
    `-u${db.user}`,
    `-p${db.password}`,
    '-e',
    text,
  ]);

describe('the private MariaDB', () => {
  it('keeps what it holds from one start to the next, on loopback only', async () => {
    const first = await startInstance(folder, { relaxed: true });
    expect(first.port).not.toBe(3306);
    await sql(
      first,
      'CREATE TABLE fairlead.t (n INT PRIMARY KEY); INSERT INTO fairlead.t VALUES (7)',
    );
    const { out } = await run('stat', ['-c', '%a', join(folder, 'password')]);
    expect(out.trim()).toBe('600');
    await first.stop();
    expect(await answers(first.port)).toBe(false);

    const second = await startInstance(folder, { relaxed: true });
    expect((await sql(second, 'SELECT n FROM fairlead.t')).trim()).toBe('7');
    expect((await sql(second, 'SELECT @@bind_address')).trim()).toBe('127.0.0.1');
    await second.stop();
  });

  it('takes over from a script that was killed outright', async () => {
    const module = new URL('../../docker-free-db/instance.mjs', import.meta.url).href;
    const script = join(folder, '..', 'start.mjs');
    writeFileSync(
      script,
      `import { startInstance } from ${JSON.stringify(module)};
       await startInstance(${JSON.stringify(folder)}, { relaxed: true });
       process.kill(process.pid, 'SIGKILL');`,
    );
    await run('node', [script]);
    const orphan = runningPid(folder);
    expect(orphan).not.toBeNull();
    const db = await startInstance(folder, { relaxed: true });
    expect(runningPid(folder)).not.toBe(orphan);
    expect((await sql(db, 'SELECT 1')).trim()).toBe('1');
    await db.stop();
  });

  it('makes a half-made data folder anew, and heeds no stale pid', async () => {
    mkdirSync(join(folder, 'data/mysql'), { recursive: true });
    writeFileSync(join(folder, 'data/mysql/half'), 'x');
    writeFileSync(join(folder, 'pid'), String(process.pid));
    expect(runningPid(folder)).toBeNull();
    const db = await startInstance(folder, { relaxed: true });
    expect(existsSync(join(folder, 'data/mysql/half'))).toBe(false);
    expect(readFileSync(join(folder, 'complete'), 'utf8')).toMatch(/^\d{4}-/);
    await db.stop();
  });
});
