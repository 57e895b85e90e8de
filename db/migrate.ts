// npm run migrate: brings the database of the settings up to date without starting the product.
import { resolve } from 'node:path';
import { pino } from 'pino';
import { readConfig } from '../apps/api/src/config';
import { openDatabase } from '../apps/api/src/db/open-database';
import { explain } from '../apps/api/src/start-failure';

try {
  const config = readConfig(process.env);
  const database = await openDatabase({
    dataDir: resolve(config.dataDir),
    databaseUrl: config.databaseUrl,
    log: pino({ level: config.logLevel }),
  });
  await database.close();
  console.log('The database is up to date.');
} catch (error) {
  const { exitCode, message } = explain(error);
  console.error(
    message.replace('Ligament cannot start', 'The database cannot be brought up to date'),
  );
  process.exit(exitCode);
}
