import fc from 'fast-check';
import {
  referenceTemperature,
  toOneInch,
  type ReferenceTemperature,
  type ToughnessTest,
} from './reference-temperature-tests';

const test = (temperatureC: number, kJcMPaSqrtM: number, censored = false): ToughnessTest => ({
  temperatureC,
  kJcMPaSqrtM,
  thicknessMm: 25.4,
  censored,
  capacity: null,
});
const ONE = [70, 85, 95, 102, 118, 131].map((k) => test(-80, k));
const SEVERAL = [
  ...[62, 75, 81].map((k) => test(-100, k)),
  ...[90, 105, 88].map((k) => test(-80, k)),
  ...[112, 126, 97].map((k) => test(-60, k)),
  ...[140, 150].map((k) => test(-40, k)),
  test(-40, 160, true),
];
const CAPACITY = { ligamentMm: 25, yieldMPa: 450, youngsModulusMPa: 207_000, poissonsRatio: 0.3 };

function found(tests: readonly ToughnessTest[]): ReferenceTemperature {
  const answer = referenceTemperature(tests);
  if (answer.status === 'refused') throw new Error(answer.refusals[0]?.message);
  return answer;
}

describe('T0 from tests', () => {
  it('at one temperature takes the form for one', () => {
    const { t0C, method, uncensored, weight, deviationC } = found(ONE);
    expect(t0C).toBeCloseTo(-79.427254, 5);
    expect(method).toBe('one temperature');
    expect(uncensored).toBe(6);
    expect(weight).toBeCloseTo(1, 12);
    expect(deviationC).toBeCloseTo(Math.sqrt((18 * 18) / 6 + 16), 9);
  });

  it('at several temperatures is the most likely one', () => {
    const { t0C, method, leftOut, uncensored } = found(SEVERAL);
    expect(t0C).toBeCloseTo(-68.380168, 5);
    expect(method).toBe('maximum likelihood');
    expect(leftOut).toEqual([]);
    expect(uncensored).toBe(11);
  });

  it('leaves out tests more than 50 °C away', () => {
    const { t0C, leftOut } = found([...SEVERAL, test(20, 300), test(-160, 35)]);
    expect(leftOut.map(({ temperatureC }) => temperatureC)).toEqual([20, -160]);
    expect(t0C).toBeCloseTo(found(SEVERAL).t0C, 9);
  });

  it('is lower for a tougher steel', () => {
    fc.assert(
      fc.property(fc.double({ min: 1.01, max: 1.15, noNaN: true }), (more) => {
        const tougher = SEVERAL.map((each) => ({ ...each, kJcMPaSqrtM: each.kJcMPaSqrtM * more }));
        expect(found(tougher).t0C).toBeLessThan(found(SEVERAL).t0C);
      }),
    );
  });

  it('moves with the temperatures of the tests', () => {
    fc.assert(
      fc.property(fc.double({ min: -60, max: 60, noNaN: true }), (shift) => {
        const moved = SEVERAL.map((each) => ({ ...each, temperatureC: each.temperatureC + shift }));
        expect(found(moved).t0C).toBeCloseTo(found(SEVERAL).t0C + shift, 6);
      }),
    );
  });
});

describe('the most likely T0', () => {
  const drawn = (rows: readonly (readonly [temperature: number, ...values: number[]])[]) =>
    rows.flatMap(([temperature, ...values]) => values.map((k) => test(temperature, k)));
  const SETS = [
    {
      tests: [
        ...drawn([
          [-110, 56.5, 67.6, 61.7, 69.6],
          [-90, 88.6, 55.2, 43.4, 100],
          [-70, 90.8, 88.8, 166.1, 105.4],
          [-50, 140.9, 155.5, 105.7],
        ]),
        test(-50, 170, true),
      ],
      t0: -75.58557952781469,
    },
    {
      tests: [
        ...drawn([
          [-60, 67.1, 76.1, 63.6, 70.7, 68.3, 43.8],
          [-30, 101.5, 92.6, 77.8, 51.5, 108.9, 86.8],
          [0, 124.1],
        ]),
        ...[1, 2, 3, 4, 5].map(() => test(0, 150, true)),
      ],
      t0: -25.70608338765432,
    },
    {
      tests: drawn([
        [-20, 64.3, 85.1, 81],
        [0, 59, 62.6, 68.5],
        [20, 149.6, 103.2, 115.3],
        [40, 124.3, 143.7, 132.7],
      ]),
      t0: 14.73040050994647,
    },
  ];

  // T0 found by a search of the likelihood itself, not of its slope
  it.each(SETS)('is $t0 °C', ({ tests, t0 }) => {
    expect(found(tests).t0C).toBeCloseTo(t0, 4);
  });
});

describe('a test brought to a front of 25.4 mm', () => {
  it('keeps its value there and loses from a shorter one', () => {
    expect(toOneInch(test(-80, 100)).kMPaSqrtM).toBeCloseTo(100, 9);
    expect(toOneInch({ ...test(-80, 100), thicknessMm: 10 }).kMPaSqrtM).toBeLessThan(100);
  });

  it('is censored at the capacity of its specimen', () => {
    const beyond = toOneInch({ ...test(-40, 320), capacity: CAPACITY });
    expect(beyond.censored).toBe(true);
    expect(beyond.kMPaSqrtM).toBeCloseTo(292.0654, 4);
    expect(toOneInch({ ...test(-40, 280), capacity: CAPACITY }).censored).toBe(false);
  });
});

describe('tests that give no T0', () => {
  const inputOf = (tests: readonly ToughnessTest[]) => {
    const answer = referenceTemperature(tests);
    return answer.status === 'refused' ? answer.refusals.map(({ input }) => input) : [];
  };
  const limitOf = (tests: readonly ToughnessTest[]) => {
    const answer = referenceTemperature(tests);
    return answer.status === 'refused' ? (answer.refusals[0]?.limit ?? '') : '';
  };

  it('are too few, or all censored', () => {
    expect(limitOf([])).toMatch(/weights/);
    expect(limitOf(ONE.slice(0, 5))).toMatch(/weights/);
    expect(limitOf(SEVERAL.slice(0, 4))).toMatch(/weights/);
    expect(limitOf(ONE.map((each) => ({ ...each, censored: true })))).toMatch(/weights/);
  });

  it('are all on the lower shelf', () => {
    expect(limitOf([30, 35, 40, 32, 38, 41].map((k) => test(-150, k)))).toMatch(/at least 58/);
    expect(limitOf([21, 22, 23, 22].flatMap((k) => [test(-150, k), test(-140, k)]))).toMatch(
      /T0 within 300/,
    );
  });

  it('hold a number that is none, or of another unit', () => {
    expect(inputOf([...ONE, test(Number.NaN, 100)])).toEqual(['tests.6.temperatureC']);
    expect(inputOf([...ONE, test(-80, 3162)])).toEqual(['tests.6.kJcMPaSqrtM']);
    expect(inputOf([...ONE, test(-80, 20)])).toEqual(['tests.6.kJcMPaSqrtM']);
    expect(inputOf([{ ...test(-80, 100), capacity: { ...CAPACITY, yieldMPa: 0 } }])).toEqual([
      'tests.0.capacity.yieldMPa',
    ]);
  });
});
