import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { join } from 'node:path';
import type { DatabaseConfig } from '../src/config/environment';
import { TEST_SECRET } from './create-test-app';

export interface ServerProcess {
  pid: number;
  /** The address it announced; rejects when it ended before. */
  ready: Promise<string>;
  /** Exit code and everything it wrote. */
  ended: Promise<{ code: number | null; output: string }>;
  kill: (signal: 'SIGTERM' | 'SIGKILL') => void;
}

const ROOT = join(__dirname, '..');
const RUNNER = join(__dirname, 'run-typescript.mjs');

/** Runs a program of the server as its own process, from the sources. */
export function startProcess(
  program: string,
  database: DatabaseConfig,
  env: Record<string, string> = {},
): ServerProcess {
  const child = spawn(process.execPath, ['-C', '@fairlead/source', RUNNER, join(ROOT, program)], {
    cwd: ROOT,
    stdio: ['ignore', 'pipe', 'pipe'],
    env: {
      PATH: process.env.PATH,
      NODE_ENV: 'production',
      JWT_SECRET: TEST_SECRET,
      PORT: '0',
      LOG_LEVEL: 'error',
      DATABASE_HOST: database.host,
      DATABASE_PORT: String(database.port),
      DATABASE_NAME: database.name,
      DATABASE_USER: database.user,
      DATABASE_PASSWORD: database.password,
      ...env,
    },
  });
  let output = '';
  const ended = once(child, 'close').then(([code]) => ({ code: code as number | null, output }));
  const ready = new Promise<string>((resolve, reject) => {
    const collect = (chunk: Buffer) => {
      output += chunk.toString('utf8');
      const address = /^ready (http:\S+)$/m.exec(output)?.[1];
      if (address) resolve(address);
    };
    child.stdout.on('data', collect);
    child.stderr.on('data', collect);
    void ended.then(({ code }) => reject(new Error(`ended with ${code}: ${output}`)));
  });
  // Whoever does not wait for it must not fail on it.
  ready.catch(() => undefined);
  return { pid: child.pid ?? 0, ready, ended, kill: (signal) => child.kill(signal) };
}
