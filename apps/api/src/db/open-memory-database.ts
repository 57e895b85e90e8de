import { createHash } from 'node:crypto';
import {
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  renameSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import { tables } from '@ligament/domain/schema/tables';
import { drizzle } from 'drizzle-orm/pglite';
import { migrate } from 'drizzle-orm/pglite/migrator';
import type { Database } from './database';
import { migrationsFolder } from './migrations';
import { APPLICATION_ROLE } from './worker-messages';

/** A migrated database in memory for tests, under the application's role; loading the kept dump takes under three seconds. */
export async function openMemoryDatabase(): Promise<{
  readonly db: Database;
  close(): Promise<void>;
}> {
  const client = await PGlite.create({ loadDataDir: await migratedDump() });
  await client.exec(`set role ${APPLICATION_ROLE}`);
  return { db: drizzle({ client, schema: tables }), close: () => client.close() };
}

/** Dump of a database with every migration applied, made once per set of migrations and kept between runs. */
async function migratedDump(): Promise<Blob> {
  const folder = join(tmpdir(), 'ligament-tests');
  const file = join(folder, `${migrationsHash()}.tar`);
  if (!existsSync(file)) {
    const client = await PGlite.create();
    await migrate(drizzle({ client, schema: tables }), { migrationsFolder: migrationsFolder() });
    const dump = await client.dumpDataDir('none');
    await client.close();
    mkdirSync(folder, { recursive: true });
    const part = `${file}.${process.pid}`;
    writeFileSync(part, Buffer.from(await dump.arrayBuffer()));
    renameSync(part, file);
  }
  return new Blob([readFileSync(file)]);
}

function migrationsHash(): string {
  const hash = createHash('sha256');
  for (const name of readdirSync(migrationsFolder()).sort()) {
    if (name.endsWith('.sql')) hash.update(readFileSync(join(migrationsFolder(), name)));
  }
  return hash.digest('hex').slice(0, 16);
}
