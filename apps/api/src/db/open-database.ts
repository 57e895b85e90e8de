import { existsSync, renameSync, rmSync } from 'node:fs';
import { cp } from 'node:fs/promises';
import { join } from 'node:path';
import type { PGlite } from '@electric-sql/pglite';
import { tables } from '@ligament/domain/schema/tables';
import { getTableName, is } from 'drizzle-orm';
import { PgTable } from 'drizzle-orm/pg-core';
import { drizzle } from 'drizzle-orm/pglite';
import { migrate } from 'drizzle-orm/pglite/migrator';
import type { Logger } from 'pino';
import { lockDataFolder } from './data-folder-lock';
import type { Database } from './database';
import { freeSpaceGuard } from './free-space';
import { startMaintenance } from './maintenance';
import { migrationsFolder, refuseNewerSchema } from './migrations';
import { openServerDatabase } from './open-server-database';
import { SupervisedPglite } from './supervised-pglite';

export interface OpenDatabase {
  readonly db: Database;
  readonly healthy: () => boolean;
  /** Brings the statistics up to date after many rows were written. */
  readonly analyze: () => Promise<void>;
  /** Brings what was written from the log into the tables, so that the next start is quick. */
  readonly checkpoint: () => Promise<void>;
  /** Copies the database as it stands to a new folder while writes wait; null where the server's own tools do that. */
  readonly copyTo: ((folder: string) => Promise<void>) | null;
  readonly close: () => Promise<void>;
}

interface Options {
  readonly dataDir: string;
  /** Address of a PostgreSQL server to use instead of the embedded database. */
  readonly databaseUrl?: string | null;
  readonly log: Logger;
  readonly deadlineMs?: number;
}

const MIGRATION_DEADLINE_MS = 120_000;

/** Opens the embedded database (or the server named), migrated and ready; throws DatabaseFailure with one clear sentence. */
export function openDatabase(options: Options): Promise<OpenDatabase> {
  return options.databaseUrl
    ? openServerDatabase(options.databaseUrl, options.log)
    : openEmbedded(options);
}

async function openEmbedded({ dataDir, log, deadlineMs = 5000 }: Options): Promise<OpenDatabase> {
  const unlock = lockDataFolder(dataDir);
  const folder = join(dataDir, 'database');
  const guard = freeSpaceGuard(dataDir);
  const client = supervise(folder, log, guard);
  try {
    if (!existsSync(folder)) await createDatabase(folder, log, guard);
    const db = await migrated(client);
    await client.actAsApplication();
    client.deadlineMs = deadlineMs;
    const stopMaintenance = startMaintenance({ upkeep: upkeepOf(client), tableNames, log });
    return {
      db,
      healthy: () => client.healthy(),
      analyze: () => client.maintain('analyze', 'checkpoint'),
      checkpoint: () => client.maintain('checkpoint'),
      copyTo: (target) => client.exclusively(() => copyFolder(folder, target)),
      close: async () => {
        stopMaintenance();
        await client.close();
        unlock();
      },
    };
  } catch (error) {
    await client.close();
    unlock();
    throw error;
  }
}

/**
 * Makes a new database beside its place and moves it there when it is complete: a first start that was cut short leaves
 * nothing half made, and nothing in it was ever answered for.
 */
async function createDatabase(folder: string, log: Logger, guard: () => void): Promise<void> {
  const draft = `${folder}.new`;
  if (existsSync(draft)) {
    log.warn({ draft }, 'an earlier first start was cut short; starting afresh');
    rmSync(draft, { recursive: true });
  }
  const client = supervise(draft, log, guard);
  try {
    await migrated(client);
  } finally {
    await client.close();
  }
  renameSync(draft, folder);
}

const supervise = (folder: string, log: Logger, beforeWrite: () => void) =>
  new SupervisedPglite(folder, log, { deadlineMs: MIGRATION_DEADLINE_MS, beforeWrite });

async function migrated(client: SupervisedPglite): Promise<Database> {
  await client.open();
  // the query builder uses only query() and transaction() of a PGlite
  const db = drizzle({ client: client as unknown as PGlite, schema: tables });
  await refuseNewerSchema(db);
  await migrate(db, { migrationsFolder: migrationsFolder() });
  return db;
}

const tableNames = Object.values(tables)
  .filter((each) => is(each, PgTable))
  .map((table) => getTableName(table));

const upkeepOf = (client: SupervisedPglite) => ({
  maintain: (...statements: readonly string[]) => client.maintain(...statements),
  takeWritten: () => client.takeWritten(),
});

async function copyFolder(from: string, to: string): Promise<void> {
  await cp(from, to, { recursive: true, errorOnExist: true, force: false });
}
