import type { SequelizeOptions } from 'sequelize-typescript';
import type { DatabaseConfig } from '../config/environment';

/** Each pooled connection starts with these; the times are seconds. */
const SESSION = {
  sql_mode:
    'STRICT_ALL_TABLES,ERROR_FOR_DIVISION_BY_ZERO,NO_ZERO_DATE,NO_ZERO_IN_DATE,NO_ENGINE_SUBSTITUTION',
  innodb_lock_wait_timeout: 5,
  max_statement_time: 10,
};

export function sequelizeOptions(database: DatabaseConfig): SequelizeOptions {
  return {
    dialect: 'mariadb',
    host: database.host,
    port: database.port,
    database: database.name,
    username: database.user,
    password: database.password,
    timezone: '+00:00',
    logging: false,
    // DECIMAL stays an exact string, ids and counts become numbers.
    dialectOptions: {
      supportBigNumbers: false,
      bigIntAsNumber: true,
      insertIdAsNumber: true,
      connectTimeout: 5000,
      sessionVariables: SESSION,
    },
    define: { timestamps: false, underscored: true },
    // A request that finds no connection in two seconds is told to come back instead of hanging for a minute.
    pool: { max: 10, min: 0, acquire: 2000, idle: 30_000 },
  };
}
