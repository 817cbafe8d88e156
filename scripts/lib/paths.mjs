// Where things are: the checkout, and the one folder that holds everything the product makes while running.
import { join, dirname } from 'node:path';
import { fileURLToPath } from 'node:url';

export const ROOT = join(dirname(fileURLToPath(import.meta.url)), '..', '..');

/** Databases, secrets and stamps; git-ignored. FAIRLEAD_DATA moves it, so that two copies can run from one checkout. */
export const DATA = process.env.FAIRLEAD_DATA ?? join(ROOT, '.fairlead');

export const STAMPS = join(ROOT, '.fairlead', 'stamps');
export const SERVER_MAIN = join(ROOT, 'server', 'dist', 'main.js');
export const CLIENT_DIST = join(ROOT, 'client', 'dist');
