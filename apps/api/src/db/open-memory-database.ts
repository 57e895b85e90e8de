import { createHash } from 'node:crypto';
import {
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
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

const PGLITE = join(migrationsFolder(), '../../node_modules/@electric-sql/pglite/package.json');
const DAY = 24 * 60 * 60_000;

/** A migrated database in memory for tests, under the application's role; loading the kept dump takes under three seconds. */
export async function openMemoryDatabase(): Promise<{
  readonly db: Database;
  close(): Promise<void>;
}> {
  const dump = readFileSync(await migratedDumpFile());
  const client = await PGlite.create({ loadDataDir: new Blob([dump]) });
  await client.exec(`set role ${APPLICATION_ROLE}`);
  return { db: drizzle({ client, schema: tables }), close: () => client.close() };
}

/** Tar file of a database with every migration applied, made once per set of migrations and kept between runs. */
export async function migratedDumpFile(): Promise<string> {
  const folder = join(tmpdir(), 'ligament-tests');
  const file = join(folder, `${migrationsHash()}.tar`);
  if (!existsSync(file)) {
    const client = await PGlite.create();
    await migrate(drizzle({ client, schema: tables }), { migrationsFolder: migrationsFolder() });
    const dump = await client.dumpDataDir('none');
    await client.close();
    mkdirSync(folder, { recursive: true });
    removeOld(folder);
    const part = `${file}.${process.pid}`;
    writeFileSync(part, Buffer.from(await dump.arrayBuffer()));
    renameSync(part, file);
  }
  return file;
}

/** Each dump is 45 MB; those of earlier migrations are of no use. */
function removeOld(folder: string): void {
  for (const name of readdirSync(folder)) {
    const path = join(folder, name);
    const { mtimeMs } = statSync(path, { throwIfNoEntry: false }) ?? { mtimeMs: Infinity };
    if (Date.now() - mtimeMs > DAY) rmSync(path, { force: true, recursive: true });
  }
}

function migrationsHash(): string {
  const hash = createHash('sha256').update(readFileSync(PGLITE));
  for (const name of readdirSync(migrationsFolder()).sort()) {
    if (name.endsWith('.sql')) hash.update(readFileSync(join(migrationsFolder(), name)));
  }
  hash.update(readFileSync(join(migrationsFolder(), 'meta/_journal.json')));
  return hash.digest('hex').slice(0, 16);
}
