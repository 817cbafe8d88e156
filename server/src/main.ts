import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { EnvironmentError, readEnvironment } from './config/environment';
import { createApp } from './create-app';
import { HousekeepingService } from './housekeeping/housekeeping.service';
import { EngineUpgradeService } from './runs/engine-upgrade.service';

/** Requests still running when this is over are cut off. */
const CLOSE_MS = 4000;
const PARENT_CHECK_MS = 500;

async function main(): Promise<void> {
  const config = readEnvironment(process.env);
  const app = await createApp(config);
  const server = app.getHttpServer() as Server;
  // A client that sends its request drop by drop must not hold a socket for minutes.
  server.headersTimeout = 10_000;
  server.requestTimeout = 30_000;
  stopWhenTold(app, server);
  await app.listen(config.port, config.host);
  const { port } = server.address() as AddressInfo;
  process.stdout.write(`ready http://${config.host}:${port}\n`);
  await app.get(EngineUpgradeService).run();
  await app.get(HousekeepingService).hourly();
}

function stopWhenTold(app: NestExpressApplication, server: Server): void {
  let stopping = false;
  const stop = async () => {
    if (stopping) return;
    stopping = true;
    setTimeout(() => server.closeAllConnections(), CLOSE_MS).unref();
    await app.close();
    process.exit(0);
  };
  process.on('SIGTERM', () => void stop());
  process.on('SIGINT', () => void stop());
  const told = Number(process.env.FAIRLEAD_PARENT_PID);
  if (told) whenParentIsGone(told, () => void stop());
}

/**
 * Nobody tells a process that its parent was killed: it finds itself adopted, or, with a watcher in between, finds the
 * process that started it all gone.
 */
function whenParentIsGone(told: number, act: () => void): void {
  const parent = process.ppid;
  setInterval(() => {
    if (process.ppid !== parent || !isAlive(told)) act();
  }, PARENT_CHECK_MS).unref();
}

function isAlive(pid: number): boolean {
  try {
    // Signal 0 only asks.
    process.kill(pid, 0);
    return true;
  } catch {
    return false;
  }
}

main().catch((error: unknown) => {
  console.error(error instanceof EnvironmentError ? error.message : error);
  process.exit(1);
});
