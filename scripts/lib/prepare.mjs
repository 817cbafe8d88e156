// What stands before everything else: the right Node, npm packages, Debian's programs.
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { ensureChromium, ensureMariaDb } from '../../docker-free-db/install.mjs';
import { ROOT } from './paths.mjs';
import { must } from './run.mjs';
import { Told, step } from './say.mjs';
import { hashOf, stampMatches, writeStamp } from './stamps.mjs';

export function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major !== 20 || minor < 19) {
    throw new Told(`Fairlead runs on Node 20 (20.19 or later); this is ${process.versions.node}.`);
  }
}

export async function ensurePackages() {
  const hash = hashOf(['package-lock.json', 'package.json', '.npmrc']);
  if (existsSync(join(ROOT, 'node_modules')) && stampMatches('packages', hash))
    return 'there already';
  await must('npm', ['ci', '--no-audit', '--no-fund']);
  writeStamp('packages', hash);
  return undefined;
}

export async function prepare({ chromium = false } = {}) {
  checkNode();
  await step('npm packages', ensurePackages);
  await step('MariaDB programs', ensureMariaDb);
  if (chromium) await step('Chromium', ensureChromium);
}
