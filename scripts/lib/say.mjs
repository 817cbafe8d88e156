// What the scripts tell the person at the terminal: one line a step, with its time.

const started = Date.now();

export const seconds = (from) => `${((Date.now() - from) / 1000).toFixed(1)} s`;

export function say(line = '') {
  process.stdout.write(`${line}\n`);
}

/** Runs a step, says it is being done and how long it took; a step that did nothing says so by returning a string. */
export async function step(name, work) {
  const from = Date.now();
  process.stdout.write(`- ${name} … `);
  try {
    const result = await work();
    say(typeof result === 'string' ? result : `done (${seconds(from)})`);
    return result;
  } catch (error) {
    say('failed');
    throw error;
  }
}

export const sinceStart = () => seconds(started);

/** A failure whose message is meant for the person at the terminal; no stack is shown. */
export class Told extends Error {}

export function endWith(error) {
  say();
  say(error instanceof Told ? error.message : String(error?.stack ?? error));
  process.exitCode = 1;
}
