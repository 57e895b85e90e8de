import * as z from 'zod';
import { id, instant, isoDate, line, listQuery, page, prose, reason, version } from './primitives';
import { route } from './route';
import { REINSPECTION_STATES, REMINDER_STATES, TECHNIQUES, URGENCIES } from './vocabulary';

export const reinspectionRow = z.object({
  id,
  componentId: id,
  tag: z.string(),
  componentDescription: z.string(),
  unitId: id,
  unitCode: z.string(),
  flawId: id.nullable(),
  flawNumber: z.string().nullable(),
  locationName: z.string().nullable(),
  task: z.string(),
  technique: z.enum(TECHNIQUES),
  dueOn: isoDate,
  limitOn: isoDate.nullable().describe('Predicted limit'),
  daysLeft: z.number().int().describe('Negative when overdue'),
  urgency: z.enum(URGENCIES),
  basis: z.string(),
  state: z.enum(REINSPECTION_STATES),
  onStream: z.boolean(),
  windowId: id.nullable(),
  windowCode: z.string().nullable(),
  plannedOn: isoDate.nullable(),
  fit: z.string().describe('How date and plan stand, in words'),
  version,
});
export type ReinspectionRow = z.infer<typeof reinspectionRow>;

export const dueCandidate = z.object({
  rule: z.string(),
  dueOn: isoDate,
  explanation: z.string(),
  governs: z.boolean(),
});

export const reinspectionView = reinspectionRow.extend({
  planNote: z.string(),
  latestFinishOn: isoDate.describe('Due date less the site’s days for report and assessment'),
  candidates: z.array(dueCandidate),
  windows: z
    .array(
      z.object({
        id,
        code: z.string(),
        startsOn: isoDate,
        endsOn: isoDate,
        fit: z.enum(['fits', 'partly', 'too late']),
        words: z.string(),
        scopeFrozen: z.boolean(),
      }),
    )
    .describe('Windows of the unit from today on, and how they fit'),
  reminders: z.array(
    z.object({
      id,
      leadDays: z.number().int(),
      recipientEmail: z.string(),
      state: z.enum(REMINDER_STATES),
      sentAt: instant.nullable(),
      acknowledgedAt: instant.nullable(),
    }),
  ),
});
export type ReinspectionView = z.infer<typeof reinspectionView>;

const one = z.object({ id });

export const listReinspections = route({
  method: 'get',
  path: '/api/reinspections',
  summary: 'Re-inspections by due date',
  access: 'reinspections.read',
  query: z.object({
    ...listQuery,
    urgency: z.enum(URGENCIES).optional(),
    unit: id.optional(),
    component: id.optional(),
    window: id.optional(),
    state: z
      .enum([...REINSPECTION_STATES, 'unplanned', 'all'])
      .optional()
      .describe('Without it: everything still to be done'),
    technique: z.enum(TECHNIQUES).optional(),
    sort: z.enum(['due', '-due', 'tag', '-tag']).default('due'),
  }),
  response: page(reinspectionRow),
});

export const exportReinspections = route({
  method: 'get',
  path: '/api/reinspections.csv',
  summary: 'The work list as a table',
  access: 'reinspections.read',
});

export const readReinspection = route({
  method: 'get',
  path: '/api/reinspections/:id',
  summary: 'One re-inspection with the candidates of its date, the windows and its reminders',
  access: 'reinspections.read',
  params: one,
  response: reinspectionView,
});

export const addReinspection = route({
  method: 'post',
  path: '/api/reinspections',
  summary: 'Set a re-inspection of a component that has no assessed flaw',
  access: 'assessments.write',
  body: z.strictObject({
    componentId: id,
    flawId: id.nullable(),
    task: line(160),
    technique: z.enum(TECHNIQUES),
    dueOn: isoDate,
    basis: line(300).describe('Which rule the date comes from'),
    reason,
  }),
  response: reinspectionView,
});

export const planReinspection = route({
  method: 'post',
  path: '/api/reinspections/:id/plan',
  summary: 'Plan into a shutdown window or on-stream; never after the due date',
  access: 'reinspections.plan',
  versioned: true,
  status: 200,
  params: one,
  body: z.strictObject({
    windowId: id.nullable().describe('Null for work on-stream'),
    plannedOn: isoDate,
    note: prose(1000),
  }),
  response: reinspectionView,
});

export const unplanReinspection = route({
  method: 'post',
  path: '/api/reinspections/:id/unplan',
  summary: 'Take a re-inspection out of its plan, with a reason',
  access: 'reinspections.plan',
  versioned: true,
  status: 200,
  params: one,
  body: z.strictObject({ reason }),
  response: reinspectionView,
});
