import { loadCases, locations, operatingCycles } from '@ligament/domain/schema/components';
import { materials } from '@ligament/domain/schema/materials';
import { units } from '@ligament/domain/schema/sites';
import { insertComponent } from '../../apps/api/src/modules/components/add-component';
import { addPart } from '../../apps/api/src/modules/components/component-part';
import { writeHistory } from '../../apps/api/src/modules/history/write-history';
import { COMPONENTS, type DemoComponent } from '../plant/components';
import { MATERIALS, type DemoMaterial } from '../plant/materials';
import { UNITS } from '../plant/site';
import type { Stage } from './stage';

export interface BuiltComponent {
  readonly id: string;
  readonly data: DemoComponent;
  readonly locationIds: ReadonlyMap<string, string>;
}

export interface BuiltRegister {
  readonly components: ReadonlyMap<string, BuiltComponent>;
  readonly unitIds: ReadonlyMap<string, string>;
}

/** Fills the register: units, materials, and every component with its welds, load case and cycles. */
export async function buildRegister(stage: Stage): Promise<BuiltRegister> {
  const unitIds = await buildUnits(stage);
  const materialIds = await buildMaterials(stage);
  const built = new Map<string, BuiltComponent>();
  for (const data of COMPONENTS) {
    const unitId = unitIds.get(data.unit) ?? '';
    const materialId = materialIds.get(data.material) ?? '';
    built.set(data.tag, await buildComponent(stage, data, unitId, materialId));
  }
  return { components: built, unitIds };
}

async function buildUnits({ deps, siteId, actor }: Stage): Promise<Map<string, string>> {
  const ids = new Map<string, string>();
  for (const unit of UNITS) {
    await deps.db.transaction(async (tx) => {
      const [added] = await tx
        .insert(units)
        .values({ ...unit, siteId })
        .returning();
      if (!added) throw new Error(`unit ${unit.code} was not added`);
      ids.set(unit.code, added.id);
      await writeHistory(tx, actor('admin'), deps.clock.now(), {
        action: 'unit.added',
        entity: 'unit',
        entityId: added.id,
        summary: `Unit ${unit.code} ${unit.name} added`,
        after: added,
      });
    });
  }
  return ids;
}

async function buildMaterials({ deps, siteId, actor }: Stage): Promise<Map<string, string>> {
  const ids = new Map<string, string>();
  for (const material of MATERIALS) {
    await deps.db.transaction(async (tx) => {
      const now = deps.clock.now();
      const [added] = await tx
        .insert(materials)
        .values({ ...materialValues(material), siteId, createdAt: now, updatedAt: now })
        .returning();
      if (!added) throw new Error(`material ${material.name} was not added`);
      ids.set(material.name, added.id);
      await writeHistory(tx, actor('tomas'), now, {
        action: 'material.added',
        entity: 'material',
        entityId: added.id,
        summary: `Material ${material.name} added`,
        after: added,
      });
    });
  }
  return ids;
}

function materialValues({ toughness, ...material }: DemoMaterial) {
  const certificate = {
    provenance: 'certificate' as const,
    note: `Certificate ${material.heatNo}`,
  };
  const austenitic = material.name.startsWith('304L');
  return {
    ...material,
    youngsModulusMpa: austenitic ? 193_000 : 207_000,
    poissonsRatio: 0.3,
    origins: {
      yieldMpa: certificate,
      tensileMpa: certificate,
      youngsModulusMpa: {
        provenance: 'standard default' as const,
        note: 'Usual value at ambient temperature',
      },
      poissonsRatio: { provenance: 'standard default' as const, note: 'Usual value for steel' },
      toughnessMpaSqrtM: toughness,
    },
  };
}

async function buildComponent(
  { deps, actor }: Stage,
  data: DemoComponent,
  unitId: string,
  materialId: string,
): Promise<BuiltComponent> {
  const engineer = actor('tomas');
  const {
    unit: _unit,
    material: _material,
    location,
    moreLocations,
    stress: _stress,
    cycles: _cycles,
    ...values
  } = data;
  const component = await deps.db.transaction((tx) =>
    insertComponent(tx, engineer, deps.clock.now(), {
      ...values,
      unitId,
      materialId,
      minimumMetalTemperatureC: data.minimumMetalTemperatureC ?? null,
      state: data.state ?? 'in service',
    }),
  );
  const locationIds = new Map<string, string>();
  for (const place of [location, ...(moreLocations ?? [])]) {
    const part = { table: locations, word: 'location', unique: 'locations_name' } as const;
    const added = await addPart(deps, engineer, part, component.id, {
      ...place,
      description: place.description ?? '',
      clockZero: 'top, or the seam where it is vertical',
      viewingDirection: 'looking with the flow, or down',
      circumferenceOn: 'outside',
      lengthMm: place.lengthMm ?? null,
      holeRadiusMm: place.holeRadiusMm ?? null,
    });
    locationIds.set(place.name, added.id);
  }
  await buildLoads({ deps, actor } as Stage, component.id, data);
  return { id: component.id, data, locationIds };
}

async function buildLoads(
  { deps, actor }: Stage,
  componentId: string,
  { stress, cycles, ...data }: DemoComponent,
) {
  const engineer = actor('tomas');
  const fromPressure = { provenance: 'standard default' as const, note: stress.note };
  const loadCase = await addPart(
    deps,
    engineer,
    { table: loadCases, word: 'load case', unique: 'load_cases_name' },
    componentId,
    {
      name: 'Operating',
      kind: 'operating',
      pressureMpa: data.operatingPressureMpa,
      temperatureC: data.operatingTemperatureC,
      hoopMembraneMpa: stress.hoopMembrane,
      hoopBendingMpa: stress.hoopBending,
      axialMembraneMpa: stress.axialMembrane,
      axialBendingMpa: stress.axialBending,
      origins: {
        hoopMembraneMpa: fromPressure,
        hoopBendingMpa: fromPressure,
        axialMembraneMpa: fromPressure,
        axialBendingMpa: fromPressure,
      },
    },
  );
  for (const cycle of cycles) {
    await addPart(
      deps,
      engineer,
      { table: operatingCycles, word: 'operating cycle', unique: 'operating_cycles_name' },
      componentId,
      {
        loadCaseId: loadCase.id,
        name: cycle.name,
        rangeFraction: cycle.fraction,
        countPerYear: cycle.perYear,
        source: cycle.source,
      },
    );
  }
}
