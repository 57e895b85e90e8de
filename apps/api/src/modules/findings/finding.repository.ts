import type { FindingRow, listFindings } from '@ligament/domain/contract/findings';
import { components, locations } from '@ligament/domain/schema/components';
import { findings, flaws } from '@ligament/domain/schema/flaws';
import { inspections } from '@ligament/domain/schema/inspections';
import { and, desc, eq, ilike, or, sql } from 'drizzle-orm';
import type { z } from 'zod';
import type { Database } from '../../db/database';
import { containing, decodeCursor } from '../../http/cursor';

type Query = z.output<typeof listFindings.query>;

const columns = {
  id: findings.id,
  inspectionId: findings.inspectionId,
  reportNo: inspections.reportNo,
  technique: inspections.technique,
  inspectedOn: findings.inspectedOn,
  inspectorName: inspections.inspectorName,
  inspectionState: inspections.state,
  indicationType: findings.indicationType,
  kind: findings.kind,
  face: findings.face,
  heightMm: findings.heightMm,
  heightQualifier: findings.heightQualifier,
  heightErrorMm: findings.heightErrorMm,
  lengthMm: findings.lengthMm,
  lengthQualifier: findings.lengthQualifier,
  lengthErrorMm: findings.lengthErrorMm,
  ligamentMm: findings.ligamentMm,
  wallMm: findings.wallMm,
  axialMm: findings.axialMm,
  circumferentialMm: findings.circumferentialMm,
  remarks: findings.remarks,
  flawId: findings.flawId,
  flawNumber: flaws.number,
  componentId: flaws.componentId,
  tag: components.tag,
  locationName: locations.name,
  indicationNo: findings.indicationNo,
};

export const findingRepository = (db: Database) => {
  const joined = () =>
    db
      .select(columns)
      .from(findings)
      .innerJoin(inspections, eq(inspections.id, findings.inspectionId))
      .innerJoin(flaws, eq(flaws.id, findings.flawId))
      .innerJoin(components, eq(components.id, flaws.componentId))
      .innerJoin(locations, eq(locations.id, findings.locationId));
  return {
    list(siteId: string, query: Query): Promise<FindingRow[]> {
      const words = query.search ? containing(query.search) : undefined;
      const [day, id] = query.cursor ? decodeCursor(query.cursor, ['string', 'string']) : [];
      return joined()
        .where(
          and(
            eq(inspections.siteId, siteId),
            query.inspection ? eq(findings.inspectionId, query.inspection) : undefined,
            query.flaw ? eq(findings.flawId, query.flaw) : undefined,
            query.component ? eq(flaws.componentId, query.component) : undefined,
            words
              ? or(
                  ilike(flaws.number, words),
                  ilike(components.tag, words),
                  ilike(inspections.reportNo, words),
                )
              : undefined,
            day === undefined
              ? undefined
              : sql`(${findings.inspectedOn}::text, ${findings.id}) < (${day}, ${id}::uuid)`,
          ),
        )
        .orderBy(desc(sql`${findings.inspectedOn}::text`), desc(findings.id))
        .limit(query.limit + 1);
    },

    async byId(id: string): Promise<FindingRow | undefined> {
      const [row] = await joined().where(eq(findings.id, id));
      return row;
    },

    async add(values: typeof findings.$inferInsert) {
      const [row] = await db.insert(findings).values(values).returning();
      return row;
    },
  };
};
