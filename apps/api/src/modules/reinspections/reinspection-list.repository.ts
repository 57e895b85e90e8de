import type { listReinspections } from '@ligament/domain/contract/reinspections';
import { components, locations } from '@ligament/domain/schema/components';
import { flaws } from '@ligament/domain/schema/flaws';
import { reinspections, shutdownWindows } from '@ligament/domain/schema/schedule';
import { units } from '@ligament/domain/schema/sites';
import {
  and,
  asc,
  desc,
  eq,
  gt,
  gte,
  ilike,
  lt,
  lte,
  notInArray,
  or,
  sql,
  type SQL,
} from 'drizzle-orm';
import type { z } from 'zod';
import type { Database } from '../../db/database';
import { containing, decodeCursor } from '../../http/cursor';

type Query = z.output<typeof listReinspections.query>;

const columns = {
  id: reinspections.id,
  componentId: reinspections.componentId,
  tag: components.tag,
  componentDescription: components.description,
  unitId: units.id,
  unitCode: units.code,
  flawId: reinspections.flawId,
  flawNumber: flaws.number,
  locationName: locations.name,
  task: reinspections.task,
  technique: reinspections.technique,
  dueOn: reinspections.dueOn,
  limitOn: reinspections.limitOn,
  basis: reinspections.basis,
  state: reinspections.state,
  onStream: reinspections.onStream,
  windowId: reinspections.windowId,
  windowCode: shutdownWindows.code,
  plannedOn: reinspections.plannedOn,
  planNote: reinspections.planNote,
  candidates: reinspections.candidates,
  version: reinspections.version,
  /** Start of the next window of the unit that begins no later than the due date. */
  nextWindow: sql<string | null>`(
    select w.code from shutdown_windows w join shutdown_window_units wu on wu.window_id = w.id
    where wu.unit_id = ${units.id} and w.state <> 'cancelled' and w.ends_on >= current_date and w.starts_on <= ${reinspections.dueOn}
    order by w.starts_on limit 1)`,
};

const SORTS = {
  due: sql<string>`${reinspections.dueOn}::text`,
  tag: sql<string>`${components.tag}`,
};

export const reinspectionListRepository = (db: Database) => {
  const joined = (place: SQL<string>) =>
    db
      .select({ ...columns, place })
      .from(reinspections)
      .innerJoin(components, eq(components.id, reinspections.componentId))
      .innerJoin(units, eq(units.id, components.unitId))
      .leftJoin(flaws, eq(flaws.id, reinspections.flawId))
      .leftJoin(locations, eq(locations.id, flaws.locationId))
      .leftJoin(shutdownWindows, eq(shutdownWindows.id, reinspections.windowId));
  return {
    list(siteId: string, query: Query, today: string, dueSoonOn: string) {
      const down = query.sort.startsWith('-');
      const by = SORTS[query.sort.replace('-', '') as keyof typeof SORTS];
      const direction = down ? desc : asc;
      return joined(by)
        .where(
          and(
            eq(reinspections.siteId, siteId),
            ...filters(query, today, dueSoonOn),
            after(query.cursor, by, down),
          ),
        )
        .orderBy(direction(by), direction(reinspections.id))
        .limit(query.limit + 1);
    },

    /** Still to be done, due no later than a day. */
    openUntil: (siteId: string, until: string) =>
      joined(SORTS.due)
        .where(
          and(
            eq(reinspections.siteId, siteId),
            notInArray(reinspections.state, ['done', 'cancelled']),
            lte(reinspections.dueOn, until),
          ),
        )
        .orderBy(asc(reinspections.dueOn)),

    async byId(siteId: string, id: string) {
      const [row] = await joined(SORTS.due).where(
        and(eq(reinspections.siteId, siteId), eq(reinspections.id, id)),
      );
      return row;
    },
  };
};

export type ReinspectionListRow = NonNullable<
  Awaited<ReturnType<ReturnType<typeof reinspectionListRepository>['byId']>>
>;

function after(cursor: string | undefined, by: SQL, down: boolean): SQL | undefined {
  if (!cursor) return undefined;
  const [place, id] = decodeCursor(cursor, ['string', 'string']);
  return down
    ? sql`(${by}, ${reinspections.id}) < (${place}, ${id}::uuid)`
    : sql`(${by}, ${reinspections.id}) > (${place}, ${id}::uuid)`;
}

function filters(query: Query, today: string, dueSoonOn: string): (SQL | undefined)[] {
  const words = query.search ? containing(query.search) : undefined;
  const { dueOn, state } = reinspections;
  return [
    words
      ? or(
          ilike(components.tag, words),
          ilike(components.description, words),
          ilike(flaws.number, words),
        )
      : undefined,
    query.unit ? eq(components.unitId, query.unit) : undefined,
    query.component ? eq(reinspections.componentId, query.component) : undefined,
    query.window ? eq(reinspections.windowId, query.window) : undefined,
    query.technique ? eq(reinspections.technique, query.technique) : undefined,
    query.urgency === 'overdue' ? lt(dueOn, today) : undefined,
    query.urgency === 'due soon' ? and(gte(dueOn, today), lte(dueOn, dueSoonOn)) : undefined,
    query.urgency === 'later' ? gt(dueOn, dueSoonOn) : undefined,
    stateFilter(query.state, state),
  ];
}

function stateFilter(asked: Query['state'], state: typeof reinspections.state): SQL | undefined {
  if (asked === 'all') return undefined;
  if (asked === undefined) return notInArray(state, ['done', 'cancelled']);
  return eq(state, asked === 'unplanned' ? 'open' : asked);
}
