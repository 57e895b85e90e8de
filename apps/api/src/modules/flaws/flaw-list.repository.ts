import type { FlawRow, listFlaws } from '@ligament/domain/contract/flaws';
import { components, locations } from '@ligament/domain/schema/components';
import { flaws } from '@ligament/domain/schema/flaws';
import { units } from '@ligament/domain/schema/sites';
import { and, asc, desc, eq, ilike, or, sql, type SQL } from 'drizzle-orm';
import type { z } from 'zod';
import type { Database } from '../../db/database';
import { containing, decodeCursor } from '../../http/cursor';

type Query = z.output<typeof listFlaws.query>;

/** What a void or rejected inspection recorded does not count. */
const newest = sql`(select n.id from findings n join inspections i on i.id = n.inspection_id where n.flaw_id = ${flaws.id} and i.state not in ('void', 'rejected') order by n.inspected_on desc, n.created_at desc limit 1)`;
const heightMm = sql<number | null>`(select n.height_mm from findings n where n.id = ${newest})`;
const lengthMm = sql<number | null>`(select n.length_mm from findings n where n.id = ${newest})`;
const inspectedOn = sql<
  string | null
>`(select n.inspected_on::text from findings n where n.id = ${newest})`;
const verdict = sql<
  FlawRow['verdict']
>`(select a.outcome ->> 'verdict' from assessments a where a.flaw_id = ${flaws.id} and a.state = 'approved' limit 1)`;
const lifeYears = sql<
  number | null
>`(select (a.outcome #>> '{life,years}')::float8 from assessments a where a.flaw_id = ${flaws.id} and a.state = 'approved' limit 1)`;
const dueOn = sql<
  string | null
>`(select r.due_on::text from reinspections r where r.flaw_id = ${flaws.id} and r.state not in ('done', 'cancelled') limit 1)`;
const openAssessment = sql<
  FlawRow['openAssessment']
>`(select a.state from assessments a where a.flaw_id = ${flaws.id} and a.state in ('draft', 'submitted', 'returned') limit 1)`;

/** Most pressing first: not acceptable, never assessed, near the limit, the rest. */
const pressing = sql<string>`case
  when ${flaws.state} in ('removed', 'closed') then '9'
  when ${verdict} = 'not acceptable' then '0'
  when ${verdict} is null then '1'
  when ${verdict} = 'near the limit' then '2' else '3' end`;

const SORTS = {
  number: sql<string>`${flaws.number}`,
  due: sql<string>`coalesce(${dueOn}, '9999-12-31')`,
  height: sql<string>`lpad(coalesce(round(${heightMm}::numeric * 1000), 0)::text, 12, '0')`,
  verdict: pressing,
};

/** Flaws of a site, keyset-paged by the chosen sort and the identifier. */
export const flawListRepository = (db: Database) => ({
  list(siteId: string, query: Query, today: string, dueSoonOn: string) {
    const down = query.sort.startsWith('-');
    const by = SORTS[query.sort.replace('-', '') as keyof typeof SORTS];
    const direction = down ? desc : asc;
    return db
      .select({
        id: flaws.id,
        number: flaws.number,
        componentId: flaws.componentId,
        tag: components.tag,
        unitCode: units.code,
        locationName: locations.name,
        kind: flaws.kind,
        face: flaws.face,
        mechanism: flaws.mechanism,
        state: flaws.state,
        heightMm,
        lengthMm,
        inspectedOn,
        verdict,
        lifeYears,
        dueOn,
        openAssessment,
        place: by,
      })
      .from(flaws)
      .innerJoin(components, eq(components.id, flaws.componentId))
      .innerJoin(units, eq(units.id, components.unitId))
      .innerJoin(locations, eq(locations.id, flaws.locationId))
      .where(
        and(
          eq(flaws.siteId, siteId),
          ...filters(query, today, dueSoonOn),
          after(query.cursor, by, down),
        ),
      )
      .orderBy(direction(by), direction(flaws.id))
      .limit(query.limit + 1);
  },
});

function after(cursor: string | undefined, by: SQL, down: boolean): SQL | undefined {
  if (!cursor) return undefined;
  const [place, id] = decodeCursor(cursor, ['string', 'string']);
  return down
    ? sql`(${by}, ${flaws.id}) < (${place}, ${id}::uuid)`
    : sql`(${by}, ${flaws.id}) > (${place}, ${id}::uuid)`;
}

function filters(query: Query, today: string, dueSoonOn: string): (SQL | undefined)[] {
  const words = query.search ? containing(query.search) : undefined;
  return [
    words
      ? or(
          ilike(flaws.number, words),
          ilike(components.tag, words),
          ilike(components.description, words),
          ilike(locations.name, words),
        )
      : undefined,
    query.state ? eq(flaws.state, query.state) : undefined,
    query.unit ? eq(components.unitId, query.unit) : undefined,
    query.component ? eq(flaws.componentId, query.component) : undefined,
    query.verdict ? sql`${verdict} = ${query.verdict}` : undefined,
    query.urgency === 'overdue' ? sql`${dueOn} < ${today}` : undefined,
    query.urgency === 'due soon' ? sql`${dueOn} between ${today} and ${dueSoonOn}` : undefined,
    query.urgency === 'later' ? sql`${dueOn} > ${dueSoonOn}` : undefined,
  ];
}
