import { sql } from 'drizzle-orm';
import {
  customType,
  date,
  doublePrecision,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  unique,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import {
  FACES,
  IMPORT_STATES,
  INSPECTION_STATES,
  TECHNIQUES,
  type Face,
  type ImportState,
  type InspectionState,
  type Technique,
} from '../contract/vocabulary';
import { at, createdAt, key, oneOf, updatedAt, version, within } from './columns';
import { components } from './components';
import { people } from './people';
import { sites } from './sites';

const bytes = customType<{ data: Uint8Array; driverData: Uint8Array }>({ dataType: () => 'bytea' });

export const inspections = pgTable(
  'inspections',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    componentId: uuid('component_id')
      .notNull()
      .references(() => components.id),
    reportNo: text('report_no').notNull(),
    revision: integer('revision').notNull().default(0),
    state: text('state').$type<InspectionState>().notNull(),
    technique: text('technique').$type<Technique>().notNull(),
    procedureNo: text('procedure_no').notNull().default(''),
    plannedOn: date('planned_on', { mode: 'string' }),
    /** Day of the examination; the clock of every due date starts here. */
    inspectedOn: date('inspected_on', { mode: 'string' }),
    inspectorName: text('inspector_name').notNull().default(''),
    inspectorId: uuid('inspector_id').references(() => people.id),
    certificateNo: text('certificate_no').notNull().default(''),
    certificateValidUntil: date('certificate_valid_until', { mode: 'string' }),
    /** One standard deviation of the technique. */
    heightErrorMm: doublePrecision('height_error_mm'),
    lengthErrorMm: doublePrecision('length_error_mm'),
    sizingErrorSource: text('sizing_error_source').notNull().default(''),
    scanSurface: text('scan_surface').$type<Face>().notNull().default('outside'),
    coveragePercent: doublePrecision('coverage_percent'),
    limitations: text('limitations').notNull().default(''),
    result: text('result').$type<'nil' | 'indications recorded'>(),
    /** Re-inspection task this inspection fulfils (no foreign key: that table points here). */
    reinspectionId: uuid('reinspection_id'),
    version: version(),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
  },
  (t) => [
    unique('inspections_report').on(t.siteId, t.reportNo, t.revision, t.componentId),
    index('inspections_component').on(t.componentId, t.inspectedOn),
    oneOf('inspections_state', t.state, INSPECTION_STATES),
    oneOf('inspections_technique', t.technique, TECHNIQUES),
    oneOf('inspections_scan_surface', t.scanSurface, FACES),
    within('inspections_height_error', t.heightErrorMm, 0.05, 20),
    within('inspections_length_error', t.lengthErrorMm, 0.1, 100),
    within('inspections_coverage', t.coveragePercent, 0, 100),
  ],
);

/** Files kept byte for byte, in the database so that one backup holds everything. */
export const documents = pgTable(
  'documents',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    entity: text('entity').notNull(),
    entityId: uuid('entity_id').notNull(),
    sha256: text('sha256').notNull(),
    fileName: text('file_name').notNull(),
    mediaType: text('media_type').notNull(),
    byteLength: integer('byte_length').notNull(),
    bytes: bytes('bytes').notNull(),
    uploadedBy: uuid('uploaded_by')
      .notNull()
      .references(() => people.id),
    createdAt: createdAt(),
  },
  (t) => [index('documents_entity').on(t.entity, t.entityId)],
);

export const imports = pgTable(
  'imports',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    inspectionId: uuid('inspection_id')
      .notNull()
      .references(() => inspections.id),
    documentId: uuid('document_id')
      .notNull()
      .references(() => documents.id),
    sha256: text('sha256').notNull(),
    state: text('state').$type<ImportState>().notNull(),
    /** How the file is read: what was detected, and the answers of the inspector. */
    reading: jsonb('reading').$type<unknown>().notNull(),
    /** Column of the file → field. */
    mapping: jsonb('mapping').$type<unknown>().notNull(),
    /** Corrected cells: original text, value used, who, why. */
    corrections: jsonb('corrections').$type<unknown>().notNull(),
    /** Row by row: taken or left out, warnings confirmed, flaw continued. */
    decisions: jsonb('decisions').$type<unknown>().notNull(),
    createdBy: uuid('created_by')
      .notNull()
      .references(() => people.id),
    committedBy: uuid('committed_by').references(() => people.id),
    committedAt: at('committed_at'),
    version: version(),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
  },
  (t) => [
    index('imports_inspection').on(t.inspectionId),
    // partial: the same file counts once among those that made findings; previews may repeat
    uniqueIndex('imports_file_once')
      .on(t.siteId, t.sha256)
      .where(sql`${t.state} = 'committed'`),
    oneOf('imports_state', t.state, IMPORT_STATES),
  ],
);
