import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { anyFreePort, freePortFrom, isFree } from '../lib/ports.mjs';
import { run } from '../lib/run.mjs';
import { secretOf } from '../lib/secret.mjs';
import { hashOf, stampMatches, writeStamp } from '../lib/stamps.mjs';

let folder;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'fairlead-lib-'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

describe('stamps', () => {
  it('change with a file, its name and its place, not with what is built', () => {
    mkdirSync(join(folder, 'src/dist'), { recursive: true });
    writeFileSync(join(folder, 'src/a.ts'), '1');
    const first = hashOf(['src'], folder);
    writeFileSync(join(folder, 'src/dist/a.js'), 'built');
    expect(hashOf(['src'], folder)).toBe(first);
    writeFileSync(join(folder, 'src/b.ts'), '1');
    const second = hashOf(['src'], folder);
    expect(second).not.toBe(first);
    writeFileSync(join(folder, 'src/a.ts'), '2');
    expect(hashOf(['src'], folder)).not.toBe(second);
  });

  it('match only what was written last', () => {
    expect(stampMatches('build', 'x', folder)).toBe(false);
    writeStamp('build', 'x', folder);
    expect(stampMatches('build', 'x', folder)).toBe(true);
    expect(stampMatches('build', 'y', folder)).toBe(false);
  });
});

describe('ports', () => {
  it('passes over one that is taken', async () => {
    const port = await anyFreePort();
    const taken = createServer().listen(port, '127.0.0.1');
    await new Promise((done) => taken.once('listening', done));
    expect(await isFree(port)).toBe(false);
    expect(await freePortFrom(port)).toBeGreaterThan(port);
    await new Promise((done) => taken.close(done));
    expect(await freePortFrom(port)).toBe(port);
  });
});

describe('secrets', () => {
  it('are made once, long enough, and for the owner alone', async () => {
    const secret = secretOf(folder, 'session-secret');
    expect(Buffer.byteLength(secret)).toBeGreaterThanOrEqual(32);
    expect(secretOf(folder, 'session-secret')).toBe(secret);
    const { out } = await run('stat', ['-c', '%a', join(folder, 'session-secret')]);
    expect(out.trim()).toBe('600');
  });
});

describe('a killed parent', () => {
  it('ends the script that watches it', async () => {
    const script = join(folder, 'watch.mjs');
    const lib = new URL('../lib/run.mjs', import.meta.url).href;
    const done = join(folder, 'done');
    writeFileSync(
      script,
      `import { onEnd } from ${JSON.stringify(lib)};
       import { writeFileSync } from 'node:fs';
       setInterval(() => {}, 1000);
       onEnd((why) => { writeFileSync(${JSON.stringify(done)}, why); process.exit(0); });`,
    );
    // The shell starts the script, waits until it watches, and is then killed outright.
    await run('bash', ['-c', `node ${script} & sleep 1; kill -9 $$`]);
    const { out } = await run('bash', [
      '-c',
      `for i in $(seq 50); do [ -f ${done} ] && break; sleep 0.1; done; cat ${done}`,
    ]);
    expect(out).toBe('the parent ended');
  });
});
