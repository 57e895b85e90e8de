import * as z from 'zod';
import { above0, between, id, line, reason, version } from './primitives';
import { route } from './route';

const stage = z.strictObject({
  coefficient: above0(1, 'mm/cycle at ΔK = 1 MPa√mm').describe('A in da/dN = A ΔK^m, N and mm'),
  exponent: between(0.5, 12, '').describe('m in da/dN = A ΔK^m'),
});

/** ΔK at which two straight pieces meet [MPa√mm]. */
export const meetingPoint = (a: z.infer<typeof stage>, b: z.infer<typeof stage>): number =>
  (a.coefficient / b.coefficient) ** (1 / (b.exponent - a.exponent));

const fields = {
  key: line(60).regex(/^[a-z0-9-]+$/, { error: 'Use lower-case letters, digits and hyphens.' }),
  title: line(160),
  environment: line(160),
  stages: z.array(stage).min(1).max(2).describe('One straight piece, or two in order of ΔK'),
  thresholdMpaSqrtMm: between(0, 1000, 'MPa√mm').describe('No growth below this ΔK [MPa√mm]'),
  source: line(300),
};

const twoStagesMeet = (law: { stages?: readonly z.infer<typeof stage>[] }) => {
  const [first, second] = law.stages ?? [];
  if (!first || !second) return true;
  const at = first.exponent === second.exponent ? NaN : meetingPoint(first, second);
  return Number.isFinite(at) && at > 1 && at < 1e5;
};
// a bend the other way would be two pieces in the wrong order, and grow too slowly in the middle
const steeperFirst = (law: { stages?: readonly z.infer<typeof stage>[] }) => {
  const [first, second] = law.stages ?? [];
  return !first || !second || first.exponent > second.exponent;
};
const upwards = {
  error:
    'The first piece, below the meeting point, has to be the steeper one. Exchange the pieces; a law that steepens upward is entered as one piece that lies above it.',
  path: ['stages'],
};
const apart = {
  error: 'The two pieces do not meet at a ΔK between 1 and 100 000 MPa√mm.',
  path: ['stages'],
};

export const growthLawBody = z
  .strictObject(fields)
  .refine(steeperFirst, upwards)
  .refine(twoStagesMeet, apart);
export const growthLawView = z.object({ ...fields, id, version });
export type GrowthLawView = z.infer<typeof growthLawView>;

export const listGrowthLaws = route({
  method: 'get',
  path: '/api/growth-laws',
  summary: 'Fatigue growth laws of the site',
  access: 'register.read',
  response: z.object({ rows: z.array(growthLawView) }),
});

export const addGrowthLaw = route({
  method: 'post',
  path: '/api/growth-laws',
  summary: 'Add a growth law with its source',
  access: 'materials.write',
  body: growthLawBody,
  response: growthLawView,
});

export const changeGrowthLaw = route({
  method: 'patch',
  path: '/api/growth-laws/:id',
  summary: 'Change a growth law; assessments already made keep the law they used',
  access: 'materials.write',
  versioned: true,
  params: z.object({ id }),
  body: z
    .strictObject(fields)
    .omit({ key: true })
    .partial()
    .extend({ reason })
    .refine(steeperFirst, upwards)
    .refine(twoStagesMeet, apart),
  response: growthLawView,
});
