import { growNeighbours, type FlawRates, type NeighbourPair } from './grow-neighbours';

const steady =
  (a: number, c: number): FlawRates =>
  (_a, _c, into) => {
    into.a = a;
    into.c = c;
  };
const exponential: FlawRates = (a, c, into) => {
  into.a = 0.05 * a;
  into.c = 0.1 * c;
};
const PAIR: NeighbourPair = {
  flaws: [
    { a: 3, c: 10 },
    { a: 2, c: 6 },
  ],
  rates: [steady(0.1, 0.3), steady(0.05, 0.2)],
  centreDistanceMm: 40,
  rule: (one, other) => Math.max(one.a, other.a),
};
const run = (changed: Partial<NeighbourPair>, years = 100) => {
  const outcome = growNeighbours({ ...PAIR, ...changed }, years);
  if (outcome.status === 'refused') throw new Error(outcome.refusals[0]?.message);
  return outcome;
};

describe('two flaws growing side by side', () => {
  it('join when the gap has come down to the rule', () => {
    // 24 − 0.5 t = 3 + 0.1 t
    const { status, years, flaws, joined } = run({});
    expect(status).toBe('joined');
    expect(years).toBeCloseTo(35, 6);
    expect(flaws[0].a).toBeCloseTo(6.5, 6);
    expect(joined?.a).toBeCloseTo(6.5, 6);
    expect(joined?.c).toBeCloseTo((40 + 20.5 + 13) / 2, 6);
  });

  it('follow rates that rise with the size', () => {
    const { years } = run({ rates: [exponential, exponential], rule: () => 0 });
    // 16 e^{0.1 t} = 40
    expect(years).toBeCloseTo(Math.log(2.5) / 0.1, 6);
  });

  it('stay apart until the horizon, each as long as it has grown', () => {
    const { status, years, flaws, joined } = run({}, 20);
    expect(status).toBe('apart');
    expect(years).toBeCloseTo(20, 9);
    expect(flaws[1].c).toBeCloseTo(10, 7);
    expect(joined).toBeNull();
  });

  it('are one from the start when they are near enough', () => {
    expect(run({ centreDistanceMm: 18 })).toMatchObject({ status: 'joined', years: 0 });
  });

  it('stay as they are where neither grows', () => {
    const { status, flaws } = run({ rates: [steady(0, 0), steady(0, 0)] });
    expect(status).toBe('apart');
    expect(flaws[0].a).toBeCloseTo(3, 12);
  });

  it('join no later when one of them is larger or nearer', () => {
    const { years } = run({});
    expect(run({ flaws: [{ a: 3, c: 12 }, PAIR.flaws[1]] }).years).toBeLessThan(years);
    expect(run({ centreDistanceMm: 38 }).years).toBeLessThan(years);
  });

  it('join before one of them runs away', () => {
    // dc/dt = 0.01 c², infinite at 10 years from c = 10
    const runaway: FlawRates = (_a, c, into) => {
      into.a = 0;
      into.c = 0.01 * c * c;
    };
    const { status, years } = run({ rates: [runaway, steady(0, 0)], rule: () => 0 });
    expect(status).toBe('joined');
    expect(years).toBeCloseTo((1 / 10 - 1 / 34) / 0.01, 6);
  });

  it.each([
    ['flaws.0.a', { flaws: [{ a: 0, c: 10 }, PAIR.flaws[1]] as const }, 100],
    ['flaws.1.c', { flaws: [PAIR.flaws[0], { a: 1, c: Number.NaN }] as const }, 100],
    ['centreDistanceMm', { centreDistanceMm: -40 }, 100],
    ['horizonYears', {}, Infinity],
  ])('refuses an impossible %s', (input, changed, years) => {
    expect(growNeighbours({ ...PAIR, ...changed }, years)).toMatchObject({
      status: 'refused',
      refusals: [{ input }],
    });
  });
});
