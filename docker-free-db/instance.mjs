// A private MariaDB without Docker: own folder, own port on loopback, own password; nothing of it outside the folder
// but a socket in the system's temp folder (socket paths end at 107 bytes).
import { spawn } from 'node:child_process';
import { createHash, randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, openSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join, resolve } from 'node:path';
import { must, stop } from '../scripts/lib/run.mjs';
import { anyFreePort, isFree } from '../scripts/lib/ports.mjs';
import { Told } from '../scripts/lib/say.mjs';
import { findProgram } from './install.mjs';
import { answers } from './ready.mjs';

const START_PATIENCE = 60_000;

/** Tests only: a lost second of a throw-away database matters to nobody. */
const RELAXED = [
  '--innodb-flush-log-at-trx-commit=0',
  '--innodb-doublewrite=0',
  '--skip-innodb-stats-persistent',
];
const DURABLE = ['--innodb-flush-log-at-trx-commit=1'];

const paths = (folder) => ({
  data: join(folder, 'data'),
  /** Written last: without it the data folder is a half-made one. */
  complete: join(folder, 'complete'),
  password: join(folder, 'password'),
  port: join(folder, 'port'),
  init: join(folder, 'init.sql'),
  pid: join(folder, 'pid'),
  /** The script that started it: alive, the folder is taken; dead, its MariaDB is an orphan. */
  owner: join(folder, 'owner'),
  log: join(folder, 'log'),
});

/** The process in the pid file, if it is really a MariaDB on this folder: pids are reused. */
export function runningPid(folder) {
  const at = paths(folder);
  try {
    const pid = Number(readFileSync(at.pid, 'utf8'));
    const command = readFileSync(`/proc/${pid}/cmdline`, 'utf8');
    return command.includes(`--datadir=${at.data}`) ? pid : null;
  } catch {
    return null;
  }
}

export function ownerAlive(folder) {
  try {
    const pid = Number(readFileSync(paths(folder).owner, 'utf8'));
    return pid !== process.pid && readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes('node');
  } catch {
    return false;
  }
}

/** A script killed outright leaves its MariaDB behind; it is ended cleanly before a new one starts. */
async function endOrphan(folder) {
  const pid = runningPid(folder);
  if (pid === null) return;
  if (ownerAlive(folder)) {
    throw new Told(`A MariaDB (pid ${pid}) already runs on ${folder}. Stop what started it first.`);
  }
  process.kill(pid, 'SIGTERM');
  for (let waited = 0; runningPid(folder) !== null; waited += 100) {
    if (waited > 30_000) process.kill(pid, 'SIGKILL');
    await new Promise((done) => setTimeout(done, 100));
  }
}

function writeFileSyncWithFolder(path, text) {
  mkdirSync(dirname(path), { recursive: true, mode: 0o700 });
  writeFileSync(path, text);
}

async function prepare(folder) {
  const at = paths(folder);
  if (existsSync(at.complete)) return;
  // Never completed, so never held anything a person entered.
  rmSync(at.data, { recursive: true, force: true });
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  await must(findProgram('mariadb-install-db'), [
    '--no-defaults',
    `--datadir=${at.data}`,
    '--auth-root-authentication-method=socket',
    '--skip-test-db',
    ...asUser(),
  ]);
  if (!existsSync(at.password)) {
    writeFileSync(at.password, randomBytes(24).toString('base64url'), { mode: 0o600 });
  }
  writeFileSync(at.complete, new Date().toISOString());
}

/** As root MariaDB wants to be told that root it is. */
const asUser = () => (process.getuid?.() === 0 ? ['--user=root'] : []);

async function choosePort(folder) {
  const at = paths(folder);
  const remembered = existsSync(at.port) ? Number(readFileSync(at.port, 'utf8')) : 0;
  const port = remembered > 0 && (await isFree(remembered)) ? remembered : await anyFreePort();
  writeFileSync(at.port, String(port));
  return port;
}

/**
 * Starts MariaDB on `folder` and waits until it answers.
 * Returns { host, port, user, password, stop } — `stop` ends it cleanly.
 */
export async function startInstance(folder, { relaxed = false } = {}) {
  folder = resolve(folder);
  const at = paths(folder);
  await endOrphan(folder);
  writeFileSyncWithFolder(at.owner, String(process.pid));
  await prepare(folder);
  const port = await choosePort(folder);
  const password = readFileSync(at.password, 'utf8');
  const users = ['localhost', '127.0.0.1'].flatMap((host) => [
    `CREATE USER IF NOT EXISTS 'fairlead'@'${host}' IDENTIFIED BY '${password}';`,
    `ALTER USER 'fairlead'@'${host}' IDENTIFIED BY '${password}';`,
    `GRANT ALL ON *.* TO 'fairlead'@'${host}';`,
  ]);
  writeFileSync(at.init, `${users.join('\n')}\nCREATE DATABASE IF NOT EXISTS fairlead;\n`, {
    mode: 0o600,
  });
  const socket = join(
    tmpdir(),
    `fairlead-${createHash('sha256').update(folder).digest('hex').slice(0, 16)}.sock`,
  );
  const log = openSync(at.log, 'a');
  const child = spawn(
    findProgram('mariadbd'),
    [
      '--no-defaults',
      ...asUser(),
      `--datadir=${at.data}`,
      `--port=${port}`,
      `--socket=${socket}`,
      `--pid-file=${at.pid}`,
      `--init-file=${at.init}`,
      '--bind-address=127.0.0.1',
      '--skip-name-resolve',
      '--skip-log-bin',
      '--local-infile=0',
      '--character-set-server=utf8mb4',
      '--default-time-zone=+00:00',
      '--sql-mode=STRICT_ALL_TABLES,ERROR_FOR_DIVISION_BY_ZERO,NO_ZERO_DATE,NO_ZERO_IN_DATE,NO_ENGINE_SUBSTITUTION',
      ...(relaxed ? RELAXED : DURABLE),
    ],
    // Its own process group: Ctrl-C at the terminal must not reach it before the API has closed its connections.
    { stdio: ['ignore', log, log], detached: true },
  );
  await waitUntilReady(child, port, at.log);
  return {
    host: '127.0.0.1',
    port,
    user: 'fairlead',
    password,
    child,
    stop: () => stop(child),
  };
}

async function waitUntilReady(child, port, log) {
  const until = Date.now() + START_PATIENCE;
  while (Date.now() < until) {
    if (child.exitCode !== null || child.signalCode !== null) {
      throw new Told(`MariaDB ended while starting:\n${readFileSync(log, 'utf8').slice(-2000)}`);
    }
    if (await answers(port)) return;
    await new Promise((done) => setTimeout(done, 50));
  }
  await stop(child);
  throw new Told(`MariaDB did not answer within ${START_PATIENCE / 1000} s; see ${log}`);
}
