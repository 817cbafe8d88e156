// npm start: the whole product on one port of this machine, with its own database and the demo.
import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { build } from './build.mjs';
import { migrate, seedDemo, serverEnv, startDatabase, startServer } from './lib/app.mjs';
import { DATA } from './lib/paths.mjs';
import { freePortFrom } from './lib/ports.mjs';
import { prepare } from './lib/prepare.mjs';
import { onEnd } from './lib/run.mjs';
import { Told, endWith, say, sinceStart, step } from './lib/say.mjs';

const WANTED_PORT = Number(process.env.PORT ?? 4600);
const RUNNING = join(DATA, 'running.json');

/** A second start in the same folder says where the first one is. */
function refuseSecond() {
  try {
    const { pid, url } = JSON.parse(readFileSync(RUNNING, 'utf8'));
    if (readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes('start.mjs')) {
      throw new Told(`Fairlead already runs from this folder: ${url} (pid ${pid}).`);
    }
  } catch (error) {
    if (error instanceof Told) throw error;
  }
}

const parts = [];
let ending = null;
const ended = () => {
  ending ??= (async () => {
    for (const part of parts.reverse()) await part.stop();
    rmSync(RUNNING, { force: true });
  })();
  return ending;
};

async function start() {
  refuseSecond();
  await prepare();
  await step('build', build);
  const db = await step('database', () => startDatabase(DATA));
  parts.push(db);
  const port = await freePortFrom(WANTED_PORT);
  const env = serverEnv(db, DATA, port);
  await step('migrations', async () => void (await migrate(env)));
  const demo = await step('demo', () => seedDemo(env));
  const server = await step('server', () => startServer(env));
  parts.push(server);
  mkdirSync(DATA, { recursive: true });
  writeFileSync(RUNNING, JSON.stringify({ pid: process.pid, url: env.PUBLIC_URL }));
  say();
  if (port !== WANTED_PORT) say(`Port ${WANTED_PORT} is taken, so Fairlead uses ${port}.`);
  say(`Fairlead is at ${env.PUBLIC_URL}  (${sinceStart()}; Ctrl-C stops it)`);
  if (demo.people.length > 0) say(`Demo sign-ins, password ${demo.password}:`);
  for (const person of demo.people) say(`  ${person.role.padEnd(10)} ${person.email}`);
  watch(server, db);
}

/** A part that ends by itself takes the rest down with a word about it. */
function watch(server, db) {
  for (const [name, child, log] of [
    ['server', server.child, server.log],
    ['database', db.child, () => ''],
  ]) {
    child.once('exit', (code) => {
      if (ending) return;
      say(`\nThe ${name} ended by itself (${code}).\n${log().slice(-2000)}`);
      process.exitCode = 1;
      void ended().then(() => process.exit(1));
    });
  }
}

onEnd((why) => {
  say(`\nStopping (${why}) …`);
  void ended().then(() => {
    say('Stopped.');
    process.exit(process.exitCode ?? 0);
  });
});

await start().catch(async (error) => {
  if (ending) return;
  endWith(error);
  await ended();
  process.exit(1);
});
