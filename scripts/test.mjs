// npm test: everything that must hold. Two lanes, since the machines it runs on have two cores. Ends with
// `N passed, N failed`. `--only NAME` runs one gate, `--long` ten times the random runs.
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { buildId } from './build.mjs';
import { startDatabase } from './lib/app.mjs';
import { runGate } from './lib/gates.mjs';
import { ROOT } from './lib/paths.mjs';
import { prepare } from './lib/prepare.mjs';
import { onEnd } from './lib/run.mjs';
import { endWith, say, sinceStart } from './lib/say.mjs';

const long = process.argv.includes('--long');
const only = process.argv.includes('--only')
  ? process.argv[process.argv.indexOf('--only') + 1]
  : null;

const vitest = (name, config, cwd) => ({
  name,
  suite: true,
  cwd: join(ROOT, cwd),
  command: 'npx',
  args: (report) => [
    'vitest',
    'run',
    '--config',
    config,
    '--reporter=default',
    '--reporter=json',
    `--outputFile=${report}`,
  ],
});
const plain = (name, command, ...args) => ({ name, command, args: () => args });

const jest = {
  name: 'server',
  suite: true,
  needsDatabase: true,
  cwd: join(ROOT, 'server'),
  command: 'npx',
  args: (report) => ['jest', '--maxWorkers=2', '--json', `--outputFile=${report}`],
};

const LANES = [
  [
    plain('format', 'npm', 'run', '-s', 'check:format'),
    plain('lint', 'npm', 'run', '-s', 'check:lint'),
    plain('types', 'npm', 'run', '-s', 'check:types'),
    plain('build', 'node', 'scripts/build.mjs'),
    plain('size', 'node', 'scripts/check-size.mjs'),
    { ...vitest('journeys', 'vitest.config.mts', 'journeys'), after: 'build' },
  ],
  [
    vitest('shared', 'vitest.config.mts', 'shared'),
    vitest('client', 'vitest.config.mts', 'client'),
    jest,
    vitest('platform', 'test/vitest.config.mts', 'scripts'),
  ],
];

const folder = mkdtempSync(join(tmpdir(), 'fairlead-test-'));
let database = null;
const cleanUp = async () => {
  await database?.stop();
  rmSync(folder, { recursive: true, force: true });
};

async function envFor(gate) {
  const env = { CI: 'true', FAIRLEAD_LONG: long ? '1' : '', FAIRLEAD_BUILD: buildId() };
  if (!gate.needsDatabase) return env;
  database ??= await startDatabase(folder, { relaxed: true });
  return {
    ...env,
    FAIRLEAD_TEST_DB_HOST: database.host,
    FAIRLEAD_TEST_DB_PORT: String(database.port),
    FAIRLEAD_TEST_DB_USER: database.user,
    FAIRLEAD_TEST_DB_PASSWORD: database.password,
  };
}

async function runLane(gates) {
  const results = [];
  for (const gate of gates) results.push(await runGate(gate, await envFor(gate)));
  return results;
}

function chosen() {
  if (!only) return LANES;
  const gate = LANES.flat().find(({ name }) => name === only);
  if (!gate)
    throw new Error(
      `No gate named ${only}: ${LANES.flat()
        .map(({ name }) => name)
        .join(', ')}`,
    );
  return [gate.after ? [plain('build', 'node', 'scripts/build.mjs'), gate] : [gate]];
}

async function test() {
  await prepare({ chromium: true });
  const results = (await Promise.all(chosen().map(runLane))).flat();
  const sum = (key) => results.reduce((total, result) => total + result[key], 0);
  const red = results.filter(({ failed }) => failed > 0).map(({ name }) => name);
  say();
  say(red.length > 0 ? `Red: ${red.join(', ')} (${sinceStart()})` : `All green (${sinceStart()})`);
  return { passed: sum('passed'), failed: sum('failed') };
}

onEnd(() => void cleanUp().finally(() => process.exit(1)));

const counts = await test().catch((error) => {
  endWith(error);
  return { passed: 0, failed: 1 };
});
await cleanUp();
say(`${counts.passed} passed, ${counts.failed} failed`);
process.exit(counts.failed > 0 ? 1 : 0);
