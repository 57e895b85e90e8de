import * as z from 'zod';
import type { AssessmentInput } from '../assessment/assessment-input';
import { above0, between, given, line, prose } from './primitives';
import { FACES, FLAW_KINDS, ORIENTATIONS } from './vocabulary';

// The engine checks sense and units again, by name; these bounds only keep out what cannot be a value at all.
const length = (high: number) => given(above0(high, 'mm'));
const stress = given(between(-5000, 5000, 'MPa'));

const thicknessMm = length(5000);
const widthMm = length(1e6).nullable();

const wall = z.discriminatedUnion('shape', [
  z.strictObject({ shape: z.literal('plate'), thicknessMm, widthMm }),
  z.strictObject({
    shape: z.enum(['cylinder', 'sphere']),
    thicknessMm,
    insideDiameterMm: length(1e6),
  }),
  z.strictObject({
    shape: z.literal('hole edge'),
    thicknessMm,
    holeRadiusMm: length(1e5),
    widthMm,
    flawedSides: z.enum(['one', 'both']),
  }),
  z.strictObject({ shape: z.literal('nozzle corner'), thicknessMm, holeRadiusMm: length(1e5) }),
  z.strictObject({ shape: z.literal('round bar'), thicknessMm }),
]);

/** Coefficients of a polynomial through the wall, lowest degree first. */
const profile = given(
  z
    .array(between(-1e5, 1e5, 'MPa'))
    .min(1)
    .max(5),
);

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
  z.strictObject({ state: z.literal('proof-tested'), membraneMPa: stress, bendingMPa: stress }),
  z.strictObject({ state: z.literal('profile'), profileMPa: profile }),
  z.strictObject({
    state: z.literal('heat-treated'),
    flawToWeld: z.enum(['parallel', 'transverse']),
  }),
]);

const law = z.strictObject({
  published: z.boolean().optional(),
  key: line(60),
  title: line(160),
  source: prose(300),
  stages: z
    .array(z.strictObject({ coefficient: above0(1, ''), exponent: between(0.1, 20, '') }))
    .max(2),
  thresholdMPaSqrtMm: between(0, 1e5, 'MPa√mm'),
});

const block = z.strictObject({
  membraneRangeMPa: between(-5000, 5000, 'MPa'),
  bendingRangeMPa: between(-5000, 5000, 'MPa'),
  cyclesPerYear: between(0, 1e10, 'cycles per year'),
  note: prose(300),
  stressRatio: between(-1e6, 1, '').nullish(),
});

const timeLaw = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('published'), key: line(60) }),
  z.strictObject({
    kind: z.literal('own'),
    coefficient: given(above0(1e9, '')),
    exponent: given(between(0, 50, '')),
    thresholdMPaSqrtM: given(between(0, 1e4, 'MPa√m')),
    plateauMmPerYear: given(above0(1e6, 'mm/year')).nullable(),
  }),
]);
const celsius = given(between(-273, 2000, '°C'));

const rate = given(between(0, 1000, 'mm/year'));

const neighbour = z.strictObject({
  name: line(60),
  kind: z.enum(['surface', 'embedded']),
  heightMm: length(5000),
  lengthMm: length(1e6),
  ligamentMm: given(between(0, 5000, 'mm')).nullable(),
  distanceMm: given(between(-1e6, 1e6, 'mm')),
  planeOffsetMm: given(between(0, 1e6, 'mm')),
});

const factor = between(1, 10, '');
const choice = z.strictObject({ key: line(80), reason: prose(1000).min(3) });

/** What may be left out. */
const options = {
  neighbours: z.array(neighbour).max(50).nullish(),
  interactionRule: line(80).nullish(),
  partialFactors: z
    .strictObject({
      stress: factor,
      size: factor,
      toughness: factor,
      yield: factor,
      note: prose(300),
    })
    .nullish(),
  stressIntensityChoice: choice.nullish(),
  referenceStressChoice: choice.nullish(),
};

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
    primaryProfileMPa: profile.nullish(),
    peakProfileMPa: profile.nullish(),
    weldToe: z.strictObject({ attachmentLengthMm: length(5000) }).nullish(),
    offsetMm: given(between(-1000, 1000, 'mm')).nullish(),
  }),
  material: z.strictObject({
    yieldMPa: given(above0(1e6, 'MPa')),
    tensileMPa: given(above0(1e6, 'MPa')),
    youngsModulusMPa: given(above0(1e9, 'MPa')),
    poissonsRatio: given(between(0, 0.5, '')),
    toughnessMPaSqrtM: given(above0(1e5, 'MPa√m')),
    yieldPlateau: z.boolean(),
    stressStrainCurve: given(
      z
        .array(z.strictObject({ strain: between(0, 10, ''), stressMPa: between(0, 1e6, 'MPa') }))
        .max(500),
    ).nullish(),
  }),
  growth: z.strictObject({
    fatigue: z
      .strictObject({ law, blocks: z.array(block).max(200), temperatureC: celsius.nullish() })
      .nullable(),
    stressCorrosion: z
      .strictObject({ depthRateMmPerYear: rate, endRateMmPerYear: rate })
      .nullable(),
    withTime: z.strictObject({ law: timeLaw, temperatureC: celsius }).nullish(),
    thinning: z
      .strictObject({ rateMmPerYear: rate, face: z.enum(['cracked', 'opposite']) })
      .nullish(),
  }),
  horizonYears: between(1, 100, 'years'),
  ...options,
}) satisfies z.ZodType<AssessmentInput>;
