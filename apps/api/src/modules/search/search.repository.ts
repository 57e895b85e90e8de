import type { SearchHit } from '@ligament/domain/contract/search';
import { components, locations } from '@ligament/domain/schema/components';
import { flaws } from '@ligament/domain/schema/flaws';
import { inspections } from '@ligament/domain/schema/inspections';
import { and, asc, desc, eq, ilike, or } from 'drizzle-orm';
import type { Database } from '../../db/database';
import { containing } from '../../http/cursor';

// four kinds share the twenty places of an answer, so that none hides another
const MOST = 5;

/** Looks for words in each kind of record of one site. */
export const searchRepository = (db: Database, siteId: string, words: string) => {
  const like = containing(words);
  return {
    async components(): Promise<SearchHit[]> {
      const rows = await db
        .select({ id: components.id, tag: components.tag, description: components.description })
        .from(components)
        .where(
          and(
            eq(components.siteId, siteId),
            or(
              ilike(components.tag, like),
              ilike(components.description, like),
              ilike(components.drawingNo, like),
            ),
          ),
        )
        .orderBy(asc(components.tag))
        .limit(MOST);
      return rows.map((row) => ({
        kind: 'component',
        id: row.id,
        title: row.tag,
        subtitle: row.description,
        link: `/register/${row.id}`,
      }));
    },

    async flaws(): Promise<SearchHit[]> {
      const rows = await db
        .select({ id: flaws.id, number: flaws.number, description: components.description })
        .from(flaws)
        .innerJoin(components, eq(components.id, flaws.componentId))
        .where(and(eq(flaws.siteId, siteId), ilike(flaws.number, like)))
        .orderBy(asc(flaws.number))
        .limit(MOST);
      return rows.map((row) => ({
        kind: 'flaw',
        id: row.id,
        title: row.number,
        subtitle: row.description,
        link: `/flaws/${row.id}`,
      }));
    },

    async locations(): Promise<SearchHit[]> {
      const rows = await db
        .select({
          id: locations.id,
          name: locations.name,
          kind: locations.kind,
          tag: components.tag,
          componentId: components.id,
        })
        .from(locations)
        .innerJoin(components, eq(components.id, locations.componentId))
        .where(
          and(
            eq(components.siteId, siteId),
            or(ilike(locations.name, like), ilike(locations.description, like)),
          ),
        )
        .orderBy(asc(components.tag), asc(locations.name))
        .limit(MOST);
      return rows.map((row) => ({
        kind: 'location',
        id: row.id,
        title: `${row.tag} ${row.name}`,
        subtitle: row.kind,
        link: `/register/${row.componentId}`,
      }));
    },

    async inspections(): Promise<SearchHit[]> {
      const rows = await db
        .select({
          id: inspections.id,
          reportNo: inspections.reportNo,
          tag: components.tag,
          technique: inspections.technique,
        })
        .from(inspections)
        .innerJoin(components, eq(components.id, inspections.componentId))
        .where(and(eq(inspections.siteId, siteId), ilike(inspections.reportNo, like)))
        .orderBy(desc(inspections.inspectedOn))
        .limit(MOST);
      return rows.map((row) => ({
        kind: 'inspection',
        id: row.id,
        title: row.reportNo,
        subtitle: `${row.tag}, ${row.technique}`,
        link: `/inspections/${row.id}`,
      }));
    },
  };
};
