// Child processes: run one to its end, or start one and be sure it can be stopped.
import { spawn } from 'node:child_process';
import { ROOT } from './paths.mjs';
import { Told } from './say.mjs';

/** Runs a command; resolves with its exit code and output, never rejects for a non-zero code. */
export function run(command, args, { env = {}, cwd = ROOT, quiet = true, input } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      cwd,
      env: { ...process.env, ...env },
      stdio: [input === undefined ? 'ignore' : 'pipe', 'pipe', 'pipe'],
    });
    let out = '';
    const take = (chunk) => {
      out += chunk;
      if (!quiet) process.stdout.write(chunk);
    };
    child.stdout.on('data', take);
    child.stderr.on('data', take);
    child.on('error', reject);
    child.on('close', (code, signal) => resolve({ code: code ?? 1, signal, out }));
    if (input !== undefined) child.stdin.end(input);
  });
}

/** As `run`, but a failure ends the script with the command's last lines. */
export async function must(command, args, options) {
  const { code, out } = await run(command, args, options);
  if (code !== 0) {
    const tail = out.trim().split('\n').slice(-40).join('\n');
    throw new Told(`${command} ${args.join(' ')} ended with ${code}:\n${tail}`);
  }
  return out;
}

/** TERM, then KILL when it has not ended in time. */
export async function stop(child, patience = 30_000) {
  if (!child || child.exitCode !== null || child.signalCode !== null) return;
  const ended = new Promise((resolve) => child.once('exit', resolve));
  child.kill('SIGTERM');
  const timer = setTimeout(() => child.kill('SIGKILL'), patience);
  await ended;
  clearTimeout(timer);
}

/** npm passes SIGTERM on to nobody, so a script watches for the death of its parent as well as for signals. */
export function onEnd(callback) {
  let ending = false;
  const end = (why) => {
    if (ending) return;
    ending = true;
    clearInterval(watch);
    callback(why);
  };
  const parent = process.ppid;
  const watch = setInterval(() => process.ppid !== parent && end('the parent ended'), 500);
  watch.unref();
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => end(signal));
  return () => end('asked');
}
