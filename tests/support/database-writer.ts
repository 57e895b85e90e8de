// A process of its own that opens a data folder and writes sites one after the other, saying on its output which are kept.
import { sites } from '@ligament/domain/schema/sites';
import { pino } from 'pino';
import { openDatabase } from '../../apps/api/src/db/open-database';

const [dataDir = ''] = process.argv.slice(2);
try {
  const { db } = await openDatabase({ dataDir, log: pino({ level: 'silent' }) });
  for (let number = 1; ; number += 1) {
    await db.insert(sites).values({ code: `W${number}`, name: 'Written', timeZone: 'UTC' });
    process.stdout.write(`${number}\n`);
  }
} catch (error) {
  process.stdout.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(69);
}
