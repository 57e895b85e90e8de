import { tables } from '@ligament/domain/schema/tables';
import { sql } from 'drizzle-orm';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import type { PoolConfig } from 'pg';
import type { Logger } from 'pino';
import { DatabaseFailure } from './database-failures';
import { migrationsFolder, refuseNewerSchema } from './migrations';
import type { OpenDatabase } from './open-database';
import { reasonOf } from './system-error';
import { APPLICATION_ROLE } from './worker-messages';

/** Opens a PostgreSQL server: migrations as the user of the address, everything after under the application's role. */
export async function openServerDatabase(url: string, log: Logger): Promise<OpenDatabase> {
  const { Pool } = (await import('pg')).default;
  const open = (more: PoolConfig) => {
    const pool = new Pool({ connectionString: url, connectionTimeoutMillis: 10_000, ...more });
    // a connection the server closes while idle is replaced at the next query; unheard, it would end the process
    pool.on('error', (error) => log.warn({ err: error }, 'database connection lost'));
    return pool;
  };
  const owner = open({ max: 1 });
  try {
    await prepare(drizzle({ client: owner, schema: tables }));
  } catch (error) {
    if (error instanceof DatabaseFailure) throw error;
    throw new DatabaseFailure(
      `the database server named in DATABASE_URL cannot be used (${reasonOf(error)}).`,
    );
  } finally {
    await owner.end();
  }
  const pool = open({
    max: 10,
    statement_timeout: 30_000,
    options: `-c role=${APPLICATION_ROLE}`,
  });
  return {
    db: drizzle({ client: pool, schema: tables }),
    healthy: () => true,
    // a server looks after its own statistics and checkpoints
    analyze: () => Promise.resolve(),
    checkpoint: () => Promise.resolve(),
    copyTo: null,
    close: () => pool.end(),
  };
}

async function prepare(db: ReturnType<typeof drizzle<typeof tables>>): Promise<void> {
  await refuseNewerSchema(db);
  await migrate(db, { migrationsFolder: migrationsFolder() });
  const { rows } = await db.execute<{ member: boolean }>(
    sql`select pg_has_role(current_user, ${APPLICATION_ROLE}, 'member') as member`,
  );
  if (!rows[0]?.member) {
    await db.execute(sql`grant ${sql.identifier(APPLICATION_ROLE)} to current_user`);
  }
}
