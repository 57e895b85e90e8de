import type { Rates } from '../growth-rates';
import { netDepthRate, type Thinning } from './thinning';

/** Rates of the two sizes of a flaw at a time: the integrator's own, with the years handed on. */
export type TimeRates = (a: number, c: number, years: number, into: Rates) => void;

/**
 * Wei and Landes: cycles and time side by side, da/dt = f da/dN + (da/dt)SCC; any number of parts is added.
 */
export function superposed(...parts: readonly TimeRates[]): TimeRates {
  const one: Rates = { a: 0, c: 0 };
  return (a, c, years, into) => {
    into.a = 0;
    into.c = 0;
    for (const part of parts) {
      part(a, c, years, one);
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
): TimeRates {
  return (a, c, years, into) => {
    into.a = rate(k.deepest(a, c, years));
    into.c = rate(k.end(a, c, years));
  };
}

/** The same rates in a wall that corrodes: on the cracked face the mouth of the crack is lost. */
export function withThinning(rates: TimeRates, thinning: Thinning): TimeRates {
  return (a, c, years, into) => {
    rates(a, c, years, into);
    into.a = netDepthRate(into.a, thinning);
  };
}
