import { outOfBounds, refused, type NumberRule, type Refused } from '../../geometry/refusal';
import type { CrackLaw } from '../../materials/crack-law';
import { crackLaw } from '../../materials/crack-law-library';
import { LOWEST_RATIO } from '../../materials/crack-law-scopes';
import { stabilityMargin } from './forman';
import { ratePerCycle, type LawConditions } from './rate-per-cycle';
import { temperatureRefusals } from './temperature-refusals';

/** One cycle at one tip. */
export interface LawPoint extends LawConditions {
  readonly rangeMPaSqrtMm: number;
  readonly stressRatio: number;
}

/** Growth in one cycle, or why the crack does not grow in a countable way. */
export type CycleGrowth =
  | {
      readonly status: 'grows';
      readonly mmPerCycle: number;
      readonly cautions: readonly string[];
    }
  | { readonly status: 'below threshold' }
  /** Kmax is at the toughness: the crack runs in this cycle. */
  | { readonly status: 'unstable'; readonly largestRangeMPaSqrtMm: number };

/** Growth per cycle by a law, refused outside the limits the law was published with. */
export function evaluateLaw(law: CrackLaw, point: LawPoint): CycleGrowth | Refused {
  const broken = [
    ...outOfBounds(rulesOf(law, point)),
    ...temperatureRefusals(law, point.temperatureC),
  ];
  if (broken.length > 0) return refused(...broken);
  const { rangeMPaSqrtMm: range, stressRatio } = point;
  if (law.form === 'forman' && !(stabilityMargin(range, stressRatio, law.toughnessMPaSqrtMm) > 0)) {
    return {
      status: 'unstable',
      largestRangeMPaSqrtMm: (1 - stressRatio) * law.toughnessMPaSqrtMm,
    };
  }
  const mmPerCycle = ratePerCycle(law, point)(range, stressRatio);
  if (mmPerCycle === 0) return { status: 'below threshold' };
  return { status: 'grows', mmPerCycle, cautions: cautionsOf(law, point, mmPerCycle) };
}

const AIR = crackLaw('ferritic-air-code');
const inAir = ({ rangeMPaSqrtMm, stressRatio }: LawPoint): number =>
  AIR ? ratePerCycle(AIR)(rangeMPaSqrtMm, stressRatio) : 0;

function cautionsOf(law: CrackLaw, point: LawPoint, mmPerCycle: number): string[] {
  const { scope, form } = law;
  const { rangeMPaSqrtMm, stressRatio } = point;
  const [least] = scope.rangeMPaSqrtMm;
  return [
    stressRatio < scope.stressRatio[0]
      ? 'The law is for a higher stress ratio: the growth is on the safe side.'
      : null,
    rangeMPaSqrtMm < least
      ? 'ΔK is below the range in which the law was measured; near a threshold real growth is slower.'
      : null,
    form === 'asme ferritic water' && mmPerCycle < inAir(point)
      ? 'At this small ΔK the reference curve in air is the higher one: take the larger of the two (common practice).'
      : null,
  ].filter((text) => text !== null);
}

function rulesOf({ scope, title }: CrackLaw, point: LawPoint): readonly NumberRule[] {
  const [lowRatio, highRatio] = scope.stressRatio;
  return [
    {
      input: 'rangeMPaSqrtMm',
      name: 'Range of stress intensity',
      unit: 'MPa·√mm',
      value: point.rangeMPaSqrtMm,
      min: 0,
      max: scope.rangeMPaSqrtMm[1],
      instead: `${title} holds no further: check for fracture, and the unit (1 MPa·√m is 31.6 MPa·√mm).`,
    },
    {
      input: 'stressRatio',
      name: 'Stress ratio',
      unit: '',
      value: point.stressRatio,
      min: scope.safeBelowRatio ? LOWEST_RATIO : lowRatio,
      max: highRatio,
      instead: `Choose a law for this ratio; ${title} is not for it.`,
    },
  ];
}
