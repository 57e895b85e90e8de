import type { historyFilters } from '@ligament/domain/contract/history';
import { components } from '@ligament/domain/schema/components';
import { flaws } from '@ligament/domain/schema/flaws';
import { history } from '@ligament/domain/schema/history';
import { sites } from '@ligament/domain/schema/sites';
import { and, asc, desc, eq, gt, ilike, isNull, lt, or, sql, type SQL } from 'drizzle-orm';
import type { z } from 'zod';
import type { Database } from '../../db/database';
import { containing } from '../../http/cursor';

export type HistoryRow = typeof history.$inferSelect;
export type HistoryFilters = z.output<typeof historyFilters>;

export interface NamedHistoryRow {
  readonly entry: HistoryRow;
  readonly componentTag: string | null;
  readonly flawNo: string | null;
}

export const historyRepository = (db: Database) => ({
  /** Entries newest first, before a place in the order. */
  list(
    siteId: string,
    filters: HistoryFilters,
    { before, limit }: { readonly before: number | null; readonly limit: number },
  ): Promise<NamedHistoryRow[]> {
    return db
      .select({ entry: history, componentTag: components.tag, flawNo: flaws.number })
      .from(history)
      .leftJoin(components, eq(components.id, history.componentId))
      .leftJoin(flaws, eq(flaws.id, history.flawId))
      .where(
        and(
          eq(history.siteId, siteId),
          before === null ? undefined : lt(history.seq, before),
          matches(siteId, filters),
        ),
      )
      .orderBy(desc(history.seq))
      .limit(limit);
  },

  /** Entries in the order of recording, after a place in it. */
  chain(siteId: string, after: number, limit: number): Promise<HistoryRow[]> {
    return db
      .select()
      .from(history)
      .where(and(eq(history.siteId, siteId), gt(history.seq, after)))
      .orderBy(asc(history.seq))
      .limit(limit);
  },

  actors(siteId: string, component?: string) {
    return db
      .selectDistinct({ id: history.actorId, name: history.actorName })
      .from(history)
      .where(and(eq(history.siteId, siteId), component ? ofComponent(component) : undefined))
      .orderBy(asc(history.actorName))
      .limit(500);
  },

  async componentExists(siteId: string, id: string): Promise<boolean> {
    const found = await db
      .select({ id: components.id })
      .from(components)
      .where(and(eq(components.siteId, siteId), eq(components.id, id)));
    return found.length > 0;
  },

  async site(siteId: string) {
    const [site] = await db.select().from(sites).where(eq(sites.id, siteId));
    return site;
  },
});

/** The component itself and everything recorded about what belongs to it. */
const ofComponent = (id: string): SQL | undefined =>
  or(eq(history.componentId, id), and(eq(history.entity, 'component'), eq(history.entityId, id)));

const ofFlaw = (id: string): SQL | undefined =>
  or(eq(history.flawId, id), and(eq(history.entity, 'flaw'), eq(history.entityId, id)));

const byActor = (actor: string): SQL =>
  actor === 'system' ? isNull(history.actorId) : eq(history.actorId, actor);

function matches(siteId: string, filters: HistoryFilters): SQL | undefined {
  const { entity, actor, component, flaw } = filters;
  return and(
    entity ? eq(history.entity, entity) : undefined,
    actor ? byActor(actor) : undefined,
    component ? ofComponent(component) : undefined,
    flaw ? ofFlaw(flaw) : undefined,
    withWords(filters.search),
    ...betweenDays(siteId, filters),
  );
}

function withWords(search: string | undefined): SQL | undefined {
  if (!search) return undefined;
  const words = containing(search);
  return or(
    ilike(history.summary, words),
    ilike(history.reason, words),
    ilike(history.actorName, words),
    ilike(components.tag, words),
    ilike(flaws.number, words),
  );
}

/** Days are the site's: midnight there, whatever the server's clock shows. */
function betweenDays(siteId: string, { from, to }: HistoryFilters): (SQL | undefined)[] {
  const zone = sql`(select ${sites.timeZone} from ${sites} where ${sites.id} = ${siteId})`;
  return [
    from ? sql`${history.at} >= (${from}::date)::timestamp at time zone ${zone}` : undefined,
    to ? sql`${history.at} < (${to}::date + 1)::timestamp at time zone ${zone}` : undefined,
  ];
}
