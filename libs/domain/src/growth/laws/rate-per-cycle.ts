import type { CrackLaw } from '../../materials/crack-law';
import { growthPerCycle } from '../growth-law';
import { austeniticHeat, austeniticScale } from './austenitic-air';
import { newmanShare, openShare } from './closure';
import { ferriticAirScale, tensileRange } from './ferritic-air';
import { highWaterScale, lowWaterScale } from './ferritic-water';
import { formanRate } from './forman';
import { thresholdAt } from './threshold-line';
import { walkerRange } from './walker';

/** What a law may need to know besides range and stress ratio. */
export interface LawConditions {
  readonly temperatureC?: number;
  /** 1.12 σf √(πa): above it a compressive part counts in full [MPa·√mm]. */
  readonly wholeRangeAbove?: number;
}

/** Growth per cycle [mm/cycle] from ΔK [MPa·√mm] and R. */
export type RatePerCycle = (range: number, stressRatio: number) => number;

const ROOM_TEMPERATURE = 20;

/**
 * Growth per cycle by a law of any form, threshold included; for inner loops, the limits of the law are
 * checked elsewhere. No range, or one below the threshold at its stress ratio, gives 0.
 */
export function ratePerCycle(law: CrackLaw, conditions: LawConditions = {}): RatePerCycle {
  const rate = aboveThreshold(law, conditions);
  const { threshold } = law;
  const counted = countedRange(law, conditions);
  return (range, stressRatio) => {
    const counts = counted(range, stressRatio);
    if (!(counts > 0) || counts < thresholdAt(threshold, stressRatio)) return 0;
    return rate(counts, stressRatio);
  };
}

function countedRange(law: CrackLaw, { wholeRangeAbove = Infinity }: LawConditions): RatePerCycle {
  return law.form === 'asme ferritic air'
    ? (range, stressRatio) => tensileRange(range, stressRatio, wholeRangeAbove)
    : (range) => range;
}

function aboveThreshold(
  law: CrackLaw,
  { temperatureC = ROOM_TEMPERATURE }: LawConditions,
): RatePerCycle {
  switch (law.form) {
    case 'stages':
      return growthPerCycle({ stages: law.stages, thresholdMPaSqrtMm: 0 });
    case 'walker':
      return (range, r) => law.coefficient * walkerRange(range, r, law.gamma) ** law.exponent;
    case 'forman':
      return (range, r) => formanRate(law, range, r);
    case 'asme ferritic air':
      return (range, r) => law.coefficient * ferriticAirScale(r) * range ** law.exponent;
    case 'asme ferritic water':
      return waterRate(law);
    case 'austenitic air': {
      const coefficient = law.coefficient * austeniticHeat(temperatureC);
      return (range, r) => coefficient * austeniticScale(r) * range ** law.exponent;
    }
    case 'elber':
      return (range, r) =>
        law.coefficient * (openShare(law.constant, law.slope, r) * range) ** law.exponent;
    case 'newman':
      return (range, r) =>
        law.coefficient *
        (newmanShare(r, law.constraint, law.stressOverFlow) * range) ** law.exponent;
  }
}

// the lower piece is the steeper: below the transition it is the smaller, above it the larger
const waterRate =
  ({ low, high }: Extract<CrackLaw, { form: 'asme ferritic water' }>): RatePerCycle =>
  (range, r) =>
    Math.min(
      low.coefficient * lowWaterScale(r) * range ** low.exponent,
      high.coefficient * highWaterScale(r) * range ** high.exponent,
    );
