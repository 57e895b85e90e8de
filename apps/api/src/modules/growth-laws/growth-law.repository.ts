import { growthLaws } from '@ligament/domain/schema/materials';
import { and, asc, eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/database';

export type GrowthLawRow = typeof growthLaws.$inferSelect;

export const growthLawRepository = (db: Database) => ({
  list: (siteId: string) =>
    db
      .select()
      .from(growthLaws)
      .where(eq(growthLaws.siteId, siteId))
      .orderBy(asc(growthLaws.title)),

  async byId(siteId: string, id: string): Promise<GrowthLawRow | undefined> {
    const [row] = await db
      .select()
      .from(growthLaws)
      .where(and(eq(growthLaws.siteId, siteId), eq(growthLaws.id, id)));
    return row;
  },

  async add(values: typeof growthLaws.$inferInsert): Promise<GrowthLawRow | undefined> {
    const [row] = await db.insert(growthLaws).values(values).returning();
    return row;
  },

  async change(
    siteId: string,
    id: string,
    seen: number,
    values: Partial<typeof growthLaws.$inferInsert>,
  ) {
    const [row] = await db
      .update(growthLaws)
      .set({ ...values, version: sql`${growthLaws.version} + 1` })
      .where(
        and(eq(growthLaws.siteId, siteId), eq(growthLaws.id, id), eq(growthLaws.version, seen)),
      )
      .returning();
    return row;
  },
});
