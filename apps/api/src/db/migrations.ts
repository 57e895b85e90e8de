import { existsSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { sql } from 'drizzle-orm';
import type { Database } from './database';
import { DatabaseFailure } from './database-failures';

/** The numbered migrations, found upwards from the source as well as from the bundle. */
export function migrationsFolder(): string {
  let folder = dirname(fileURLToPath(import.meta.url));
  while (folder !== dirname(folder)) {
    const here = join(folder, 'db/migrations');
    if (existsSync(join(here, 'meta/_journal.json'))) return here;
    folder = dirname(folder);
  }
  throw new DatabaseFailure('the folder db/migrations is missing; restore it from the repository.');
}

/** Refuses a database that a newer version of the product has already changed. */
export async function refuseNewerSchema(db: Database): Promise<void> {
  const journal = JSON.parse(
    readFileSync(join(migrationsFolder(), 'meta/_journal.json'), 'utf8'),
  ) as {
    entries: unknown[];
  };
  const found = await db.execute(
    sql`select to_regclass('drizzle.__drizzle_migrations') is not null as there`,
  );
  if (!firstRow(found)['there']) return;
  const applied = await db.execute(
    sql`select count(*)::int as n from drizzle.__drizzle_migrations`,
  );
  const count = Number(firstRow(applied)['n']);
  if (count > journal.entries.length) {
    throw new DatabaseFailure(
      `the database was written by a newer version (${count} migrations, this version knows ${journal.entries.length}). Start the newer version.`,
    );
  }
}

function firstRow(result: unknown): Readonly<Record<string, unknown>> {
  const { rows } = result as { rows: Readonly<Record<string, unknown>>[] };
  return rows[0] ?? {};
}
