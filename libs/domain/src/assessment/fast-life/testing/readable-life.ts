import { plateSurfaceInfluence } from '../../../fracture/stress-intensity/plate-surface-k';
import { combine, type Influence } from '../../../fracture/stress-intensity/solution';
import type { Crack } from '../../../geometry/crack';
import { ratesPerYear, type Rates } from '../../../growth/growth-rates';
import type { GrowthLaw } from '../../../growth/growth-law';
import { integrateGrowth, type GrowthLimit } from '../../../growth/integrate-growth';
import { degrees, mm } from '../../../units/quantity';
import type { FatigueFlaw } from '../flaw-table';

/** Life by the readable equations and the general integrator, one cycle a year. */
export function readableLife(
  flaw: FatigueFlaw,
  law: GrowthLaw,
  options: { readonly tolerance?: number; readonly maxStep?: number },
) {
  const deepest: Influence = { membrane: 0, bending: 0, reversedBending: 0 };
  const end: Influence = { membrane: 0, bending: 0, reversedBending: 0 };
  const take = (a: number, c: number) => {
    const crack = crackOf(flaw, a, c);
    plateSurfaceInfluence(crack, degrees(90), deepest);
    plateSurfaceInfluence(crack, degrees(0), end);
  };
  const { membraneRangeMPa, bendingRangeMPa } = flaw;
  const blocks = [{ membraneRangeMPa, bendingRangeMPa, cyclesPerYear: 1 }];
  const perYear = ratesPerYear(
    { fatigue: { law, blocks }, stressCorrosion: null },
    { deepest: (m, b) => combine(deepest, m, b), end: (m, b) => combine(end, m, b) },
  );
  const rates = (a: number, c: number, into: Rates) => {
    take(a, c);
    perYear(into);
  };
  const highest = (a: number, c: number) => {
    take(a, c);
    return Math.max(
      combine(deepest, membraneRangeMPa, bendingRangeMPa),
      combine(end, membraneRangeMPa, bendingRangeMPa),
    );
  };
  const limits: GrowthLimit[] = [
    { key: 'depth', margin: (a) => 0.8 - a / flaw.thicknessMm },
    { key: 'length', margin: (_, c) => 0.25 - c / flaw.widthMm },
    { key: 'short', margin: (a, c) => 2 - a / c },
    { key: 'long', margin: (a, c) => a / c - 0.04 },
    { key: 'toughness', margin: (a, c) => 1 - highest(a, c) / flaw.limitRangeMPaSqrtMm },
  ];
  const start = { a: flaw.depthMm, c: flaw.halfLengthMm };
  const run = integrateGrowth(start, rates, limits, { horizonYears: 1e18, ...options });
  const last = run.states[run.states.length - 1];
  return { cycles: last?.years ?? 0, stop: run.limit ?? run.stop, evaluations: run.evaluations };
}

const crackOf = ({ thicknessMm, widthMm }: FatigueFlaw, a: number, c: number): Crack => ({
  a: mm(a),
  c: mm(c),
  ligament: mm(0),
  thickness: mm(thicknessMm),
  width: mm(widthMm),
  insideRadius: mm(Infinity),
  holeRadius: mm(0),
});
