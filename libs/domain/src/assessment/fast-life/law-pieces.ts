import { LEAST_K } from '../../fracture/stress-intensity/plate-surface-ends';
import type { GrowthLaw, LawStage } from '../../growth/growth-law';
import { exp, logOfAny } from '../../numerics/exp-log';

/** A growth law in the logarithm, piece by piece in order of ΔK; the first is the one without growth. */
export interface LawPieces {
  readonly lnC: Float64Array;
  readonly m: Float64Array;
  /** ln ΔK from which and to which each piece holds. */
  readonly low: Float64Array;
  readonly high: Float64Array;
}

/** ln of a rate that is none, far below any other yet a number. */
const LN_NOTHING = -600;
const NO_BOUND = 1e300;

const known = new WeakMap<GrowthLaw, LawPieces>();

/** The pieces of a law, worked out once for each law object. */
export function lawPieces(law: GrowthLaw): LawPieces {
  const pieces = known.get(law) ?? piecesOf(law);
  known.set(law, pieces);
  return pieces;
}

/** The pieces of a law; a stage that lies wholly under the threshold is left out. */
function piecesOf({ stages, thresholdMPaSqrtMm }: GrowthLaw): LawPieces {
  const threshold = logOfAny(Math.max(thresholdMPaSqrtMm, LEAST_K * 1.001));
  const uppers = stages.map((stage, i) => lnTransition(stage, stages[i + 1]));
  const grown = stages
    .map((stage, i) => ({
      lnC: logOfAny(stage.coefficient),
      m: stage.exponent,
      high: uppers[i] ?? NO_BOUND,
    }))
    .filter(({ high }) => high > threshold);
  const pieces = [{ lnC: LN_NOTHING, m: 0, high: threshold }, ...grown];
  return {
    lnC: Float64Array.from(pieces, ({ lnC }) => lnC),
    m: Float64Array.from(pieces, ({ m }) => m),
    low: Float64Array.from(pieces, (_, i) => pieces[i - 1]?.high ?? -NO_BOUND),
    high: Float64Array.from(pieces, ({ high }) => high),
  };
}

// as `transition` of the law, with the own logarithm for the sake of its last bits
const lnTransition = (lower: LawStage, upper: LawStage | undefined): number =>
  upper
    ? (logOfAny(lower.coefficient) - logOfAny(upper.coefficient)) /
      (upper.exponent - lower.exponent)
    : NO_BOUND;

/** Which piece holds at a given ln ΔK. */
export function pieceOf({ high }: LawPieces, lnK: number): number {
  let piece = 0;
  while (piece < high.length - 1 && lnK >= (high[piece] as number)) piece++;
  return piece;
}

/** Growth per cycle at a given ln ΔK, for comparison with the law it came from [mm]. */
export function rateOf(law: LawPieces, lnK: number): number {
  const piece = pieceOf(law, lnK);
  return piece === 0 ? 0 : exp((law.lnC[piece] as number) + (law.m[piece] as number) * lnK);
}
