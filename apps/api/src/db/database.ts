import type { tables } from '@ligament/domain/schema/tables';
import type { PgDatabase, PgQueryResultHKT } from 'drizzle-orm/pg-core';

/** The database as use cases see it: the same type for every driver. */
export type Database = PgDatabase<PgQueryResultHKT, typeof tables>;

/** A transaction in progress; inside one, nothing but it may be used. */
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0];
