import {
  components,
  loadCases,
  locations,
  operatingCycles,
} from '@ligament/domain/schema/components';
import { materials } from '@ligament/domain/schema/materials';
import { units } from '@ligament/domain/schema/sites';
import { and, asc, eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/database';

export type ComponentRecord = typeof components.$inferSelect;

export const componentRepository = (db: Database) => ({
  async byId(siteId: string, id: string) {
    const [row] = await db
      .select({ component: components, unit: units, material: materials })
      .from(components)
      .innerJoin(units, eq(units.id, components.unitId))
      .innerJoin(materials, eq(materials.id, components.materialId))
      .where(and(eq(components.siteId, siteId), eq(components.id, id)));
    return row;
  },

  /** Whether unit and material belong to the same site. */
  async partsAreOurs(siteId: string, unitId: string, materialId: string): Promise<boolean> {
    const unit = await db
      .select({ id: units.id })
      .from(units)
      .where(and(eq(units.siteId, siteId), eq(units.id, unitId)));
    const material = await db
      .select({ id: materials.id })
      .from(materials)
      .where(and(eq(materials.siteId, siteId), eq(materials.id, materialId)));
    return unit.length === 1 && material.length === 1;
  },

  async add(values: typeof components.$inferInsert): Promise<ComponentRecord | undefined> {
    const [row] = await db.insert(components).values(values).returning();
    return row;
  },

  async change(
    siteId: string,
    id: string,
    seen: number,
    values: Partial<typeof components.$inferInsert>,
  ) {
    const [row] = await db
      .update(components)
      .set({ ...values, version: sql`${components.version} + 1` })
      .where(
        and(eq(components.siteId, siteId), eq(components.id, id), eq(components.version, seen)),
      )
      .returning();
    return row;
  },

  locations: (componentId: string) =>
    db
      .select()
      .from(locations)
      .where(eq(locations.componentId, componentId))
      .orderBy(asc(locations.name)),
  loadCases: (componentId: string) =>
    db
      .select()
      .from(loadCases)
      .where(eq(loadCases.componentId, componentId))
      .orderBy(asc(loadCases.name)),
  operatingCycles: (componentId: string) =>
    db
      .select()
      .from(operatingCycles)
      .where(eq(operatingCycles.componentId, componentId))
      .orderBy(asc(operatingCycles.name)),
});
