import type { RatesAt } from './growth-walk';
import { growWithTime } from './grow-with-time';
import { integrateGrowth } from './integrate-growth';
import { stressRise, wallAfter, yearsToShare } from './with-time/thinning';
import { withThinning } from './with-time/time-rates';

const last = (states: readonly { years: number; a: number; c: number }[]) =>
  states[states.length - 1] ?? { years: NaN, a: NaN, c: NaN };
const steady: RatesAt = (_a, _c, into) => {
  into.a = 0.4;
  into.c = 0.2;
};
const START = { a: 4, c: 10 };

describe('growth under rates that change with time', () => {
  it.each(['opposite', 'cracked'] as const)(
    'meets the closed form of a wall thinning: %s',
    (face) => {
      const thinning = { rateMmPerYear: 0.1, face };
      const margin = (a: number, _c: number, years: number) => 0.8 * wallAfter(20, 0.1, years) - a;
      const run = growWithTime(START, withThinning(steady, thinning), [{ key: 'share', margin }], {
        horizonYears: 200,
      });
      expect(run).toMatchObject({ stop: 'limit', limit: 'share' });
      expect(last(run.states).years).toBeCloseTo(yearsToShare(4, 20, 0.8, 0.4, thinning), 6);
    },
  );

  it('agrees with the walk by size where nothing depends on time', () => {
    const rates: RatesAt = (a, c, into) => {
      into.a = 1e-3 * a ** 1.5;
      into.c = 5e-4 * c ** 1.5;
    };
    const limits = [{ key: 'end', margin: (a: number) => 15 - a }];
    const options = { horizonYears: 1e4, tolerance: 1e-9 };
    const one = last(growWithTime(START, rates, limits, options).states);
    const other = last(integrateGrowth(START, rates, limits, options).states);
    expect(one.years / other.years).toBeCloseTo(1, 6);
    expect(one.c / other.c).toBeCloseTo(1, 6);
  });

  it('begins to grow when the thinning wall has brought K to the threshold', () => {
    // K = 250 B0/(B0 − r t) reaches 300 at 33.3 years; 0.5 mm a year from there
    const rates: RatesAt = (_a, _c, into, years) => {
      into.a = 250 * stressRise(20, 0.1, years) >= 300 ? 0.5 : 0;
      into.c = 0;
    };
    const run = growWithTime(START, rates, [], { horizonYears: 60 });
    expect(run.stop).toBe('horizon');
    expect(last(run.states).a).toBeCloseTo(4 + 0.5 * (60 - 100 / 3), 2);
  });

  it('follows a rate that rises steadily with the time', () => {
    const rates: RatesAt = (_a, _c, into, years) => {
      into.a = 0.02 * years;
      into.c = 0;
    };
    const run = growWithTime(START, rates, [], { horizonYears: 40 });
    expect(last(run.states).a).toBeCloseTo(4 + 0.01 * 40 ** 2, 4);
  });

  it('reaches a limit of the wall while the flaw stands still', () => {
    const still: RatesAt = (_a, _c, into) => {
      into.a = 0;
      into.c = 0;
    };
    const margin = (_a: number, _c: number, years: number) => wallAfter(20, 0.1, years) - 17;
    const run = growWithTime(START, still, [{ key: 'wall', margin }], { horizonYears: 200 });
    expect(run).toMatchObject({ stop: 'limit', limit: 'wall' });
    expect(last(run.states).years).toBeCloseTo(30, 8);
    const none = growWithTime(START, still, [], { horizonYears: 200 });
    expect(none.stop).toBe('no growth');
    expect(last(none.states).years).toBeCloseTo(200, 8);
    expect(last(none.states).a).toBeCloseTo(4, 12);
  });

  it('ends at once at a limit that is reached already', () => {
    const run = growWithTime(START, steady, [{ key: 'deep', margin: (a) => 3 - a }], {
      horizonYears: 10,
    });
    expect(run).toMatchObject({ stop: 'limit', limit: 'deep' });
    expect(run.states).toHaveLength(1);
  });
});
