import { outOfBounds, refused, type NumberRule, type Refused } from '../../geometry/refusal';
import { findRoot } from '../../numerics/find-root';
import { yearsToShare } from './thinning';
import { stressIntensityAfter, type ThinningCrack } from './thinning-crack';

export type TimeToToughness =
  | { readonly status: 'reached'; readonly years: number }
  | { readonly status: 'reached already' }
  /** The crack goes through, or the wall goes, before K gets there. */
  | { readonly status: 'through the wall first'; readonly years: number }
  | { readonly status: 'never' };

/** Time until K = Y S0 B0/(B0 − r t) √(π a) reaches a value [MPa·√mm]. */
export function yearsToToughness(
  crack: ThinningCrack,
  toughnessMPaSqrtMm: number,
): TimeToToughness | Refused {
  const broken = outOfBounds(rulesOf(crack, toughnessMPaSqrtMm));
  if (broken.length > 0) return refused(...broken);
  const { depthMm, wallMm, growthMmPerYear, thinning } = crack;
  const missing = (years: number) => stressIntensityAfter(crack, years) - toughnessMPaSqrtMm;
  if (missing(0) >= 0) return { status: 'reached already' };
  const through = yearsToShare(depthMm, wallMm, 1, growthMmPerYear, thinning);
  if (!Number.isFinite(through)) return { status: 'never' };
  // K only rises on a crack that deepens; on one that is corroded away it may turn: the far end decides
  const root = findRoot(missing, 0, through * (1 - 1e-12));
  return root.status === 'found'
    ? { status: 'reached', years: root.x }
    : { status: 'through the wall first', years: through };
}

function rulesOf(crack: ThinningCrack, toughness: number): readonly NumberRule[] {
  const { depthMm, wallMm, growthMmPerYear, thinning, stressMPa, shapeFactor } = crack;
  const rate = { unit: 'mm/year', min: 0, max: 1000, instead: 'Give a rate in mm a year.' };
  return [
    {
      input: 'wallMm',
      name: 'Wall',
      unit: 'mm',
      value: wallMm,
      min: 0,
      max: 2000,
      above: true,
      instead: 'Give the wall now in millimetres.',
    },
    {
      input: 'depthMm',
      name: 'Depth',
      unit: 'mm',
      value: depthMm,
      min: 0,
      max: wallMm > 0 ? wallMm : 2000,
      above: true,
      instead: 'Give a depth inside the wall in millimetres.',
    },
    { ...rate, input: 'growthMmPerYear', name: 'Growth', value: growthMmPerYear },
    {
      ...rate,
      input: 'thinning.rateMmPerYear',
      name: 'Corrosion rate',
      value: thinning.rateMmPerYear,
    },
    {
      input: 'stressMPa',
      name: 'Stress',
      unit: 'MPa',
      value: stressMPa,
      min: 0,
      max: 5000,
      above: true,
      instead: 'Give the membrane stress now in MPa.',
    },
    {
      input: 'shapeFactor',
      name: 'Shape factor',
      unit: '',
      value: shapeFactor,
      min: 0,
      max: 100,
      above: true,
      instead: 'Give K over stress times the root of πa, about 1.',
    },
    {
      input: 'toughnessMPaSqrtMm',
      name: 'Toughness',
      unit: 'MPa·√mm',
      value: toughness,
      min: 0,
      max: 20_000,
      above: true,
      instead: 'Give the toughness in MPa·√mm (1 MPa·√m is 31.6).',
    },
  ];
}
