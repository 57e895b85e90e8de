import * as z from 'zod';
import { flawFinding } from './flaws';
import { above0, between, id, line, listQuery, optionalLine, page } from './primitives';
import { route } from './route';
import { FACES, FLAW_KINDS, INDICATION_TYPES, ORIENTATIONS } from './vocabulary';

export const findingRow = flawFinding.extend({
  flawId: id,
  flawNumber: z.string(),
  componentId: id,
  tag: z.string(),
  locationName: z.string(),
  indicationNo: z.string(),
});
export type FindingRow = z.infer<typeof findingRow>;

export const listFindings = route({
  method: 'get',
  path: '/api/findings',
  summary: 'What inspections recorded, newest first',
  access: 'flaws.read',
  query: z.object({
    ...listQuery,
    inspection: id.optional(),
    flaw: id.optional(),
    component: id.optional(),
  }),
  response: page(findingRow),
});

export const findingBody = z.strictObject({
  indicationNo: line(40),
  locationId: id,
  indicationType: z.enum(INDICATION_TYPES),
  kind: z.enum(FLAW_KINDS),
  face: z.enum(FACES),
  orientation: z.enum(ORIENTATIONS),
  heightMm: above0(500, 'mm').describe('Depth a, or full height 2a when embedded [mm]'),
  lengthMm: above0(200_000, 'mm'),
  ligamentMm: between(0, 500, 'mm').nullable(),
  axialMm: between(-100_000, 1_000_000, 'mm').nullable(),
  circumferentialMm: between(-1_000_000, 1_000_000, 'mm').nullable(),
  wallMm: between(0.5, 500, 'mm').nullable(),
  remarks: optionalLine(500),
  flaw: z.discriminatedUnion('kind', [
    z.strictObject({ kind: z.literal('new') }),
    z.strictObject({ kind: z.literal('continues'), flawId: id }),
  ]),
});
export type FindingBody = z.infer<typeof findingBody>;

export const addFinding = route({
  method: 'post',
  path: '/api/inspections/:id/findings',
  summary: 'Enter one finding by hand, with the checks of an import',
  access: 'imports.write',
  params: z.object({ id }),
  body: findingBody,
  response: findingRow,
});
