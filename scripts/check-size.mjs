// The size budget: all JavaScript fetched cold on /sign-in, gzipped. Read from vite's manifest: the entry, the page's
// own chunk, and everything either imports.
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { CLIENT_DIST } from './lib/paths.mjs';

const BUDGET = 240 * 1024;
const PAGES = { '/sign-in': 'src/pages/sign-in-page.tsx' };

const manifestPath = join(CLIENT_DIST, '.vite', 'manifest.json');
if (!existsSync(manifestPath)) {
  console.error('No build to measure: npm run build first.');
  process.exit(1);
}
const manifest = JSON.parse(readFileSync(manifestPath, 'utf8'));

function chunksOf(key, seen = new Set()) {
  const chunk = manifest[key];
  if (!chunk || seen.has(chunk.file)) return seen;
  seen.add(chunk.file);
  for (const next of chunk.imports ?? []) chunksOf(next, seen);
  return seen;
}

const gzipped = (file) => gzipSync(readFileSync(join(CLIENT_DIST, file)), { level: 9 }).length;

let failed = false;
for (const [path, page] of Object.entries(PAGES)) {
  const files = chunksOf('index.html');
  if (manifest[page]) chunksOf(page, files);
  const total = [...files]
    .filter((file) => file.endsWith('.js'))
    .reduce((sum, file) => sum + gzipped(file), 0);
  const over = total > BUDGET;
  failed ||= over;
  console.log(
    `figure: entry JavaScript on ${path}: ${(total / 1024).toFixed(1)} KB gz of ${BUDGET / 1024} KB${over ? ', over' : ''}`,
  );
}
process.exit(failed ? 1 : 0);
