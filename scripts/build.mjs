// npm run build: shared and server by the compiler, the client by vite. Skipped when no source changed.
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { CLIENT_DIST, ROOT, SERVER_MAIN } from './lib/paths.mjs';
import { must } from './lib/run.mjs';
import { endWith, step } from './lib/say.mjs';
import { hashOf, stampMatches, writeStamp } from './lib/stamps.mjs';

const SOURCES = [
  'shared',
  'server',
  'client',
  'tsconfig.base.json',
  'package-lock.json',
  'scripts/build.mjs',
];

export async function build() {
  const hash = hashOf(SOURCES);
  const built = existsSync(SERVER_MAIN) && existsSync(join(CLIENT_DIST, 'index.html'));
  if (built && stampMatches('build', hash)) return 'nothing changed';
  await must('npx', ['tsc', '-b', 'server/tsconfig.build.json']);
  await must('npx', ['vite', 'build', '--logLevel', 'warn'], {
    cwd: join(ROOT, 'client'),
    // Whoever calls this may have another one: vitest sets 'test', and React would come out as its development build.
    env: { NODE_ENV: 'production' },
  });
  writeStamp('build', hash);
  return undefined;
}

/** Names a build, so that an open page can notice a newer one. */
export const buildId = () => hashOf(SOURCES).slice(0, 12);

if (import.meta.url === pathToFileURL(process.argv[1]).href) {
  await step('build', build).catch(endWith);
}
