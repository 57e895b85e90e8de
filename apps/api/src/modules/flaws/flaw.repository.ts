import { assessments } from '@ligament/domain/schema/assessments';
import { components, locations } from '@ligament/domain/schema/components';
import { findings, flaws } from '@ligament/domain/schema/flaws';
import { inspections } from '@ligament/domain/schema/inspections';
import { people } from '@ligament/domain/schema/people';
import { reinspections, shutdownWindows } from '@ligament/domain/schema/schedule';
import { units } from '@ligament/domain/schema/sites';
import { and, asc, desc, eq, notInArray, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Database } from '../../db/database';

export type FlawRecord = typeof flaws.$inferSelect;

const findingColumns = {
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
};

export const flawRepository = (db: Database) => ({
  async byId(siteId: string, id: string) {
    const [row] = await db
      .select({ flaw: flaws, component: components, location: locations, unit: units })
      .from(flaws)
      .innerJoin(components, eq(components.id, flaws.componentId))
      .innerJoin(locations, eq(locations.id, flaws.locationId))
      .innerJoin(units, eq(units.id, components.unitId))
      .where(and(eq(flaws.siteId, siteId), eq(flaws.id, id)));
    return row;
  },

  /** Findings of a flaw, oldest first; those of void inspections do not count. */
  findings: (flawId: string) =>
    db
      .select(findingColumns)
      .from(findings)
      .innerJoin(inspections, eq(inspections.id, findings.inspectionId))
      .where(and(eq(findings.flawId, flawId), notInArray(inspections.state, ['void', 'rejected'])))
      .orderBy(asc(findings.inspectedOn), asc(findings.createdAt)),

  async finding(id: string) {
    const [row] = await db
      .select(findingColumns)
      .from(findings)
      .innerJoin(inspections, eq(inspections.id, findings.inspectionId))
      .where(eq(findings.id, id));
    return row;
  },

  /** Assessments of a flaw in short, newest first. */
  assessments(flawId: string) {
    const reviewers = alias(people, 'reviewers');
    return db
      .select({
        id: assessments.id,
        revision: assessments.revision,
        state: assessments.state,
        inspectedOn: assessments.inspectedOn,
        verdict: sql<
          'acceptable' | 'near the limit' | 'not acceptable' | null
        >`${assessments.outcome} ->> 'verdict'`,
        lifeYears: sql<number | null>`(${assessments.outcome} #>> '{life,years}')::float8`,
        chosenDueOn: assessments.chosenDueOn,
        authorName: people.name,
        reviewerName: reviewers.name,
        approvedAt: assessments.approvedAt,
        updatedAt: assessments.updatedAt,
      })
      .from(assessments)
      .innerJoin(people, eq(people.id, assessments.authorId))
      .leftJoin(reviewers, eq(reviewers.id, assessments.reviewerId))
      .where(eq(assessments.flawId, flawId))
      .orderBy(desc(assessments.revision));
  },

  async openReinspection(flawId: string) {
    const [row] = await db
      .select({
        id: reinspections.id,
        dueOn: reinspections.dueOn,
        limitOn: reinspections.limitOn,
        basis: reinspections.basis,
        state: reinspections.state,
        plannedOn: reinspections.plannedOn,
        windowCode: shutdownWindows.code,
      })
      .from(reinspections)
      .leftJoin(shutdownWindows, eq(shutdownWindows.id, reinspections.windowId))
      .where(
        and(
          eq(reinspections.flawId, flawId),
          notInArray(reinspections.state, ['done', 'cancelled']),
        ),
      );
    return row;
  },

  async add(values: typeof flaws.$inferInsert): Promise<FlawRecord | undefined> {
    const [row] = await db.insert(flaws).values(values).returning();
    return row;
  },

  /** Highest running number among a component's flaws; 0 when it has none. */
  async highestNumber(componentId: string): Promise<number> {
    const [row] = await db
      .select({
        highest: sql<number>`coalesce(max(substring(${flaws.number} from '-F([0-9]+)$')::int), 0)`,
      })
      .from(flaws)
      .where(eq(flaws.componentId, componentId));
    return row?.highest ?? 0;
  },

  /** Flaws of one weld that may be found again, with their newest size. */
  ofLocation: (locationId: string) =>
    db
      .select({
        flawId: flaws.id,
        number: flaws.number,
        axialMm: flaws.axialMm,
        circumferentialMm: flaws.circumferentialMm,
        heightMm: sql<
          number | null
        >`(select n.height_mm from findings n where n.flaw_id = flaws.id order by n.inspected_on desc limit 1)`,
        lengthMm: sql<
          number | null
        >`(select n.length_mm from findings n where n.flaw_id = flaws.id order by n.inspected_on desc limit 1)`,
        inspectedOn: sql<
          string | null
        >`(select max(n.inspected_on)::text from findings n where n.flaw_id = flaws.id)`,
      })
      .from(flaws)
      .where(and(eq(flaws.locationId, locationId), notInArray(flaws.state, ['removed', 'closed']))),

  async change(
    siteId: string,
    id: string,
    seen: number,
    values: Partial<typeof flaws.$inferInsert>,
  ) {
    const [row] = await db
      .update(flaws)
      .set({ ...values, version: sql`${flaws.version} + 1` })
      .where(and(eq(flaws.siteId, siteId), eq(flaws.id, id), eq(flaws.version, seen)))
      .returning();
    return row;
  },

  /** Sets the state as a consequence of another change; no version is asked for. */
  async setState(id: string, state: FlawRecord['state'], now: Date): Promise<void> {
    await db
      .update(flaws)
      .set({ state, updatedAt: now, version: sql`${flaws.version} + 1` })
      .where(eq(flaws.id, id));
  },
});
