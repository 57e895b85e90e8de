import {
  reinspections,
  shutdownWindows,
  shutdownWindowUnits,
} from '@ligament/domain/schema/schedule';
import { units } from '@ligament/domain/schema/sites';
import { and, asc, eq, gte, inArray, ne, sql } from 'drizzle-orm';
import type { Database } from '../../db/database';

export type WindowRecord = typeof shutdownWindows.$inferSelect;

// written out in full: a query of one table leaves the table's name away, and the inner one would take the id for its own
const unitIds = sql<
  string[]
>`coalesce((select array_agg(u.id::text order by u.code) from shutdown_window_units w join units u on u.id = w.unit_id where w.window_id = shutdown_windows.id), '{}')`;
const unitCodes = sql<
  string[]
>`coalesce((select array_agg(u.code order by u.code) from shutdown_window_units w join units u on u.id = w.unit_id where w.window_id = shutdown_windows.id), '{}')`;
const planned = sql<number>`(select count(*)::int from reinspections r where r.window_id = shutdown_windows.id and r.state = 'planned')`;

const columns = {
  id: shutdownWindows.id,
  code: shutdownWindows.code,
  name: shutdownWindows.name,
  kind: shutdownWindows.kind,
  startsOn: shutdownWindows.startsOn,
  endsOn: shutdownWindows.endsOn,
  scopeFreezeOn: shutdownWindows.scopeFreezeOn,
  state: shutdownWindows.state,
  version: shutdownWindows.version,
  unitIds,
  unitCodes,
  planned,
};

export const windowRepository = (db: Database) => ({
  list: (siteId: string) =>
    db
      .select(columns)
      .from(shutdownWindows)
      .where(eq(shutdownWindows.siteId, siteId))
      .orderBy(asc(shutdownWindows.startsOn)),

  async byId(siteId: string, id: string) {
    const [row] = await db
      .select(columns)
      .from(shutdownWindows)
      .where(and(eq(shutdownWindows.siteId, siteId), eq(shutdownWindows.id, id)));
    return row;
  },

  /** Windows of a unit that have not ended by a day and are not cancelled. */
  ofUnit: (siteId: string, unitId: string, from: string) =>
    db
      .select(columns)
      .from(shutdownWindows)
      .innerJoin(shutdownWindowUnits, eq(shutdownWindowUnits.windowId, shutdownWindows.id))
      .where(
        and(
          eq(shutdownWindows.siteId, siteId),
          eq(shutdownWindowUnits.unitId, unitId),
          gte(shutdownWindows.endsOn, from),
          ne(shutdownWindows.state, 'cancelled'),
        ),
      )
      .orderBy(asc(shutdownWindows.startsOn)),

  async unitsAreOurs(siteId: string, ids: readonly string[]): Promise<boolean> {
    const found = await db
      .select({ id: units.id })
      .from(units)
      .where(and(eq(units.siteId, siteId), inArray(units.id, [...ids])));
    return found.length === new Set(ids).size;
  },

  async add(values: typeof shutdownWindows.$inferInsert): Promise<WindowRecord | undefined> {
    const [row] = await db.insert(shutdownWindows).values(values).returning();
    return row;
  },

  async change(
    siteId: string,
    id: string,
    seen: number,
    values: Partial<typeof shutdownWindows.$inferInsert>,
  ) {
    const [row] = await db
      .update(shutdownWindows)
      .set({ ...values, version: sql`${shutdownWindows.version} + 1` })
      .where(
        and(
          eq(shutdownWindows.siteId, siteId),
          eq(shutdownWindows.id, id),
          eq(shutdownWindows.version, seen),
        ),
      )
      .returning();
    return row;
  },

  async setUnits(windowId: string, ids: readonly string[]): Promise<void> {
    await db.delete(shutdownWindowUnits).where(eq(shutdownWindowUnits.windowId, windowId));
    await db.insert(shutdownWindowUnits).values(ids.map((unitId) => ({ windowId, unitId })));
  },

  plannedInto: (windowId: string) =>
    db
      .select()
      .from(reinspections)
      .where(and(eq(reinspections.windowId, windowId), eq(reinspections.state, 'planned'))),
});
