// The running product: MariaDB, migrations, the demo, and the API that also serves the client.
import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { startInstance } from '../../docker-free-db/instance.mjs';
import { buildId } from '../build.mjs';
import { CLIENT_DIST, ROOT, SERVER_MAIN } from './paths.mjs';
import { must, stop } from './run.mjs';
import { Told } from './say.mjs';
import { secretOf } from './secret.mjs';

const SERVER_PATIENCE = 30_000;

export function databaseEnv(db, name = 'fairlead') {
  return {
    DATABASE_HOST: db.host,
    DATABASE_PORT: String(db.port),
    DATABASE_NAME: name,
    DATABASE_USER: db.user,
    DATABASE_PASSWORD: db.password,
  };
}

export function serverEnv(db, folder, port) {
  return {
    ...databaseEnv(db),
    NODE_ENV: 'production',
    JWT_SECRET: secretOf(folder, 'session-secret'),
    HOST: '127.0.0.1',
    PORT: String(port),
    PUBLIC_URL: process.env.PUBLIC_URL ?? `http://127.0.0.1:${port}`,
    CLIENT_DIR: CLIENT_DIST,
    BUILD_ID: buildId(),
    LOG_LEVEL: process.env.LOG_LEVEL ?? 'warn',
    FAIRLEAD_PARENT_PID: String(process.pid),
  };
}

export const startDatabase = (folder, options) => startInstance(join(folder, 'mariadb'), options);

export const migrate = (env) =>
  must('node', [join(ROOT, 'server/dist/database/migrate.js')], { env });

/** Seeds the demo into an empty database; returns the sign-ins whether it was empty or not. */
export async function seedDemo(env) {
  const out = await must('node', [join(ROOT, 'server/dist/seed/seed-demo.js')], { env });
  const line = out.split('\n').find((text) => text.startsWith('demo '));
  if (!line) throw new Told(`The demo seed did not say its sign-ins:\n${out.slice(-1000)}`);
  return JSON.parse(line.slice('demo '.length));
}

/** Starts the API and waits for its `ready` line. */
export function startServer(env) {
  const child = spawn('node', [SERVER_MAIN], {
    cwd: ROOT,
    env: { ...process.env, ...env },
    stdio: ['ignore', 'pipe', 'pipe'],
    // Its own group: Ctrl-C reaches this script, which stops the parts in order.
    detached: true,
  });
  return new Promise((resolve, reject) => {
    let out = '';
    const timer = setTimeout(
      () => fail(`did not answer within ${SERVER_PATIENCE / 1000} s`),
      SERVER_PATIENCE,
    );
    const fail = async (why) => {
      clearTimeout(timer);
      await stop(child, 5000);
      reject(new Told(`The server ${why}:\n${out.slice(-3000)}`));
    };
    const take = (chunk) => {
      out = (out + chunk).slice(-10_000);
      if (!/^ready http/m.test(out)) return;
      clearTimeout(timer);
      child.removeAllListeners('exit');
      resolve({ child, log: () => out, stop: () => stop(child, 10_000) });
    };
    child.stdout.on('data', take);
    child.stderr.on('data', take);
    child.once('exit', () => fail('ended while starting'));
  });
}
