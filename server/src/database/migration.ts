import type { Connection } from 'mariadb';

/**
 * One small, reversible step. MariaDB commits each DDL statement by itself, so a step must be able to run again after
 * it was cut short: IF NOT EXISTS going up, IF EXISTS coming down.
 */
export interface Migration {
  name: string;
  up: (connection: Connection) => Promise<unknown>;
  down: (connection: Connection) => Promise<unknown>;
}

/** A table and its options; `body` holds columns, keys and indexes. */
export function createTable(name: string, body: string): string {
  return `CREATE TABLE IF NOT EXISTS ${name} (${body})
    ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci ROW_FORMAT=DYNAMIC`;
}

export function tableMigration(number: string, table: string, body: string): Migration {
  return {
    name: `${number}-${table.replaceAll('_', '-')}`,
    up: (connection) => connection.query(createTable(table, body)),
    down: (connection) => connection.query(`DROP TABLE IF EXISTS ${table}`),
  };
}
