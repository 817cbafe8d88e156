import type { Connection } from 'mariadb';
import type { DatabaseConfig } from '../config/environment';
import { connect } from './connect';

/**
 * Runs work while this process alone holds the name, for this database. Returns null when another process still holds
 * it after `waitSeconds`. The lock dies with its connection, so a killed process never leaves one behind.
 */
export async function withNamedLock<T>(
  database: DatabaseConfig,
  name: string,
  waitSeconds: number,
  work: (connection: Connection) => Promise<T>,
): Promise<T | null> {
  const connection = await connect(database);
  try {
    // The server knows names up to 64 characters.
    const key = `${name}:${database.name}`.slice(0, 64);
    const [row] = await connection.query<{ held: number | null }[]>(
      'SELECT GET_LOCK(?, ?) AS held',
      [key, waitSeconds],
    );
    return row?.held === 1 ? await work(connection) : null;
  } finally {
    await connection.end();
  }
}
