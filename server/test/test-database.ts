import { createConnection } from 'mariadb';
import type { DatabaseConfig } from '../src/config/environment';

const { env } = process;

/** A database of this Jest worker alone; `suffix` gives a test one of its own. */
export function testDatabase(suffix = ''): DatabaseConfig {
  if (!env.FAIRLEAD_TEST_DB_PORT) {
    throw new Error(
      'FAIRLEAD_TEST_DB_PORT is not set: run these tests through npm run test:server',
    );
  }
  return {
    host: env.FAIRLEAD_TEST_DB_HOST ?? '127.0.0.1',
    port: Number(env.FAIRLEAD_TEST_DB_PORT),
    user: env.FAIRLEAD_TEST_DB_USER ?? 'fairlead',
    password: env.FAIRLEAD_TEST_DB_PASSWORD ?? '',
    name: `fairlead_test_${env.JEST_WORKER_ID ?? '1'}${suffix}`,
  };
}

/** Outside any database. */
export async function onServer<T>(
  work: (query: (sql: string) => Promise<T>) => Promise<T>,
): Promise<T> {
  const { host, port, user, password } = testDatabase();
  const connection = await createConnection({ host, port, user, password, bigIntAsNumber: true });
  try {
    return await work((sql) => connection.query<T>(sql));
  } finally {
    await connection.end();
  }
}

export async function ensureDatabase({ name }: DatabaseConfig): Promise<void> {
  await onServer((query) => query(`CREATE DATABASE IF NOT EXISTS ${name}`));
}

/** As on a machine where nothing ever ran. */
export async function emptyDatabase({ name }: DatabaseConfig): Promise<void> {
  await onServer(async (query) => {
    await query(`DROP DATABASE IF EXISTS ${name}`);
    return query(`CREATE DATABASE ${name}`);
  });
}
