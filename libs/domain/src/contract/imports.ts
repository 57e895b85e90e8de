import * as z from 'zod';
import { FINDING_FIELD_NAMES } from './finding-field-names';
import { id, instant, prose, version } from './primitives';
import { route } from './route';
import {
  FACES,
  FLAW_KINDS,
  IMPORT_STATES,
  INDICATION_TYPES,
  ORIENTATIONS,
  SIZE_QUALIFIERS,
} from './vocabulary';

const unit = z.enum(['mm', 'cm', 'm', 'in', 'mil']);
const field = z.enum(FINDING_FIELD_NAMES);

export const importReading = z.object({
  encoding: z.enum(['UTF-8', 'UTF-16', 'Windows-1252']),
  byteOrderMark: z.boolean(),
  delimiter: z.string(),
  headerRow: z.number().int().describe('Line of the column names, counted from 1'),
  lines: z.number().int(),
  commaNumbers: z.number().int().describe('Cells that speak for a decimal comma'),
  pointNumbers: z.number().int().describe('Cells that speak for a decimal point'),
});
export type ImportReading = z.infer<typeof importReading>;

export const importColumn = z.object({
  index: z.number().int(),
  header: z.string(),
  field: field.nullable(),
  unit: unit.nullable(),
});
export type ImportColumn = z.infer<typeof importColumn>;

export const importAnswers = z.strictObject({
  lengthUnit: unit.nullable().describe('Unit of lengths whose column and cell name none'),
  decimalMark: z.enum(['.', ',']),
  positionIs: z.enum(['centre', 'start']),
  kind: z.enum(FLAW_KINDS).nullable(),
  face: z.enum(FACES).nullable(),
  orientation: z.enum(ORIENTATIONS).nullable(),
  indicationType: z.enum(INDICATION_TYPES).nullable(),
});
export type ImportAnswersBody = z.infer<typeof importAnswers>;

export const importCorrection = z.strictObject({
  row: z.number().int().min(1),
  column: z.number().int().min(0).max(500),
  value: z.string().max(500),
  reason: prose(500),
});

const target = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('new') }),
  z.strictObject({ kind: z.literal('continues'), flawId: id }),
]);

export const importDecision = z.strictObject({
  row: z.number().int().min(1),
  take: z.boolean(),
  confirmed: z.boolean().describe('Holds and checks of the row were looked at and confirmed'),
  flaw: target.nullable(),
});
export type ImportDecision = z.infer<typeof importDecision>;

const size = z.number().nullable();
export const candidateFinding = z.object({
  indicationNo: z.string(),
  locationId: id,
  locationName: z.string(),
  indicationType: z.enum(INDICATION_TYPES),
  kind: z.enum(FLAW_KINDS),
  face: z.enum(FACES),
  orientation: z.enum(ORIENTATIONS),
  heightMm: z.number(),
  heightQualifier: z.enum(SIZE_QUALIFIERS),
  lengthMm: z.number(),
  lengthQualifier: z.enum(SIZE_QUALIFIERS),
  ligamentMm: size,
  depthToTopMm: size,
  axialMm: size,
  circumferentialMm: size,
  wallMm: size,
  amplitudeDb: size,
  heightErrorMm: z.number(),
  lengthErrorMm: z.number(),
  remarks: z.string(),
});

export const rowProblem = z.object({
  row: z.number().int(),
  field: z.string().nullable(),
  original: z.string(),
  level: z.enum(['stop', 'hold', 'check', 'note']),
  message: z.string(),
});
export type RowProblemView = z.infer<typeof rowProblem>;

export const importRow = z.object({
  row: z.number().int().describe('Line of the file, counted from 1'),
  cells: z.array(z.string()),
  corrected: z.array(z.number().int()).describe('Columns whose cell was corrected'),
  finding: candidateFinding.nullable(),
  problems: z.array(rowProblem),
  decision: importDecision,
  ready: z.boolean().describe('Whether the row, if taken, can be committed as it stands'),
  candidates: z
    .array(
      z.object({
        flawId: id,
        number: z.string(),
        distanceMm: size,
        heightMm: size,
        lengthMm: size,
        inspectedOn: z.string().nullable(),
      }),
    )
    .describe('Known flaws of the same weld, nearest first'),
});
export type ImportRow = z.infer<typeof importRow>;

export const importView = z.object({
  id,
  inspectionId: id,
  componentId: id,
  tag: z.string(),
  reportNo: z.string(),
  state: z.enum(IMPORT_STATES),
  fileName: z.string(),
  sha256: z.string(),
  documentId: id,
  reading: importReading,
  mapping: z.array(importColumn),
  answers: importAnswers,
  rows: z.array(importRow),
  problems: z.array(rowProblem).describe('Of the file as a whole'),
  summary: z.object({
    rows: z.number().int(),
    taken: z.number().int(),
    ready: z.number().int(),
    stopped: z.number().int(),
    toConfirm: z.number().int(),
    leftOut: z.number().int(),
  }),
  committedAt: instant.nullable(),
  version,
});
export type ImportView = z.infer<typeof importView>;

const one = z.object({ id });

export const startImport = route({
  method: 'post',
  path: '/api/inspections/:id/imports',
  summary: 'Read an inspector’s file; nothing is stored as findings until it is committed',
  access: 'imports.write',
  upload: true,
  params: one,
  response: importView,
});

export const readImport = route({
  method: 'get',
  path: '/api/imports/:id',
  summary: 'An import with every row, its problems and decisions',
  access: 'imports.read',
  params: one,
  response: importView,
});

export const changeImport = route({
  method: 'patch',
  path: '/api/imports/:id',
  summary:
    'Correct the mapping, answer questions, correct cells, decide rows; everything is checked again at once',
  access: 'imports.write',
  versioned: true,
  params: one,
  body: z.strictObject({
    mapping: z
      .array(
        z.strictObject({
          index: z.number().int().min(0).max(500),
          field: field.nullable(),
          unit: unit.nullable(),
        }),
      )
      .max(500)
      .optional(),
    answers: importAnswers.partial().optional(),
    corrections: z
      .array(importCorrection)
      .max(500)
      .optional()
      .describe('Added to those already made'),
    decisions: z
      .array(importDecision)
      .max(5000)
      .optional()
      .describe('Replace earlier ones of the same rows'),
  }),
  response: importView,
});

export const commitImport = route({
  method: 'post',
  path: '/api/imports/:id/commit',
  summary: 'Store every taken row as a finding, each with its flaw, in one transaction',
  access: 'imports.write',
  status: 200,
  params: one,
  response: z.object({
    importId: id,
    findings: z.array(
      z.object({
        row: z.number().int(),
        findingId: id,
        flawId: id,
        flawNumber: z.string(),
        isNew: z.boolean(),
      }),
    ),
  }),
});

export const discardImport = route({
  method: 'post',
  path: '/api/imports/:id/discard',
  summary: 'Give up a preview; the file is kept',
  access: 'imports.write',
  params: one,
});

export const exportProblems = route({
  method: 'get',
  path: '/api/imports/:id/problems.csv',
  summary: 'The problems with the lines of the file, to send back to whoever wrote it',
  access: 'imports.read',
  params: one,
});

export const downloadTemplate = route({
  method: 'get',
  path: '/api/import-template.csv',
  summary: 'A file with the column names that need no mapping',
  access: 'register.read',
});
