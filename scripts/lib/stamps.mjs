// A stamp is the hash of what a step read, written last: a step whose stamp still matches is skipped.
import { createHash } from 'node:crypto';
import { mkdirSync, readFileSync, readdirSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { ROOT, STAMPS } from './paths.mjs';

const SKIPPED = new Set(['node_modules', 'dist', '.git', '.fairlead']);

function* filesIn(path) {
  if (!statSync(path).isDirectory()) {
    yield path;
    return;
  }
  for (const name of readdirSync(path).sort()) {
    if (!SKIPPED.has(name)) yield* filesIn(join(path, name));
  }
}

export function hashOf(paths, root = ROOT) {
  const hash = createHash('sha256');
  for (const path of paths) {
    for (const file of filesIn(join(root, path))) {
      hash.update(file.slice(root.length)).update('\0').update(readFileSync(file)).update('\0');
    }
  }
  return hash.digest('hex');
}

export function stampMatches(name, hash, folder = STAMPS) {
  try {
    return readFileSync(join(folder, name), 'utf8') === hash;
  } catch {
    return false;
  }
}

export function writeStamp(name, hash, folder = STAMPS) {
  mkdirSync(folder, { recursive: true });
  writeFileSync(join(folder, name), hash);
}
