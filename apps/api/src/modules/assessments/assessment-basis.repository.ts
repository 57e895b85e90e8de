import {
  components,
  loadCases,
  locations,
  operatingCycles,
} from '@ligament/domain/schema/components';
import { findings, flaws } from '@ligament/domain/schema/flaws';
import { inspections } from '@ligament/domain/schema/inspections';
import { growthLaws, materials } from '@ligament/domain/schema/materials';
import { and, asc, desc, eq, notInArray } from 'drizzle-orm';
import type { Database } from '../../db/database';

/** Everything in the register and the site lists that an assessment of a flaw starts from. */
export const assessmentBasisRepository = (db: Database) => ({
  async flaw(siteId: string, flawId: string) {
    const [row] = await db
      .select({ flaw: flaws, component: components, location: locations, material: materials })
      .from(flaws)
      .innerJoin(components, eq(components.id, flaws.componentId))
      .innerJoin(locations, eq(locations.id, flaws.locationId))
      .innerJoin(materials, eq(materials.id, components.materialId))
      .where(and(eq(flaws.siteId, siteId), eq(flaws.id, flawId)));
    return row;
  },

  /** Findings with their inspections, newest first; those of void or rejected inspections do not count. */
  findings: (flawId: string) =>
    db
      .select({ finding: findings, inspection: inspections })
      .from(findings)
      .innerJoin(inspections, eq(inspections.id, findings.inspectionId))
      .where(and(eq(findings.flawId, flawId), notInArray(inspections.state, ['void', 'rejected'])))
      .orderBy(desc(findings.inspectedOn), desc(findings.createdAt)),

  loadCases: (componentId: string) =>
    db
      .select()
      .from(loadCases)
      .where(eq(loadCases.componentId, componentId))
      .orderBy(asc(loadCases.name)),

  operatingCycles: (componentId: string) =>
    db
      .select()
      .from(operatingCycles)
      .where(eq(operatingCycles.componentId, componentId))
      .orderBy(asc(operatingCycles.name)),

  growthLaws: (siteId: string) =>
    db
      .select()
      .from(growthLaws)
      .where(eq(growthLaws.siteId, siteId))
      .orderBy(asc(growthLaws.title)),
});

type Repository = ReturnType<typeof assessmentBasisRepository>;
type Row<K extends keyof Repository> = NonNullable<Awaited<ReturnType<Repository[K]>>>;

/** What the repository finds, put together for one assessment. */
export interface AssessmentBasis {
  readonly flaw: Row<'flaw'>['flaw'];
  readonly component: Row<'flaw'>['component'];
  readonly location: Row<'flaw'>['location'];
  readonly material: Row<'flaw'>['material'];
  readonly finding: Row<'findings'>[number]['finding'];
  readonly inspection: Row<'findings'>[number]['inspection'];
  readonly earlier: readonly Row<'findings'>[number]['finding'][];
  readonly loadCase: Row<'loadCases'>[number];
  readonly loadCases: Row<'loadCases'>;
  readonly cycles: Row<'operatingCycles'>;
  readonly growthLaw: Row<'growthLaws'>[number] | undefined;
}
