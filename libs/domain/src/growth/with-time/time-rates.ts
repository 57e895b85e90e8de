import type { Rates } from '../growth-rates';
import type { RatesAt } from '../growth-walk';
import { netDepthRate, type Thinning } from './thinning';

/**
 * Wei and Landes: cycles and time side by side, da/dt = f da/dN + (da/dt)SCC; any number of parts is added.
 */
export function superposed(...parts: readonly RatesAt[]): RatesAt {
  const one: Rates = { a: 0, c: 0 };
  return (a, c, into, years) => {
    into.a = 0;
    into.c = 0;
    for (const part of parts) {
      part(a, c, one, years);
      into.a += one.a;
      into.c += one.c;
    }
  };
}

/** Growth with time by the stress intensity at the deepest point and at the end of the flaw. */
export function stressCorrosionRates(
  rate: (stressIntensity: number) => number,
  k: {
    readonly deepest: (a: number, c: number, years: number) => number;
    readonly end: (a: number, c: number, years: number) => number;
  },
): RatesAt {
  return (a, c, into, years) => {
    into.a = rate(k.deepest(a, c, years));
    into.c = rate(k.end(a, c, years));
  };
}

/**
 * The same rates in a wall that corrodes: on the cracked face the mouth of the crack is lost. A crack that
 * would be taken away keeps its depth, on the safe side.
 */
export function withThinning(rates: RatesAt, thinning: Thinning): RatesAt {
  return (a, c, into, years) => {
    rates(a, c, into, years);
    into.a = Math.max(netDepthRate(into.a, thinning), 0);
  };
}
