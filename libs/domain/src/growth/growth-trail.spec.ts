import { integrateGrowth } from './integrate-growth';

const RATES = (a: number, c: number, into: { a: number; c: number }) => {
  into.a = 1e-3 * a ** 1.5;
  into.c = 2e-4 * c;
};
const limits = [{ key: 'end', margin: (a: number) => 12 - a }];
const follow = (states?: number) =>
  integrateGrowth({ a: 1, c: 10 }, RATES, limits, { horizonYears: 1e9, states });

/** Years to a depth, in closed form: 2 (1 − 1/√a)/1e-3. */
const yearsTo = (a: number) => 2e3 * (1 - 1 / Math.sqrt(a));

describe('the states of a way', () => {
  it('are as many as wanted and even along the way', () => {
    const { states, distance } = follow(40);
    expect(states).toHaveLength(40);
    const places = states.map(({ a, c }) => Math.log(a) + Math.log(c / 10));
    places.forEach((place, i) => {
      expect(Math.abs(place - (distance * i) / 39)).toBeLessThan(0.04);
    });
  });

  it('cost no evaluation and change neither the life nor its end', () => {
    const [plain, drawn] = [follow(), follow(40)];
    expect(drawn.evaluations).toBe(plain.evaluations);
    expect(drawn.distance).toBe(plain.distance);
    expect(drawn.states[drawn.states.length - 1]).toEqual(plain.states[plain.states.length - 1]);
    expect(drawn.states[0]).toEqual({ years: 0, a: 1, c: 10 });
  });

  it('lie on the curve of the growth, in the order of time', () => {
    const { states } = follow(40);
    const years = states.map((state) => state.years);
    expect(years).toEqual([...years].sort((x, y) => x - y));
    for (const { years: at, a } of states) expect(at).toBeCloseTo(yearsTo(a), 1);
  });

  it('are the start and the horizon where nothing grows', () => {
    const still = (_a: number, _c: number, into: { a: number; c: number }) => {
      into.a = 0;
      into.c = 0;
    };
    const run = integrateGrowth({ a: 2, c: 5 }, still, limits, { horizonYears: 40, states: 30 });
    expect(run.stop).toBe('no growth');
    expect(run.states.map(({ years }) => years)).toEqual([0, 40]);
    expect(run.evaluations).toBeLessThan(60);
  });
});
