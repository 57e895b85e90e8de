import { sql } from 'drizzle-orm';
import {
  date,
  doublePrecision,
  index,
  jsonb,
  pgTable,
  text,
  unique,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import {
  COMPONENT_KINDS,
  COMPONENT_STATES,
  FACES,
  HEAT_TREATMENTS,
  LOAD_CASE_KINDS,
  LOCATION_KINDS,
  MECHANISMS,
  type ComponentKind,
  type ComponentState,
  type Face,
  type HeatTreatment,
  type LoadCaseKind,
  type LocationKind,
  type Mechanism,
} from '../contract/vocabulary';
import { createdAt, key, oneOf, updatedAt, version, within } from './columns';
import { materials, type Origins } from './materials';
import { sites, units } from './sites';

export const components = pgTable(
  'components',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    unitId: uuid('unit_id')
      .notNull()
      .references(() => units.id),
    tag: text('tag').notNull(),
    description: text('description').notNull(),
    kind: text('kind').$type<ComponentKind>().notNull(),
    insideDiameterMm: doublePrecision('inside_diameter_mm').notNull(),
    wallMm: doublePrecision('wall_mm').notNull(),
    /** Least wall by the design code, without corrosion allowance. */
    requiredWallMm: doublePrecision('required_wall_mm'),
    designPressureMpa: doublePrecision('design_pressure_mpa').notNull(),
    designTemperatureC: doublePrecision('design_temperature_c').notNull(),
    operatingPressureMpa: doublePrecision('operating_pressure_mpa').notNull(),
    operatingTemperatureC: doublePrecision('operating_temperature_c').notNull(),
    minimumMetalTemperatureC: doublePrecision('minimum_metal_temperature_c'),
    materialId: uuid('material_id')
      .notNull()
      .references(() => materials.id),
    heatTreatment: text('heat_treatment').$type<HeatTreatment>().notNull(),
    mechanism: text('mechanism').$type<Mechanism>().notNull(),
    fluid: text('fluid').notNull().default(''),
    commissionedOn: date('commissioned_on', { mode: 'string' }),
    drawingNo: text('drawing_no').notNull().default(''),
    state: text('state').$type<ComponentState>().notNull().default('in service'),
    version: version(),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
  },
  (t) => [
    // one vessel has one record, however its tag is spelled
    uniqueIndex('components_tag').on(t.siteId, sql`lower(${t.tag})`),
    index('components_unit').on(t.unitId),
    oneOf('components_kind', t.kind, COMPONENT_KINDS),
    oneOf('components_state', t.state, COMPONENT_STATES),
    oneOf('components_heat_treatment', t.heatTreatment, HEAT_TREATMENTS),
    oneOf('components_mechanism', t.mechanism, MECHANISMS),
    within('components_diameter', t.insideDiameterMm, 5, 100_000),
    within('components_wall', t.wallMm, 0.5, 500),
    within('components_required_wall', t.requiredWallMm, 0, 500),
    within('components_design_pressure', t.designPressureMpa, -0.2, 200),
    within('components_design_temperature', t.designTemperatureC, -273, 1000),
    within('components_operating_pressure', t.operatingPressureMpa, -0.2, 200),
    within('components_operating_temperature', t.operatingTemperatureC, -273, 1000),
    within('components_minimum_temperature', t.minimumMetalTemperatureC, -273, 1000),
  ],
);

export const locations = pgTable(
  'locations',
  {
    id: key(),
    componentId: uuid('component_id')
      .notNull()
      .references(() => components.id),
    name: text('name').notNull(),
    kind: text('kind').$type<LocationKind>().notNull(),
    description: text('description').notNull().default(''),
    /** Where positions are measured from, in words an inspector finds again. */
    datum: text('datum').notNull(),
    clockZero: text('clock_zero').notNull().default(''),
    viewingDirection: text('viewing_direction').notNull().default(''),
    circumferenceOn: text('circumference_on').$type<Face>().notNull().default('outside'),
    lengthMm: doublePrecision('length_mm'),
    /** Radius of the hole or of the nozzle's bore, where the place is the edge of one. */
    holeRadiusMm: doublePrecision('hole_radius_mm'),
    heatTreatment: text('heat_treatment').$type<HeatTreatment>(),
    version: version(),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
  },
  (t) => [
    unique('locations_name').on(t.componentId, t.name),
    oneOf('locations_kind', t.kind, LOCATION_KINDS),
    oneOf('locations_circumference_on', t.circumferenceOn, FACES),
    within('locations_length', t.lengthMm, 0, 1_000_000),
    within('locations_hole_radius', t.holeRadiusMm, 1, 10_000),
  ],
);

/** Stress at the wall for one state of load; hoop opens axial flaws, axial stress opens circumferential ones. */
export const loadCases = pgTable(
  'load_cases',
  {
    id: key(),
    componentId: uuid('component_id')
      .notNull()
      .references(() => components.id),
    name: text('name').notNull(),
    kind: text('kind').$type<LoadCaseKind>().notNull(),
    pressureMpa: doublePrecision('pressure_mpa').notNull(),
    temperatureC: doublePrecision('temperature_c').notNull(),
    hoopMembraneMpa: doublePrecision('hoop_membrane_mpa').notNull(),
    hoopBendingMpa: doublePrecision('hoop_bending_mpa').notNull(),
    axialMembraneMpa: doublePrecision('axial_membrane_mpa').notNull(),
    axialBendingMpa: doublePrecision('axial_bending_mpa').notNull(),
    origins: jsonb('origins').$type<Origins>().notNull(),
    version: version(),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
  },
  (t) => [
    unique('load_cases_name').on(t.componentId, t.name),
    oneOf('load_cases_kind', t.kind, LOAD_CASE_KINDS),
    within('load_cases_pressure', t.pressureMpa, -0.2, 200),
    within('load_cases_temperature', t.temperatureC, -273, 1000),
    within('load_cases_hoop_membrane', t.hoopMembraneMpa, -2000, 2000),
    within('load_cases_hoop_bending', t.hoopBendingMpa, -2000, 2000),
    within('load_cases_axial_membrane', t.axialMembraneMpa, -2000, 2000),
    within('load_cases_axial_bending', t.axialBendingMpa, -2000, 2000),
  ],
);

/** One block of the operating histogram: a fraction of a load case's stresses, so many times a year. */
export const operatingCycles = pgTable(
  'operating_cycles',
  {
    id: key(),
    componentId: uuid('component_id')
      .notNull()
      .references(() => components.id),
    loadCaseId: uuid('load_case_id')
      .notNull()
      .references(() => loadCases.id),
    name: text('name').notNull(),
    rangeFraction: doublePrecision('range_fraction').notNull(),
    countPerYear: doublePrecision('count_per_year').notNull(),
    source: text('source').notNull().default(''),
    periodFrom: date('period_from', { mode: 'string' }),
    periodTo: date('period_to', { mode: 'string' }),
    version: version(),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
  },
  (t) => [
    unique('operating_cycles_name').on(t.componentId, t.name),
    within('operating_cycles_range', t.rangeFraction, 0, 3),
    within('operating_cycles_count', t.countPerYear, 0, 1e8),
  ],
);
