import {
  date,
  doublePrecision,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import {
  FACES,
  FLAW_KINDS,
  FLAW_STATES,
  INDICATION_TYPES,
  MECHANISMS,
  ORIENTATIONS,
  type ORIGINS,
  SIZE_QUALIFIERS,
  type Face,
  type FlawKind,
  type FlawState,
  type IndicationType,
  type Mechanism,
  type Orientation,
  type SizeQualifier,
} from '../contract/vocabulary';
import { createdAt, key, oneOf, updatedAt, version, within } from './columns';
import { components, locations } from './components';
import { imports, inspections } from './inspections';
import { sites } from './sites';

/** The physical thing, tracked across inspections; its number is never used again. */
export const flaws = pgTable(
  'flaws',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    componentId: uuid('component_id')
      .notNull()
      .references(() => components.id),
    locationId: uuid('location_id')
      .notNull()
      .references(() => locations.id),
    number: text('number').notNull(),
    kind: text('kind').$type<FlawKind>().notNull(),
    face: text('face').$type<Face>().notNull(),
    orientation: text('orientation').$type<Orientation>().notNull(),
    origin: text('origin').$type<(typeof ORIGINS)[number]>().notNull().default('unknown'),
    mechanism: text('mechanism').$type<Mechanism>().notNull(),
    state: text('state').$type<FlawState>().notNull().default('new'),
    axialMm: doublePrecision('axial_mm'),
    circumferentialMm: doublePrecision('circumferential_mm'),
    note: text('note').notNull().default(''),
    version: version(),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
  },
  (t) => [
    unique('flaws_number').on(t.siteId, t.number),
    index('flaws_component').on(t.componentId),
    oneOf('flaws_kind', t.kind, FLAW_KINDS),
    oneOf('flaws_face', t.face, FACES),
    oneOf('flaws_orientation', t.orientation, ORIENTATIONS),
    oneOf('flaws_mechanism', t.mechanism, MECHANISMS),
    oneOf('flaws_state', t.state, FLAW_STATES),
    within('flaws_axial', t.axialMm, -100_000, 1_000_000),
    within('flaws_circumferential', t.circumferentialMm, -1_000_000, 1_000_000),
  ],
);

/** What one inspection recorded about one place. */
export const findings = pgTable(
  'findings',
  {
    id: key(),
    inspectionId: uuid('inspection_id')
      .notNull()
      .references(() => inspections.id),
    importId: uuid('import_id').references(() => imports.id),
    /** Line of the file, counted from 1. */
    rowNo: integer('row_no'),
    indicationNo: text('indication_no').notNull(),
    locationId: uuid('location_id')
      .notNull()
      .references(() => locations.id),
    flawId: uuid('flaw_id')
      .notNull()
      .references(() => flaws.id),
    inspectedOn: date('inspected_on', { mode: 'string' }).notNull(),
    indicationType: text('indication_type').$type<IndicationType>().notNull(),
    kind: text('kind').$type<FlawKind>().notNull(),
    face: text('face').$type<Face>().notNull(),
    orientation: text('orientation').$type<Orientation>().notNull(),
    /** Depth a of a surface flaw, full height 2a of an embedded one. */
    heightMm: doublePrecision('height_mm').notNull(),
    heightQualifier: text('height_qualifier').$type<SizeQualifier>().notNull().default('='),
    lengthMm: doublePrecision('length_mm').notNull(),
    lengthQualifier: text('length_qualifier').$type<SizeQualifier>().notNull().default('='),
    /** Ligament of an embedded flaw to `face`. */
    ligamentMm: doublePrecision('ligament_mm'),
    depthToTopMm: doublePrecision('depth_to_top_mm'),
    axialMm: doublePrecision('axial_mm'),
    circumferentialMm: doublePrecision('circumferential_mm'),
    wallMm: doublePrecision('wall_mm'),
    amplitudeDb: doublePrecision('amplitude_db'),
    heightErrorMm: doublePrecision('height_error_mm').notNull(),
    lengthErrorMm: doublePrecision('length_error_mm').notNull(),
    remarks: text('remarks').notNull().default(''),
    /** Cells of the file as they were: column → text. */
    original: jsonb('original').$type<Readonly<Record<string, string>>>().notNull(),
    version: version(),
    createdAt: createdAt(),
  },
  (t) => [
    unique('findings_indication').on(t.inspectionId, t.locationId, t.indicationNo),
    index('findings_flaw').on(t.flawId, t.inspectedOn),
    index('findings_inspection').on(t.inspectionId),
    oneOf('findings_type', t.indicationType, INDICATION_TYPES),
    oneOf('findings_kind', t.kind, FLAW_KINDS),
    oneOf('findings_face', t.face, FACES),
    oneOf('findings_orientation', t.orientation, ORIENTATIONS),
    oneOf('findings_height_qualifier', t.heightQualifier, SIZE_QUALIFIERS),
    oneOf('findings_length_qualifier', t.lengthQualifier, SIZE_QUALIFIERS),
    within('findings_height', t.heightMm, 0.01, 500),
    within('findings_length', t.lengthMm, 0.01, 200_000),
    within('findings_ligament', t.ligamentMm, 0, 500),
    within('findings_depth', t.depthToTopMm, 0, 500),
    within('findings_axial', t.axialMm, -100_000, 1_000_000),
    within('findings_circumferential', t.circumferentialMm, -1_000_000, 1_000_000),
    within('findings_wall', t.wallMm, 0.5, 500),
    within('findings_amplitude', t.amplitudeDb, -60, 60),
    within('findings_height_error', t.heightErrorMm, 0.05, 20),
    within('findings_length_error', t.lengthErrorMm, 0.1, 100),
  ],
);
