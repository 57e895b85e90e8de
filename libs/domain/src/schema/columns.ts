import { sql, type SQL } from 'drizzle-orm';
import { type AnyPgColumn, check, integer, timestamp, uuid } from 'drizzle-orm/pg-core';

/** Primary key of every record. */
export const key = () => uuid('id').primaryKey().defaultRandom();

/** Instant in UTC. */
export const at = (name: string) => timestamp(name, { withTimezone: true, mode: 'date' });

/** Number of the record's state; a write must carry the one it has seen. */
export const version = () => integer('version').notNull().default(1);

export const createdAt = () => at('created_at').notNull().defaultNow();
export const updatedAt = () => at('updated_at').notNull().defaultNow();

/** Both bounds on purpose: in PostgreSQL NaN and Infinity pass a lower bound alone. */
export const within = (name: string, column: AnyPgColumn, low: number, high: number) =>
  check(
    name,
    sql`${column} >= ${sql.raw(String(low))} and ${column} <= ${sql.raw(String(high))}` as SQL,
  );

/** A column that takes only the words of a list. */
export const oneOf = (name: string, column: AnyPgColumn, words: readonly string[]) =>
  check(
    name,
    sql`${column} in (${sql.raw(words.map((word) => `'${word.replaceAll("'", "''")}'`).join(', '))})` as SQL,
  );
