import type { Crack } from '../geometry/crack';
import type { StressIntensitySolution } from '../fracture/stress-intensity/solution';
import { combine, type Influence } from '../fracture/stress-intensity/solution';
import { degrees, mm } from '../units/quantity';

/** A crack in the symbols of the papers; what is left out is infinitely far away. */
export interface CrackSymbols {
  readonly a: number;
  readonly c: number;
  readonly t?: number;
  readonly p?: number;
  readonly W?: number;
  readonly Ri?: number;
  readonly r?: number;
}

/** The crack of the given symbols [mm]. */
export const crackOf = ({
  a,
  c,
  t = 1e9,
  p = 0,
  W = Infinity,
  Ri = Infinity,
  r = 0,
}: CrackSymbols): Crack => ({
  a: mm(a),
  c: mm(c),
  ligament: mm(p),
  thickness: mm(t),
  width: mm(W),
  insideRadius: mm(Ri),
  holeRadius: mm(r),
});

/** K per unit of stress of a solution at an angle [√mm]. */
export function influenceOf(
  solution: Pick<StressIntensitySolution, 'influence'>,
  symbols: CrackSymbols,
  angle: number,
): Influence {
  const into: Influence = { membrane: 0, bending: 0, reversedBending: 0 };
  solution.influence(crackOf(symbols), degrees(angle), into);
  return into;
}

/** K of a solution from membrane and bending stress [MPa·√mm]. */
export const kOf = (
  solution: Pick<StressIntensitySolution, 'influence'>,
  symbols: CrackSymbols,
  angle: number,
  membrane: number,
  bending = 0,
): number => combine(influenceOf(solution, symbols, angle), membrane, bending);
