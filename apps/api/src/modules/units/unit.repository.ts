import { components } from '@ligament/domain/schema/components';
import { units } from '@ligament/domain/schema/sites';
import { and, asc, count, eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/database';

export const unitRepository = (db: Database) => {
  const view = () =>
    db
      .select({
        id: units.id,
        code: units.code,
        name: units.name,
        version: units.version,
        components: count(components.id),
      })
      .from(units)
      .leftJoin(components, eq(components.unitId, units.id))
      .groupBy(units.id)
      .orderBy(asc(units.code));
  return {
    list: (siteId: string) => view().where(eq(units.siteId, siteId)),

    async byId(siteId: string, id: string) {
      const [row] = await view().where(and(eq(units.siteId, siteId), eq(units.id, id)));
      return row;
    },

    async add(values: typeof units.$inferInsert) {
      const [row] = await db.insert(units).values(values).returning();
      return row;
    },

    async change(
      siteId: string,
      id: string,
      seen: number,
      values: Partial<typeof units.$inferInsert>,
    ) {
      const [row] = await db
        .update(units)
        .set({ ...values, version: sql`${units.version} + 1` })
        .where(and(eq(units.siteId, siteId), eq(units.id, id), eq(units.version, seen)))
        .returning();
      return row;
    },
  };
};
