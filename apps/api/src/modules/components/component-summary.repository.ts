import { locations } from '@ligament/domain/schema/components';
import { findings, flaws } from '@ligament/domain/schema/flaws';
import { inspections } from '@ligament/domain/schema/inspections';
import { reinspections, shutdownWindows } from '@ligament/domain/schema/schedule';
import { and, asc, count, desc, eq, notInArray, sql } from 'drizzle-orm';
import type { Database } from '../../db/database';

const newestFinding = (column: 'height_mm' | 'length_mm') =>
  column === 'height_mm'
    ? sql<
        number | null
      >`(select n.height_mm from findings n where n.flaw_id = ${flaws.id} order by n.inspected_on desc, n.created_at desc limit 1)`
    : sql<
        number | null
      >`(select n.length_mm from findings n where n.flaw_id = ${flaws.id} order by n.inspected_on desc, n.created_at desc limit 1)`;

/** What other parts of the product know of a component, in short. */
export const componentSummaryRepository = (db: Database, componentId: string) => ({
  flaws: () =>
    db
      .select({
        id: flaws.id,
        number: flaws.number,
        locationName: locations.name,
        kind: flaws.kind,
        state: flaws.state,
        heightMm: newestFinding('height_mm'),
        lengthMm: newestFinding('length_mm'),
        inspectedOn: sql<
          string | null
        >`(select max(n.inspected_on)::text from findings n where n.flaw_id = ${flaws.id})`,
        verdict: sql<
          'acceptable' | 'near the limit' | 'not acceptable' | null
        >`(select a.outcome ->> 'verdict' from assessments a where a.flaw_id = ${flaws.id} and a.state = 'approved' limit 1)`,
        dueOn: sql<
          string | null
        >`(select r.due_on::text from reinspections r where r.flaw_id = ${flaws.id} and r.state not in ('done', 'cancelled') limit 1)`,
      })
      .from(flaws)
      .innerJoin(locations, eq(locations.id, flaws.locationId))
      .where(eq(flaws.componentId, componentId))
      .orderBy(asc(flaws.number)),

  reinspections: () =>
    db
      .select({
        id: reinspections.id,
        task: reinspections.task,
        technique: reinspections.technique,
        dueOn: reinspections.dueOn,
        basis: reinspections.basis,
        state: reinspections.state,
        windowCode: shutdownWindows.code,
      })
      .from(reinspections)
      .leftJoin(shutdownWindows, eq(shutdownWindows.id, reinspections.windowId))
      .where(
        and(
          eq(reinspections.componentId, componentId),
          notInArray(reinspections.state, ['done', 'cancelled']),
        ),
      )
      .orderBy(asc(reinspections.dueOn)),

  inspections: () =>
    db
      .select({
        id: inspections.id,
        reportNo: inspections.reportNo,
        technique: inspections.technique,
        inspectedOn: inspections.inspectedOn,
        plannedOn: inspections.plannedOn,
        state: inspections.state,
        findings: count(findings.id),
      })
      .from(inspections)
      .leftJoin(findings, eq(findings.inspectionId, inspections.id))
      .where(eq(inspections.componentId, componentId))
      .groupBy(inspections.id)
      .orderBy(desc(sql`coalesce(${inspections.inspectedOn}, ${inspections.plannedOn})`))
      .limit(20),
});
