import { Module } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import { DEMO_PASSWORD, DEMO_PEOPLE } from '@fairlead/shared';
import { ConfigModule } from '../config/config.module';
import { EnvironmentError, readEnvironment } from '../config/environment';
import { DatabaseModule } from '../database/database.module';
import { withNamedLock } from '../database/named-lock';
import { DemoSeeder } from './demo-seeder';
import { SeedModule } from './seed.module';

const LOCK_WAIT_SECONDS = 60;

/** `node seed-demo.js`: one line for the scripts, `demo {"outcome": …, "people": […], "password": …}`. */
async function main(): Promise<void> {
  const config = readEnvironment(process.env);

  @Module({ imports: [ConfigModule.register(config), DatabaseModule.register(), SeedModule] })
  class SeedApp {}

  const app = await NestFactory.createApplicationContext(SeedApp, { logger: ['error'] });
  try {
    const outcome = await withNamedLock(config.database, 'fairlead-seed', LOCK_WAIT_SECONDS, () =>
      app.get(DemoSeeder).seed(new Date()),
    );
    if (outcome === null) throw new Error('another process has been seeding for a minute');
    // Where the demo is not, its sign-ins would only mislead.
    const people = outcome === 'not-empty' ? [] : DEMO_PEOPLE;
    process.stdout.write(`demo ${JSON.stringify({ outcome, people, password: DEMO_PASSWORD })}\n`);
  } finally {
    await app.close();
  }
}

main().catch((error: unknown) => {
  console.error(error instanceof EnvironmentError ? error.message : error);
  process.exitCode = 1;
});
