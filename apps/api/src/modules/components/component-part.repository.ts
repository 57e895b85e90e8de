import {
  components,
  type loadCases,
  type locations,
  type operatingCycles,
} from '@ligament/domain/schema/components';
import { and, eq, getTableColumns, sql } from 'drizzle-orm';
import type { Database } from '../../db/database';

type PartTable = typeof locations | typeof loadCases | typeof operatingCycles;

/** Records below a component: locations, load cases and operating cycles are kept the same way. */
export const componentPartRepository = <T extends PartTable>(db: Database, table: T) => {
  type Row = T['$inferSelect'];
  type Values = T['$inferInsert'];
  const columns: PartTable = table;
  return {
    /** A part of a component of the site, with that component. */
    async byId(siteId: string, id: string) {
      const [row] = await db
        .select({ part: getTableColumns(columns), component: components })
        .from(columns)
        .innerJoin(components, eq(components.id, columns.componentId))
        .where(and(eq(components.siteId, siteId), eq(columns.id, id)));
      return row as { part: Row; component: typeof components.$inferSelect } | undefined;
    },

    async add(values: Values): Promise<Row | undefined> {
      const [row] = await db.insert(columns).values(values).returning();
      return row as Row | undefined;
    },

    async change(id: string, seen: number, values: Partial<Values>): Promise<Row | undefined> {
      const [row] = await db
        .update(columns)
        .set({ ...values, version: sql`${columns.version} + 1` })
        .where(and(eq(columns.id, id), eq(columns.version, seen)))
        .returning();
      return row as Row | undefined;
    },

    async remove(id: string, seen: number): Promise<boolean> {
      const rows = await db
        .delete(columns)
        .where(and(eq(columns.id, id), eq(columns.version, seen)))
        .returning({ id: columns.id });
      return rows.length === 1;
    },
  };
};
