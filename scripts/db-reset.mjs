// npm run db:reset: throws the local database away. The next start makes a new one with the demo.
import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { createInterface } from 'node:readline/promises';
import { runningPid } from '../docker-free-db/instance.mjs';
import { DATA } from './lib/paths.mjs';
import { Told, endWith, say } from './lib/say.mjs';

async function agreed() {
  if (process.argv.includes('--yes')) return true;
  if (!process.stdin.isTTY) throw new Told('Say --yes to throw the local database away.');
  const ask = createInterface({ input: process.stdin, output: process.stdout });
  const answer = await ask.question(`Throw away every job and run in ${DATA}? Type yes: `);
  ask.close();
  return answer.trim() === 'yes';
}

async function reset() {
  const folder = join(DATA, 'mariadb');
  if (runningPid(folder) !== null) throw new Told('Fairlead is running. Stop it first.');
  if (!(await agreed())) return say('Nothing was changed.');
  rmSync(folder, { recursive: true, force: true });
  say('The local database is gone. `npm start` makes a new one.');
}

await reset().catch(endWith);
