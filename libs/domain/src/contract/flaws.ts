import * as z from 'zod';
import { VERDICTS } from '../assessment/assessment-outcome';
import { id, instant, isoDate, listQuery, page, prose, reason, version } from './primitives';
import { route } from './route';
import {
  ASSESSMENT_STATES,
  FACES,
  FLAW_KINDS,
  FLAW_STATES,
  INDICATION_TYPES,
  INSPECTION_STATES,
  MECHANISMS,
  ORIENTATIONS,
  ORIGINS,
  REINSPECTION_STATES,
  SIZE_QUALIFIERS,
  TECHNIQUES,
  URGENCIES,
} from './vocabulary';

const size = z.number().nullable();
const verdict = z.enum(VERDICTS).nullable();

export const flawRow = z.object({
  id,
  number: z.string(),
  componentId: id,
  tag: z.string(),
  unitCode: z.string(),
  locationName: z.string(),
  kind: z.enum(FLAW_KINDS),
  face: z.enum(FACES),
  mechanism: z.enum(MECHANISMS),
  state: z.enum(FLAW_STATES),
  heightMm: size.describe('Depth a, or height 2a when embedded, at the newest finding [mm]'),
  lengthMm: size,
  inspectedOn: isoDate.nullable(),
  verdict: verdict.describe('Of the approved assessment in force'),
  lifeYears: z.number().nullable(),
  dueOn: isoDate.nullable(),
  urgency: z.enum(URGENCIES).nullable(),
  openAssessment: z.enum(ASSESSMENT_STATES).nullable(),
});
export type FlawRow = z.infer<typeof flawRow>;

export const flawFinding = z.object({
  id,
  inspectionId: id,
  reportNo: z.string(),
  technique: z.enum(TECHNIQUES),
  inspectedOn: isoDate,
  inspectorName: z.string(),
  inspectionState: z.enum(INSPECTION_STATES),
  indicationType: z.enum(INDICATION_TYPES),
  kind: z.enum(FLAW_KINDS),
  face: z.enum(FACES),
  heightMm: z.number(),
  heightQualifier: z.enum(SIZE_QUALIFIERS),
  heightErrorMm: z.number(),
  lengthMm: z.number(),
  lengthQualifier: z.enum(SIZE_QUALIFIERS),
  lengthErrorMm: z.number(),
  ligamentMm: size,
  wallMm: size,
  axialMm: size,
  circumferentialMm: size,
  remarks: z.string(),
});
export type FlawFinding = z.infer<typeof flawFinding>;

export const assessmentRow = z.object({
  id,
  revision: z.number().int(),
  state: z.enum(ASSESSMENT_STATES),
  inspectedOn: isoDate,
  verdict: verdict.describe('Null when the engine refused'),
  lifeYears: z.number().nullable(),
  chosenDueOn: isoDate.nullable(),
  authorName: z.string(),
  reviewerName: z.string().nullable(),
  approvedAt: instant.nullable(),
  updatedAt: instant,
});
export type AssessmentRow = z.infer<typeof assessmentRow>;

export const flawView = z.object({
  id,
  number: z.string(),
  componentId: id,
  tag: z.string(),
  componentDescription: z.string(),
  unitCode: z.string(),
  unitName: z.string(),
  unitId: id,
  wallMm: z.number(),
  insideDiameterMm: z.number(),
  location: z.object({ id, name: z.string(), kind: z.string(), datum: z.string() }),
  kind: z.enum(FLAW_KINDS),
  face: z.enum(FACES),
  orientation: z.enum(ORIENTATIONS),
  origin: z.enum(ORIGINS),
  mechanism: z.enum(MECHANISMS),
  state: z.enum(FLAW_STATES),
  axialMm: size,
  circumferentialMm: size,
  note: z.string(),
  version,
  findings: z.array(flawFinding).describe('Oldest first'),
  assessments: z.array(assessmentRow).describe('Newest first'),
  reinspection: z
    .object({
      id,
      dueOn: isoDate,
      limitOn: isoDate.nullable(),
      basis: z.string(),
      state: z.enum(REINSPECTION_STATES),
      windowCode: z.string().nullable(),
      plannedOn: isoDate.nullable(),
      urgency: z.enum(URGENCIES),
    })
    .nullable(),
  scope: z
    .string()
    .nullable()
    .describe('Why no crack-like assessment is made, when it is out of scope'),
});
export type FlawView = z.infer<typeof flawView>;

export const listFlaws = route({
  method: 'get',
  path: '/api/flaws',
  summary: 'Flaws with their newest size, verdict and next due date',
  access: 'flaws.read',
  query: z.object({
    ...listQuery,
    state: z.enum(FLAW_STATES).optional(),
    unit: id.optional(),
    component: id.optional(),
    verdict: z.enum(VERDICTS).optional(),
    urgency: z.enum(URGENCIES).optional(),
    sort: z
      .enum(['number', '-number', 'due', '-due', 'height', '-height', 'verdict', '-verdict'])
      .default('verdict'),
  }),
  response: page(flawRow),
});

export const readFlaw = route({
  method: 'get',
  path: '/api/flaws/:id',
  summary: 'One flaw with its findings, assessments and next re-inspection',
  access: 'flaws.read',
  params: z.object({ id }),
  response: flawView,
});

export const changeFlaw = route({
  method: 'patch',
  path: '/api/flaws/:id',
  summary: 'Change what is known of a flaw, with a reason',
  access: 'flaws.write',
  versioned: true,
  params: z.object({ id }),
  body: z.strictObject({
    mechanism: z.enum(MECHANISMS).optional(),
    origin: z.enum(ORIGINS).optional(),
    note: prose(2000).optional(),
    state: z.enum(['referred', 'under assessment', 'removed', 'closed']).optional(),
    reason,
  }),
  response: flawView,
});
