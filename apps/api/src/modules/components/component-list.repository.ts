import type { listComponents } from '@ligament/domain/contract/components';
import { components } from '@ligament/domain/schema/components';
import { materials } from '@ligament/domain/schema/materials';
import { units } from '@ligament/domain/schema/sites';
import { and, asc, desc, eq, ilike, or, sql, type SQL } from 'drizzle-orm';
import type { z } from 'zod';
import type { Database } from '../../db/database';
import { containing, decodeCursor } from '../../http/cursor';

type Query = z.output<typeof listComponents.query>;

/** Flaws that somebody still has to think of. */
const flawCount = sql<number>`(
  select count(*)::int from flaws f where f.component_id = ${components.id} and f.state not in ('removed', 'closed'))`;

/** Worst verdict among the approved assessments in force. */
const worstVerdict = sql<string | null>`(
  select a.outcome ->> 'verdict' from assessments a join flaws f on f.id = a.flaw_id
  where f.component_id = ${components.id} and a.state = 'approved' and f.state not in ('removed', 'closed')
  order by case a.outcome ->> 'verdict' when 'not acceptable' then 0 when 'near the limit' then 1 else 2 end limit 1)`;

const nextDueOn = sql<string | null>`(
  select min(r.due_on)::text from reinspections r
  where r.component_id = ${components.id} and r.state not in ('done', 'cancelled'))`;

/** Sorts after every real date. */
const NO_DATE = '9999-12-31';
const SORTS = {
  tag: sql<string>`${components.tag}`,
  description: sql<string>`${components.description}`,
  due: sql<string>`coalesce(${nextDueOn}, ${NO_DATE})`,
};

/** The register as a list, keyset-paged by the chosen sort and the identifier. */
export const componentListRepository = (db: Database) => ({
  async list(siteId: string, query: Query) {
    const down = query.sort.startsWith('-');
    const by = SORTS[query.sort.replace('-', '') as keyof typeof SORTS];
    const direction = down ? desc : asc;
    return db
      .select({
        component: components,
        unitCode: units.code,
        material: materials.name,
        flaws: flawCount,
        worstVerdict,
        nextDueOn,
        place: by,
      })
      .from(components)
      .innerJoin(units, eq(units.id, components.unitId))
      .innerJoin(materials, eq(materials.id, components.materialId))
      .where(and(eq(components.siteId, siteId), ...filters(query), after(query.cursor, by, down)))
      .orderBy(direction(by), direction(components.id))
      .limit(query.limit + 1);
  },
});

function after(cursor: string | undefined, by: SQL, down: boolean): SQL | undefined {
  if (!cursor) return undefined;
  const [place, id] = decodeCursor(cursor, ['string', 'string']);
  return down
    ? sql`(${by}, ${components.id}) < (${place}, ${id}::uuid)`
    : sql`(${by}, ${components.id}) > (${place}, ${id}::uuid)`;
}

function filters(query: Query): (SQL | undefined)[] {
  const words = query.search ? containing(query.search) : undefined;
  return [
    words
      ? or(
          ilike(components.tag, words),
          ilike(components.description, words),
          ilike(components.drawingNo, words),
        )
      : undefined,
    query.unit ? eq(components.unitId, query.unit) : undefined,
    query.kind ? eq(components.kind, query.kind) : undefined,
    query.state ? eq(components.state, query.state) : undefined,
    query.mechanism ? eq(components.mechanism, query.mechanism) : undefined,
  ];
}
