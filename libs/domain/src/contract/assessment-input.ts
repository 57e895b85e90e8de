import * as z from 'zod';
import type { AssessmentInput } from '../assessment/assessment-input';
import { above0, between, given, line, prose } from './primitives';
import { FACES, FLAW_KINDS, ORIENTATIONS } from './vocabulary';

// The engine checks sense and units again, by name; these bounds only keep out what cannot be a value at all.
const length = (high: number) => given(above0(high, 'mm'));
const stress = given(between(-5000, 5000, 'MPa'));

const wall = z.discriminatedUnion('shape', [
  z.strictObject({
    shape: z.literal('plate'),
    thicknessMm: length(5000),
    widthMm: length(1e6).nullable(),
  }),
  z.strictObject({
    shape: z.literal('cylinder'),
    thicknessMm: length(5000),
    insideDiameterMm: length(1e6),
  }),
]);

const flaw = z.strictObject({
  kind: z.enum(FLAW_KINDS),
  face: z.enum(FACES),
  orientation: z.enum(ORIENTATIONS),
  heightMm: length(5000),
  lengthMm: length(1e6),
  ligamentMm: given(between(0, 5000, 'mm')).nullable(),
});

const residual = z.discriminatedUnion('state', [
  z.strictObject({ state: z.literal('none') }),
  z.strictObject({ state: z.literal('entered'), membraneMPa: stress, bendingMPa: stress }),
  z.strictObject({ state: z.literal('as-welded') }),
  z.strictObject({
    state: z.literal('heat-treated'),
    flawToWeld: z.enum(['parallel', 'transverse']),
  }),
]);

const law = z.strictObject({
  key: line(60),
  title: line(160),
  source: prose(300),
  stages: z
    .array(z.strictObject({ coefficient: above0(1, ''), exponent: between(0.1, 20, '') }))
    .min(1)
    .max(2),
  thresholdMPaSqrtMm: between(0, 1e5, 'MPa√mm'),
});

const block = z.strictObject({
  membraneRangeMPa: between(-5000, 5000, 'MPa'),
  bendingRangeMPa: between(-5000, 5000, 'MPa'),
  cyclesPerYear: between(0, 1e10, 'cycles per year'),
  note: prose(300),
});

const rate = given(between(0, 1000, 'mm/year'));

/** Everything one assessment needs, as it travels and is kept; the same members as the engine's own type. */
export const assessmentInput = z.strictObject({
  wall,
  flaw,
  sizing: z.strictObject({
    heightAllowanceMm: given(between(0, 1000, 'mm')),
    lengthAllowanceMm: given(between(0, 10_000, 'mm')),
  }),
  stress: z.strictObject({
    primaryMembraneMPa: stress,
    primaryBendingMPa: stress,
    residual,
    crackFacePressureMPa: given(between(0, 500, 'MPa')).nullable(),
  }),
  material: z.strictObject({
    yieldMPa: given(above0(1e6, 'MPa')),
    tensileMPa: given(above0(1e6, 'MPa')),
    youngsModulusMPa: given(above0(1e9, 'MPa')),
    poissonsRatio: given(between(0, 0.5, '')),
    toughnessMPaSqrtM: given(above0(1e5, 'MPa√m')),
    yieldPlateau: z.boolean(),
  }),
  growth: z.strictObject({
    fatigue: z.strictObject({ law, blocks: z.array(block).max(200) }).nullable(),
    stressCorrosion: z
      .strictObject({ depthRateMmPerYear: rate, endRateMmPerYear: rate })
      .nullable(),
  }),
  horizonYears: between(1, 100, 'years'),
}) satisfies z.ZodType<AssessmentInput>;
