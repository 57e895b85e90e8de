import { components } from '@ligament/domain/schema/components';
import { materials } from '@ligament/domain/schema/materials';
import { and, asc, count, eq, gt, ilike, or, sql } from 'drizzle-orm';
import type { Database } from '../../db/database';
import { containing } from '../../http/cursor';

export type MaterialRow = typeof materials.$inferSelect;

export const materialRepository = (db: Database) => ({
  /** One more row than the page holds, in order of name. */
  list(
    siteId: string,
    { search, after, limit }: { search?: string; after?: string; limit: number },
  ) {
    return db
      .select({ material: materials, components: count(components.id) })
      .from(materials)
      .leftJoin(components, eq(components.materialId, materials.id))
      .where(
        and(
          eq(materials.siteId, siteId),
          after === undefined ? undefined : gt(materials.name, after),
          search
            ? or(
                ilike(materials.name, containing(search)),
                ilike(materials.specification, containing(search)),
                ilike(materials.heatNo, containing(search)),
              )
            : undefined,
        ),
      )
      .groupBy(materials.id)
      .orderBy(asc(materials.name))
      .limit(limit + 1);
  },

  async byId(siteId: string, id: string) {
    const [row] = await db
      .select({ material: materials, components: count(components.id) })
      .from(materials)
      .leftJoin(components, eq(components.materialId, materials.id))
      .where(and(eq(materials.siteId, siteId), eq(materials.id, id)))
      .groupBy(materials.id);
    return row;
  },

  async add(values: typeof materials.$inferInsert): Promise<MaterialRow | undefined> {
    const [row] = await db.insert(materials).values(values).returning();
    return row;
  },

  async change(
    siteId: string,
    id: string,
    seen: number,
    values: Partial<typeof materials.$inferInsert>,
  ) {
    const [row] = await db
      .update(materials)
      .set({ ...values, version: sql`${materials.version} + 1` })
      .where(and(eq(materials.siteId, siteId), eq(materials.id, id), eq(materials.version, seen)))
      .returning();
    return row;
  },
});
