import { pino } from 'pino';
import { openDatabase } from '../../apps/api/src/db/open-database';
import { sql } from 'drizzle-orm';
import { sites } from '@ligament/domain/schema/sites';
let t = Date.now();
const lap = (s: string) => {
  console.log(s, Date.now() - t);
  t = Date.now();
};
const o = await openDatabase({ dataDir: '/tmp/dbh/data', log: pino({ level: 'info' }) });
lap('open');
for (const s of [
  'reset role',
  'select current_user, session_user',
  "select set_config('role','postgres',false)",
  'do $$ begin end $$',
  "copy sites from program 'x'",
  '/* x */ RESET role',
  'select 1; reset role',
  'update history set summary = 1',
  'delete from signatures',
  'truncate history',
  'checkpoint',
])
  await o.db.execute(sql.raw(s)).then(
    (r: any) => console.log(s, r.rows),
    (e) => console.log(s, '->', e.cause?.message),
  );
await o.db.insert(sites).values({ code: 'A' + Date.now(), name: 'x', timeZone: 'UTC' });
lap('q');
await o.analyze();
await o.checkpoint();
lap('maintain');
await o.copyTo?.('/tmp/dbh/copy');
lap('copy');
await o.close();
lap('close');
