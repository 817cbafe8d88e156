import { createConnection } from 'mariadb';
import type { Connection } from 'mariadb';
import type { DatabaseConfig } from '../config/environment';

/** A connection of its own, outside the pool: named locks and migrations belong to one connection. */
export function connect(database: DatabaseConfig): Promise<Connection> {
  return createConnection({
    host: database.host,
    port: database.port,
    database: database.name,
    user: database.user,
    password: database.password,
    connectTimeout: 5000,
    bigIntAsNumber: true,
    timezone: '+00:00',
  });
}
