import * as z from 'zod';
import {
  between,
  id,
  instant,
  isoDate,
  line,
  listQuery,
  optionalLine,
  page,
  prose,
  reason,
  version,
} from './primitives';
import { route } from './route';
import { FACES, INSPECTION_RESULTS, INSPECTION_STATES, TECHNIQUES } from './vocabulary';

const fields = {
  reportNo: line(60).describe('Contractor’s report number'),
  revision: z.number().int().min(0).max(99).describe('Revision of the report'),
  technique: z.enum(TECHNIQUES),
  procedureNo: optionalLine(80).describe('Procedure and its revision'),
  plannedOn: isoDate.nullable(),
  inspectedOn: isoDate
    .nullable()
    .describe('Day of the examination; every due date is counted from it'),
  inspectorName: optionalLine(120),
  certificateNo: optionalLine(60),
  certificateValidUntil: isoDate.nullable(),
  heightErrorMm: between(0.05, 20, 'mm')
    .nullable()
    .describe('Sizing error of the height, one standard deviation [mm]'),
  lengthErrorMm: between(0.1, 100, 'mm')
    .nullable()
    .describe('Sizing error of the length, one standard deviation [mm]'),
  sizingErrorSource: optionalLine(200).describe('Where the sizing error comes from'),
  scanSurface: z.enum(FACES).describe('Surface the depths are counted from'),
  coveragePercent: between(0, 100, '%').nullable(),
  limitations: prose(2000).describe('What could not be scanned, where and why'),
  result: z.enum(INSPECTION_RESULTS).nullable(),
  reinspectionId: id.nullable().describe('Re-inspection task it fulfils'),
};

export const inspectionBody = z.strictObject(fields);
export type InspectionBody = z.infer<typeof inspectionBody>;

export const documentView = z.object({
  id,
  fileName: z.string(),
  mediaType: z.string(),
  byteLength: z.number().int(),
  sha256: z.string(),
  uploadedByName: z.string(),
  createdAt: instant,
});
export type DocumentView = z.infer<typeof documentView>;

const named = {
  id,
  componentId: id,
  tag: z.string(),
  componentDescription: z.string(),
  state: z.enum(INSPECTION_STATES),
  findings: z.number().int(),
};

export const inspectionRow = z.object({
  ...named,
  reportNo: z.string(),
  revision: z.number().int(),
  technique: z.enum(TECHNIQUES),
  plannedOn: isoDate.nullable(),
  inspectedOn: isoDate.nullable(),
  inspectorName: z.string(),
});
export type InspectionRow = z.infer<typeof inspectionRow>;

export const inspectionView = z.object({
  ...fields,
  ...named,
  version,
  missing: z
    .array(z.object({ field: z.string(), message: z.string() }))
    .describe('What is missing before it can be submitted'),
  documents: z.array(documentView),
  imports: z.array(
    z.object({
      id,
      fileName: z.string(),
      state: z.enum(['preview', 'committed', 'discarded']),
      createdAt: instant,
      createdByName: z.string(),
    }),
  ),
  submittedById: id.nullable(),
});
export type InspectionView = z.infer<typeof inspectionView>;

const ofComponent = z.object({ id });
const one = z.object({ id });
const filters = {
  state: z.enum(INSPECTION_STATES).optional(),
  technique: z.enum(TECHNIQUES).optional(),
  component: id.optional(),
  sort: z.enum(['date', '-date', 'report', '-report']).default('-date'),
};

export const listInspections = route({
  method: 'get',
  path: '/api/inspections',
  summary: 'Inspections, planned and reported',
  access: 'inspections.read',
  query: z.object({ ...listQuery, ...filters }),
  response: page(inspectionRow),
});

export const listInspectionsOfComponent = route({
  method: 'get',
  path: '/api/components/:id/inspections',
  summary: 'Inspections of a component, newest first',
  access: 'inspections.read',
  params: ofComponent,
  response: z.object({ rows: z.array(inspectionRow) }),
});

export const addInspection = route({
  method: 'post',
  path: '/api/components/:id/inspections',
  summary: 'Plan or record an inspection of a component',
  access: 'inspections.plan',
  params: ofComponent,
  body: inspectionBody,
  response: inspectionView,
});

export const readInspection = route({
  method: 'get',
  path: '/api/inspections/:id',
  summary: 'One inspection with its files and what is still missing',
  access: 'inspections.read',
  params: one,
  response: inspectionView,
});

export const changeInspection = route({
  method: 'patch',
  path: '/api/inspections/:id',
  summary: 'Change an inspection that is not accepted yet',
  access: 'inspections.write',
  versioned: true,
  params: one,
  body: inspectionBody.partial(),
  response: inspectionView,
});

const step = (
  verb: 'submit' | 'accept' | 'reject' | 'void',
  summary: string,
  access: 'inspections.write' | 'inspections.accept',
) =>
  ({
    method: 'post',
    path: `/api/inspections/:id/${verb}`,
    summary,
    access,
    versioned: true,
    status: 200,
    params: one,
    response: inspectionView,
  }) as const;

export const submitInspection = route(
  step('submit', 'Hand the report over for acceptance', 'inspections.write'),
);
export const acceptInspection = route(
  step(
    'accept',
    'Accept a submitted report; not for the one who submitted it',
    'inspections.accept',
  ),
);
export const rejectInspection = route({
  ...step('reject', 'Send a submitted report back with a reason', 'inspections.accept'),
  body: z.strictObject({ reason }),
});
export const voidInspection = route({
  ...step(
    'void',
    'Declare an inspection void, with a reason; its findings no longer count',
    'inspections.accept',
  ),
  body: z.strictObject({ reason }),
});

export const addDocument = route({
  method: 'post',
  path: '/api/inspections/:id/documents',
  summary: 'Attach a file, kept byte for byte',
  access: 'documents.write',
  upload: true,
  params: one,
  response: documentView,
});

export const downloadDocument = route({
  method: 'get',
  path: '/api/documents/:id',
  summary: 'An attached file, byte-identical',
  access: 'documents.read',
  params: one,
});
