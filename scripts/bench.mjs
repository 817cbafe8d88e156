// npm run bench: times, each beside a baseline measured in the same run. Nothing here fails a build; the figures are
// for whoever judges a change.
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { benchAnalysis } from './bench/analysis.mjs';
import { benchKeystroke } from './bench/keystroke.mjs';
import { benchList } from './bench/list.mjs';
import { benchPull } from './bench/pull.mjs';
import { build } from './build.mjs';
import { migrate, seedDemo, serverEnv, startDatabase, startServer } from './lib/app.mjs';
import { anyFreePort } from './lib/ports.mjs';
import { prepare } from './lib/prepare.mjs';
import { must, onEnd } from './lib/run.mjs';
import { endWith, say, step } from './lib/say.mjs';

const folder = mkdtempSync(join(tmpdir(), 'fairlead-bench-'));
const parts = [];
const ended = async () => {
  for (const part of parts.reverse()) await part.stop();
  rmSync(folder, { recursive: true, force: true });
};
onEnd(() => void ended().finally(() => process.exit(1)));

async function bench() {
  await prepare({ chromium: true });
  await step('build', build);
  say();
  await benchAnalysis();
  await benchPull();
  say((await must('node', ['scripts/check-size.mjs'])).replace(/^figure: /gm, '').trim());
  // What is measured reads; only filling it writes.
  const db = await startDatabase(folder, { relaxed: true });
  parts.push(db);
  const env = { ...serverEnv(db, folder, await anyFreePort()), RATE_LIMIT_SCALE: '1000' };
  await migrate(env);
  const demo = await seedDemo(env);
  parts.push(await startServer(env));
  await benchList(env, demo);
  await benchKeystroke(env.PUBLIC_URL, demo);
}

await bench().catch(endWith);
await ended();
process.exit(process.exitCode ?? 0);
