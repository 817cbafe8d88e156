import type { Server } from 'node:http';
import type { NestExpressApplication } from '@nestjs/platform-express';
import type { AppConfig } from '../src/config/environment';
import { createApp } from '../src/create-app';
import { ensureDatabase, testDatabase } from './test-database';

export const TEST_SECRET = 'the secret of the tests, longer than 32 bytes';
export const OWN_ORIGIN = 'http://fairlead.test';

export function testConfig(overrides: Partial<AppConfig> = {}): AppConfig {
  return {
    production: false,
    host: '127.0.0.1',
    port: 0,
    publicUrl: new URL(OWN_ORIGIN),
    buildId: 'test',
    clientDir: null,
    logLevel: 'silent',
    jwtSecret: TEST_SECRET,
    database: testDatabase(),
    rateLimitScale: 1,
    ...overrides,
  };
}

/** The real application, with its middleware, on the worker's own database. */
export async function createTestApp(
  overrides: Partial<AppConfig> = {},
): Promise<NestExpressApplication> {
  const config = testConfig(overrides);
  await ensureDatabase(config.database);
  const app = await createApp(config);
  await app.listen(0, '127.0.0.1');
  return app;
}

export function serverOf(app: NestExpressApplication): Server {
  return app.getHttpServer() as Server;
}

/**
 * A second application beside the first: with its own copy of every module, as another process has, because a model
 * class belongs to one connection pool.
 */
export async function createSecondApp(
  overrides: Partial<AppConfig> = {},
): Promise<NestExpressApplication> {
  const made: NestExpressApplication[] = [];
  await jest.isolateModulesAsync(async () => {
    const { createTestApp: create } = await import('./create-test-app');
    made.push(await create(overrides));
  });
  const [app] = made;
  if (!app) throw new Error('the second application did not start');
  return app;
}
