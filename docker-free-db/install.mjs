// Debian's MariaDB programs (and Chromium for tests), installed when missing. No system server is started:
// the -core packages hold the programs alone.
import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';
import { run } from '../scripts/lib/run.mjs';
import { Told, say } from '../scripts/lib/say.mjs';

const MORE_PLACES = ['/usr/sbin', '/usr/local/sbin', '/usr/local/bin', '/usr/bin'];

export function findProgram(name) {
  for (const folder of [...(process.env.PATH ?? '').split(delimiter), ...MORE_PLACES]) {
    try {
      accessSync(join(folder, name), constants.X_OK);
      return join(folder, name);
    } catch {
      // not here
    }
  }
  return null;
}

const apt = (args) => ['apt-get', ['-q', '-y', '-o', 'DPkg::Lock::Timeout=300', ...args]];

/** Root, or sudo that asks for no password; null when neither works. */
async function asRoot() {
  if (process.getuid?.() === 0) return (command, args) => [command, args];
  if (findProgram('sudo') && (await run('sudo', ['-n', 'true'])).code === 0) {
    return (command, args) => ['sudo', ['-n', command, ...args]];
  }
  return null;
}

/** Installs Debian packages unless every program is there already. */
export async function ensurePrograms(programs, packages) {
  if (programs.every(findProgram)) return 'there already';
  const wrap = await asRoot();
  const byHand = `sudo apt-get install ${packages.join(' ')}`;
  if (!findProgram('apt-get') || !wrap) {
    throw new Told(
      `${programs.filter((name) => !findProgram(name)).join(', ')} missing, and this account can install nothing ` +
        `(neither root nor sudo without a password). Install by hand, then start again:\n  ${byHand}`,
    );
  }
  say(`\n  installing Debian's ${packages.join(', ')}`);
  const env = { DEBIAN_FRONTEND: 'noninteractive' };
  const install = () =>
    run(...wrap(...apt(['install', '--no-install-recommends', ...packages])), { env });
  let result = await install();
  if (result.code !== 0) {
    // Fresh machines have no package lists yet.
    await run(...wrap(...apt(['update'])), { env });
    result = await install();
  }
  if (result.code !== 0 || !programs.every(findProgram)) {
    throw new Told(
      `Debian's packages could not be installed. By hand: ${byHand}\n${result.out.slice(-1500)}`,
    );
  }
  return undefined;
}

export const ensureMariaDb = () =>
  ensurePrograms(
    ['mariadbd', 'mariadb-install-db'],
    ['mariadb-server-core', 'mariadb-client-core'],
  );

export const ensureChromium = () => ensurePrograms(['chromium'], ['chromium']);
