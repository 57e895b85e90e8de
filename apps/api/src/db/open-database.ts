import { join } from 'node:path';
import type { PGlite } from '@electric-sql/pglite';
import { tables } from '@ligament/domain/schema/tables';
import { drizzle as drizzleServer } from 'drizzle-orm/node-postgres';
import { migrate as migrateServer } from 'drizzle-orm/node-postgres/migrator';
import { drizzle } from 'drizzle-orm/pglite';
import { migrate } from 'drizzle-orm/pglite/migrator';
import type { Logger } from 'pino';
import { lockDataFolder } from './data-folder-lock';
import type { Database } from './database';
import { freeSpaceGuard } from './free-space';
import { startMaintenance } from './maintenance';
import { migrationsFolder, refuseNewerSchema } from './migrations';
import { SupervisedPglite } from './supervised-pglite';

export interface OpenDatabase {
  readonly db: Database;
  readonly healthy: () => boolean;
  /** Brings the statistics up to date after many rows were written. */
  readonly analyze: () => Promise<void>;
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
  return options.databaseUrl ? openServer(options.databaseUrl) : openEmbedded(options);
}

async function openEmbedded({ dataDir, log, deadlineMs = 5000 }: Options): Promise<OpenDatabase> {
  const unlock = lockDataFolder(dataDir);
  const client = new SupervisedPglite(
    join(dataDir, 'database'),
    log,
    MIGRATION_DEADLINE_MS,
    freeSpaceGuard(dataDir),
  );
  try {
    await client.open();
    // the query builder uses only query() and transaction() of a PGlite
    const db = drizzle({ client: client as unknown as PGlite, schema: tables });
    await refuseNewerSchema(db);
    await migrate(db, { migrationsFolder: migrationsFolder() });
    await client.actAsApplication();
    client.deadlineMs = deadlineMs;
    const stopMaintenance = startMaintenance((sql) => client.maintain(sql), log);
    return {
      db,
      healthy: () => client.healthy(),
      analyze: () => client.maintain('analyze'),
      close: async () => {
        stopMaintenance();
        await client.close();
        unlock();
      },
    };
  } catch (error) {
    await client.close().catch(() => undefined);
    unlock();
    throw error;
  }
}

async function openServer(url: string): Promise<OpenDatabase> {
  const { Pool } = (await import('pg')).default;
  const pool = new Pool({ connectionString: url, max: 10, statement_timeout: 30_000 });
  const db = drizzleServer({ client: pool, schema: tables });
  await refuseNewerSchema(db);
  await migrateServer(db, { migrationsFolder: migrationsFolder() });
  return {
    db,
    healthy: () => true,
    analyze: async () => void (await pool.query('analyze')),
    close: () => pool.end(),
  };
}
