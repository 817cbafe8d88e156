// The built product, running for the journeys alone: own database, own folder in the system's temp, a free port.
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { build } from '../../scripts/build.mjs';
import {
  migrate,
  seedDemo,
  serverEnv,
  startDatabase,
  startServer,
} from '../../scripts/lib/app.mjs';
import { anyFreePort } from '../../scripts/lib/ports.mjs';

export async function setup({ provide }) {
  const folder = mkdtempSync(join(tmpdir(), 'fairlead-journeys-'));
  await build();
  const database = await startDatabase(folder, { relaxed: true });
  const env = {
    ...serverEnv(database, folder, await anyFreePort()),
    // Every journey signs in from the same address.
    RATE_LIMIT_SCALE: '1000',
  };
  await migrate(env);
  const demo = await seedDemo(env);
  const server = await startServer(env);
  provide('url', env.PUBLIC_URL);
  provide('demo', demo);
  return async () => {
    await server.stop();
    await database.stop();
    rmSync(folder, { recursive: true, force: true });
  };
}
