import * as z from 'zod';
import { id, line, reason, version } from './primitives';
import { route } from './route';

export const unitBody = z.strictObject({ code: line(20), name: line(120) });
export const unitView = z.object({
  id,
  code: z.string(),
  name: z.string(),
  components: z.number().int(),
  version,
});
export type UnitView = z.infer<typeof unitView>;

export const listUnits = route({
  method: 'get',
  path: '/api/units',
  summary: 'Units of the site',
  access: 'register.read',
  response: z.object({ rows: z.array(unitView) }),
});

export const addUnit = route({
  method: 'post',
  path: '/api/units',
  summary: 'Add a unit',
  access: 'register.write',
  body: unitBody,
  response: unitView,
});

export const changeUnit = route({
  method: 'patch',
  path: '/api/units/:id',
  summary: 'Change a unit',
  access: 'register.write',
  versioned: true,
  params: z.object({ id }),
  body: unitBody.partial().extend({ reason }),
  response: unitView,
});
