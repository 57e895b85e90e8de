import {
  components,
  loadCases,
  locations,
  operatingCycles,
} from '@ligament/domain/schema/components';
import { findings, flaws } from '@ligament/domain/schema/flaws';
import { inspections } from '@ligament/domain/schema/inspections';
import { growthLaws, materials } from '@ligament/domain/schema/materials';
import { units } from '@ligament/domain/schema/sites';
import type { Database } from '../../apps/api/src/db/database';

let counter = 0;

/** A reactor with a peaked long seam, its material, load case, cycles and a growth law: enough to assess a flaw in it. */
export async function addReactor(db: Database, siteId: string, tag?: string) {
  counter += 1;
  const name = tag ?? `R-${400 + counter}`;
  const [unit] = await db
    .insert(units)
    .values({ siteId, code: `U${counter}-${name}`, name: 'Batch' })
    .returning();
  const certificate = { provenance: 'certificate', note: 'B8830' } as const;
  const [material] = await db
    .insert(materials)
    .values({
      siteId,
      name: `P355GH ${name}`,
      yieldMpa: 285,
      tensileMpa: 460,
      youngsModulusMpa: 207_000,
      poissonsRatio: 0.3,
      toughnessMpaSqrtM: 60,
      toughnessTemperatureC: 20,
      origins: {
        yieldMpa: certificate,
        tensileMpa: certificate,
        youngsModulusMpa: { provenance: 'standard default', note: '' },
        poissonsRatio: { provenance: 'standard default', note: '' },
        toughnessMpaSqrtM: certificate,
      },
    })
    .returning();
  if (!unit || !material) throw new Error('unit or material missing');
  const [component] = await db
    .insert(components)
    .values({
      siteId,
      unitId: unit.id,
      tag: name,
      description: 'Batch reactor',
      kind: 'vessel shell',
      insideDiameterMm: 2600,
      wallMm: 28,
      requiredWallMm: 24.8,
      designPressureMpa: 2.6,
      designTemperatureC: 160,
      operatingPressureMpa: 2.3,
      operatingTemperatureC: 145,
      materialId: material.id,
      heatTreatment: 'post-weld heat treated',
      mechanism: 'fatigue',
      drawingNo: 'D-400',
    })
    .returning();
  if (!component) throw new Error('component missing');
  const [location] = await db
    .insert(locations)
    .values({
      componentId: component.id,
      name: 'L1',
      kind: 'longitudinal weld',
      datum: 'Stamp D1',
      lengthMm: 6200,
    })
    .returning();
  const [loadCase] = await db
    .insert(loadCases)
    .values({
      componentId: component.id,
      name: 'Operating',
      kind: 'operating',
      pressureMpa: 2.3,
      temperatureC: 145,
      hoopMembraneMpa: 106.8,
      hoopBendingMpa: 90,
      axialMembraneMpa: 53.4,
      axialBendingMpa: 0,
      origins: {
        hoopMembraneMpa: { provenance: 'standard default', note: 'Thin wall' },
        hoopBendingMpa: { provenance: 'assumed', note: 'Peaking not measured' },
        axialMembraneMpa: { provenance: 'standard default', note: 'Thin wall' },
        axialBendingMpa: { provenance: 'assumed', note: 'No bending moment known' },
      },
    })
    .returning();
  if (!location || !loadCase) throw new Error('location or load case missing');
  await db.insert(operatingCycles).values([
    {
      componentId: component.id,
      loadCaseId: loadCase.id,
      name: 'Full',
      rangeFraction: 1,
      countPerYear: 1400,
    },
    {
      componentId: component.id,
      loadCaseId: loadCase.id,
      name: 'Part',
      rangeFraction: 0.4,
      countPerYear: 2800,
    },
  ]);
  await db
    .insert(growthLaws)
    .values({
      siteId,
      key: 'air-simplified',
      title: 'Simplified law, air',
      environment: 'air',
      stages: [{ coefficient: 5.21e-13, exponent: 3 }],
      thresholdMpaSqrtMm: 63,
      source: 'BS 7910, simplified law, from memory',
    })
    .onConflictDoNothing();
  return { unit, material, component, location, loadCase };
}

type Reactor = Awaited<ReturnType<typeof addReactor>>;

/** An accepted inspection of a reactor that found one surface flaw; a flaw already known is continued. */
export async function addFinding(
  db: Database,
  { component, location }: Reactor,
  found: {
    on: string;
    heightMm: number;
    lengthMm: number;
    flawId?: string;
    state?: 'submitted' | 'accepted';
  },
) {
  counter += 1;
  const [inspection] = await db
    .insert(inspections)
    .values({
      siteId: component.siteId,
      componentId: component.id,
      reportNo: `T-${counter}`,
      state: found.state ?? 'accepted',
      technique: 'PAUT',
      inspectedOn: found.on,
      inspectorName: 'Test inspector',
      heightErrorMm: 0.7,
      lengthErrorMm: 3,
    })
    .returning();
  if (!inspection) throw new Error('inspection missing');
  const flawId =
    found.flawId ?? (await addFlaw(db, component.siteId, component.id, location.id, component.tag));
  const [finding] = await db
    .insert(findings)
    .values({
      inspectionId: inspection.id,
      indicationNo: '1',
      locationId: location.id,
      flawId,
      inspectedOn: found.on,
      indicationType: 'crack',
      kind: 'surface',
      face: 'inside',
      orientation: 'axial',
      heightMm: found.heightMm,
      lengthMm: found.lengthMm,
      heightErrorMm: 0.7,
      lengthErrorMm: 3,
      original: {},
    })
    .returning();
  if (!finding) throw new Error('finding missing');
  return { inspection, finding, flawId };
}

async function addFlaw(
  db: Database,
  siteId: string,
  componentId: string,
  locationId: string,
  tag: string,
) {
  counter += 1;
  const [flaw] = await db
    .insert(flaws)
    .values({
      siteId,
      componentId,
      locationId,
      number: `${tag}-F${String(counter).padStart(2, '0')}`,
      kind: 'surface',
      face: 'inside',
      orientation: 'axial',
      mechanism: 'fatigue',
    })
    .returning();
  if (!flaw) throw new Error('flaw missing');
  return flaw.id;
}
