import { readDatabaseEnvironment } from '../config/environment';
import { migrateDown, migrateUp } from './migrator';

/** `node migrate.js` brings the database up to date; `node migrate.js down [steps]` takes steps back (1). */
async function main([direction = 'up', steps = '1']: string[]): Promise<void> {
  const database = readDatabaseEnvironment(process.env);
  const names =
    direction === 'down' ? await migrateDown(database, Number(steps)) : await migrateUp(database);
  process.stdout.write(
    `migrated ${direction}: ${names.length ? names.join(', ') : 'nothing to do'}\n`,
  );
}

main(process.argv.slice(2)).catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
