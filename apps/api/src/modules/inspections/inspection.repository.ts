import type { listInspections } from '@ligament/domain/contract/inspections';
import { components } from '@ligament/domain/schema/components';
import { findings } from '@ligament/domain/schema/flaws';
import { imports, inspections, documents } from '@ligament/domain/schema/inspections';
import { people } from '@ligament/domain/schema/people';
import { and, asc, desc, eq, ilike, or, sql, type SQL } from 'drizzle-orm';
import type { z } from 'zod';
import type { Database } from '../../db/database';
import { containing, decodeCursor } from '../../http/cursor';

export type InspectionRecord = typeof inspections.$inferSelect;
type Query = z.output<typeof listInspections.query>;

const findingCount = sql<number>`(select count(*)::int from findings f where f.inspection_id = ${inspections.id})`;
const day = sql<string>`coalesce(${inspections.inspectedOn}, ${inspections.plannedOn}, '0001-01-01')::text`;
const SORTS = { date: day, report: sql<string>`${inspections.reportNo}` };

const rowColumns = {
  id: inspections.id,
  componentId: inspections.componentId,
  tag: components.tag,
  componentDescription: components.description,
  state: inspections.state,
  findings: findingCount,
  reportNo: inspections.reportNo,
  revision: inspections.revision,
  technique: inspections.technique,
  plannedOn: inspections.plannedOn,
  inspectedOn: inspections.inspectedOn,
  inspectorName: inspections.inspectorName,
};

export const inspectionRepository = (db: Database) => ({
  list(siteId: string, query: Query) {
    const down = query.sort.startsWith('-');
    const by = SORTS[query.sort.replace('-', '') as keyof typeof SORTS];
    const direction = down ? desc : asc;
    return db
      .select({ ...rowColumns, place: by })
      .from(inspections)
      .innerJoin(components, eq(components.id, inspections.componentId))
      .where(and(eq(inspections.siteId, siteId), ...filters(query), after(query.cursor, by, down)))
      .orderBy(direction(by), direction(inspections.id))
      .limit(query.limit + 1);
  },

  ofComponent: (siteId: string, componentId: string) =>
    db
      .select(rowColumns)
      .from(inspections)
      .innerJoin(components, eq(components.id, inspections.componentId))
      .where(and(eq(inspections.siteId, siteId), eq(inspections.componentId, componentId)))
      .orderBy(desc(day)),

  async byId(siteId: string, id: string) {
    const [row] = await db
      .select({ inspection: inspections, component: components, findings: findingCount })
      .from(inspections)
      .innerJoin(components, eq(components.id, inspections.componentId))
      .where(and(eq(inspections.siteId, siteId), eq(inspections.id, id)));
    return row;
  },

  async add(values: typeof inspections.$inferInsert): Promise<InspectionRecord | undefined> {
    const [row] = await db.insert(inspections).values(values).returning();
    return row;
  },

  async change(
    siteId: string,
    id: string,
    seen: number,
    values: Partial<typeof inspections.$inferInsert>,
  ): Promise<InspectionRecord | undefined> {
    const [row] = await db
      .update(inspections)
      .set({ ...values, version: sql`${inspections.version} + 1` })
      .where(
        and(eq(inspections.siteId, siteId), eq(inspections.id, id), eq(inspections.version, seen)),
      )
      .returning();
    return row;
  },

  flawsFound: (inspectionId: string) =>
    db
      .selectDistinct({ flawId: findings.flawId })
      .from(findings)
      .where(eq(findings.inspectionId, inspectionId)),

  imports: (inspectionId: string) =>
    db
      .select({
        id: imports.id,
        fileName: documents.fileName,
        state: imports.state,
        createdAt: imports.createdAt,
        createdByName: people.name,
      })
      .from(imports)
      .innerJoin(documents, eq(documents.id, imports.documentId))
      .innerJoin(people, eq(people.id, imports.createdBy))
      .where(eq(imports.inspectionId, inspectionId))
      .orderBy(desc(imports.createdAt)),
});

function after(cursor: string | undefined, by: SQL, down: boolean): SQL | undefined {
  if (!cursor) return undefined;
  const [place, id] = decodeCursor(cursor, ['string', 'string']);
  return down
    ? sql`(${by}, ${inspections.id}) < (${place}, ${id}::uuid)`
    : sql`(${by}, ${inspections.id}) > (${place}, ${id}::uuid)`;
}

function filters(query: Query): (SQL | undefined)[] {
  const words = query.search ? containing(query.search) : undefined;
  return [
    words
      ? or(
          ilike(inspections.reportNo, words),
          ilike(components.tag, words),
          ilike(inspections.inspectorName, words),
        )
      : undefined,
    query.state ? eq(inspections.state, query.state) : undefined,
    query.technique ? eq(inspections.technique, query.technique) : undefined,
    query.component ? eq(inspections.componentId, query.component) : undefined,
  ];
}
