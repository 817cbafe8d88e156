// Secrets are made once, in the data folder, readable by the owner alone.
import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

export function secretOf(folder, name) {
  const path = join(folder, name);
  if (!existsSync(path)) {
    mkdirSync(folder, { recursive: true, mode: 0o700 });
    writeFileSync(path, randomBytes(48).toString('base64url'), { mode: 0o600, flag: 'wx' });
  }
  return readFileSync(path, 'utf8');
}
