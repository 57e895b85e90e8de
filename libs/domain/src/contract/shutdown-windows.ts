import * as z from 'zod';
import { id, isoDate, line, optionalLine, reason, version } from './primitives';
import { route } from './route';
import { WINDOW_KINDS, WINDOW_STATES } from './vocabulary';

const fields = {
  code: line(20),
  name: optionalLine(120),
  kind: z.enum(WINDOW_KINDS),
  startsOn: isoDate,
  endsOn: isoDate,
  scopeFreezeOn: isoDate
    .nullable()
    .describe('After this day work is added to the window only as late scope'),
  state: z.enum(WINDOW_STATES),
  unitIds: z.array(id).min(1, { error: 'Choose at least one unit.' }).max(100),
};
const inOrder = (value: { startsOn?: string; endsOn?: string }) =>
  value.startsOn === undefined || value.endsOn === undefined || value.startsOn <= value.endsOn;
const disorder = { error: 'The window ends before it starts.', path: ['endsOn'] };

export const windowBody = z.strictObject(fields).refine(inOrder, disorder);
export type WindowBody = z.infer<typeof windowBody>;

export const windowView = z.object({
  ...fields,
  id,
  unitCodes: z.array(z.string()),
  planned: z.number().int().describe('Re-inspections planned into it'),
  version,
});
export type WindowView = z.infer<typeof windowView>;

export const listWindows = route({
  method: 'get',
  path: '/api/shutdown-windows',
  summary: 'Shutdown windows in order of time',
  access: 'windows.read',
  response: z.object({ rows: z.array(windowView) }),
});

export const readWindow = route({
  method: 'get',
  path: '/api/shutdown-windows/:id',
  summary: 'One shutdown window',
  access: 'windows.read',
  params: z.object({ id }),
  response: windowView,
});

export const addWindow = route({
  method: 'post',
  path: '/api/shutdown-windows',
  summary: 'Add a shutdown window',
  access: 'windows.write',
  body: windowBody,
  response: windowView,
});

export const changeWindow = route({
  method: 'patch',
  path: '/api/shutdown-windows/:id',
  summary: 'Move, change or cancel a window; what no longer fits in it is open again',
  access: 'windows.write',
  versioned: true,
  params: z.object({ id }),
  body: z.strictObject(fields).partial().extend({ reason }).refine(inOrder, disorder),
  response: z.object({
    window: windowView,
    released: z
      .array(z.object({ id, task: z.string(), tag: z.string(), dueOn: isoDate }))
      .describe('Re-inspections that no longer fit and are open again'),
  }),
});
