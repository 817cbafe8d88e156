// npm run dev: hot reload of client, server and shared. The compiler watches shared and server, node restarts the API
// when its output changes, vite serves the client and passes /api on.
import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { migrate, seedDemo, serverEnv, startDatabase } from './lib/app.mjs';
import { DATA, ROOT, SERVER_MAIN } from './lib/paths.mjs';
import { freePortFrom } from './lib/ports.mjs';
import { prepare } from './lib/prepare.mjs';
import { must, onEnd, stop } from './lib/run.mjs';
import { endWith, say, step } from './lib/say.mjs';

const children = [];
let database = null;

function keep(command, args, { env = {}, cwd = ROOT } = {}) {
  const child = spawn(command, args, {
    cwd,
    env: { ...process.env, ...env },
    stdio: ['ignore', 'inherit', 'inherit'],
  });
  children.push(child);
}

async function dev() {
  await prepare();
  await step(
    'compile',
    async () => void (await must('npx', ['tsc', '-b', 'server/tsconfig.build.json'])),
  );
  database = await step('database', () => startDatabase(DATA));
  const apiPort = await freePortFrom(4601);
  const clientPort = await freePortFrom(4600);
  const env = {
    ...serverEnv(database, DATA, apiPort),
    NODE_ENV: 'development',
    CLIENT_DIR: '',
    BUILD_ID: 'development',
    PUBLIC_URL: `http://127.0.0.1:${clientPort}`,
    LOG_LEVEL: 'info',
  };
  await step('migrations', async () => void (await migrate(env)));
  await step('demo', () => seedDemo(env));
  keep('npx', ['tsc', '-b', 'server/tsconfig.build.json', '--watch', '--preserveWatchOutput']);
  keep('node', ['--watch', '--watch-preserve-output', SERVER_MAIN], { env });
  keep('npx', ['vite', '--clearScreen', 'false'], {
    cwd: join(ROOT, 'client'),
    env: { FAIRLEAD_API: `http://127.0.0.1:${apiPort}`, FAIRLEAD_CLIENT_PORT: String(clientPort) },
  });
  say(`\nFairlead, reloading on change: http://127.0.0.1:${clientPort}`);
}

const ended = async () => {
  await Promise.all(children.map((child) => stop(child, 5000)));
  await database?.stop();
};

onEnd(() => void ended().finally(() => process.exit(0)));
await dev().catch(async (error) => {
  endWith(error);
  await ended();
  process.exit(1);
});
