import fc from 'fast-check';
import type { TimeLaw } from '../../materials/time-law';
import { timeLaw, TIME_LAWS } from '../../materials/time-law-library';
import type { RatesAt } from '../growth-walk';
import { arrhenius } from './arrhenius';
import { cyclicRate } from './cycle-frequency';
import { frequencyCaution } from './frequency-caution';
import { corrosionLife, corrosionRate } from './corrosion-life';
import { netDepthRate, stressRise, wallAfter, yearsToShare, type Thinning } from './thinning';
import { stressCorrosionRates, superposed, withThinning } from './time-rates';
import { evaluateTimeLaw, rateWithTime } from './time-rate';
import type { ThinningCrack } from './thinning-crack';
import { yearsToToughness } from './years-to-toughness';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const OWN = {
  key: 'own',
  title: 'Own law',
  environment: 'caustic',
  source: 'own',
  stressIntensityMPaSqrtMm: [0, 5000],
  temperatureC: [0, 400],
} as const;
const PLATEAU: TimeLaw = {
  ...OWN,
  form: 'plateau',
  rateMmPerYear: 2,
  thresholdMPaSqrtMm: 300,
};
const POWER: TimeLaw = {
  ...OWN,
  form: 'power',
  coefficient: 1e-6,
  exponent: 2,
  plateauMmPerYear: 1,
  thresholdMPaSqrtMm: 200,
};
const ALLOY = (() => {
  const law = timeLaw('alloy-600-primary-water');
  if (!law) throw new Error('law missing');
  return law;
})();
const OPPOSITE: Thinning = { rateMmPerYear: 0.1, face: 'opposite' };
const CRACKED: Thinning = { rateMmPerYear: 0.1, face: 'cracked' };

describe('growth with time', () => {
  it('is nothing below the threshold and whole from it', () => {
    expect(rateWithTime(PLATEAU, 20)(299)).toBe(0);
    expect(rateWithTime(PLATEAU, 20)(300)).toBe(2);
    expect(rateWithTime(POWER, 20)(199)).toBe(0);
    expect(rateWithTime(POWER, 20)(500)).toBeCloseTo(0.25, 12);
  });

  it('goes no higher than its plateau', () => {
    expect(rateWithTime(POWER, 20)(1000)).toBe(1);
    expect(rateWithTime(POWER, 20)(4000)).toBe(1);
  });

  it('starts from nothing at the threshold of the thermal form', () => {
    const rate = rateWithTime(ALLOY, 325);
    expect(rate(ALLOY.thresholdMPaSqrtMm)).toBe(0);
    expect(rate(ALLOY.thresholdMPaSqrtMm + 1e-6)).toBeLessThan(1e-6);
    expect(rate(ALLOY.thresholdMPaSqrtMm - 1)).toBe(0);
  });

  it('never falls with K, nor with temperature in the thermal form', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(PLATEAU, POWER, ...TIME_LAWS),
        between(1, 2000),
        between(0, 500),
        (law, k, more) => {
          const rate = rateWithTime(law, 320);
          expect(rate(k + more)).toBeGreaterThanOrEqual(rate(k));
        },
      ),
    );
    expect(rateWithTime(ALLOY, 340)(1000)).toBeGreaterThan(rateWithTime(ALLOY, 320)(1000));
    expect(arrhenius(130, 325, 325)).toBe(1);
  });

  it('is nothing for no K', () => {
    for (const law of [PLATEAU, POWER, ...TIME_LAWS]) {
      expect([0, -1, Number.NaN].map(rateWithTime(law, 300))).toEqual([0, 0, 0]);
    }
  });

  it.each([
    ['temperatureC', { stressIntensityMPaSqrtMm: 900, temperatureC: 20 }],
    ['temperatureC', { stressIntensityMPaSqrtMm: 900, temperatureC: Number.NaN }],
    ['stressIntensityMPaSqrtMm', { stressIntensityMPaSqrtMm: -1, temperatureC: 325 }],
    ['stressIntensityMPaSqrtMm', { stressIntensityMPaSqrtMm: 30_000, temperatureC: 325 }],
  ])('is refused for a %s outside the law', (input, at) => {
    expect(evaluateTimeLaw(ALLOY, at)).toMatchObject({ status: 'refused', refusals: [{ input }] });
  });

  it('is found inside it, and a plateau stays what it is', () => {
    expect(evaluateTimeLaw(ALLOY, { stressIntensityMPaSqrtMm: 900, temperatureC: 325 })).toEqual({
      status: 'found',
      mmPerYear: rateWithTime(ALLOY, 325)(900),
    });
    expect(timeLaw('no-such-law')).toBeUndefined();
  });
});

describe('a wall that thins', () => {
  it('never gets below nothing', () => {
    expect(wallAfter(20, 0.1, 300)).toBe(0);
    expect(stressRise(20, 0, 300)).toBe(1);
  });

  it('loses crack on the cracked face, wall on the opposite one', () => {
    expect(netDepthRate(0.05, CRACKED)).toBeCloseTo(-0.05, 12);
    expect(netDepthRate(0.05, OPPOSITE)).toBe(0.05);
    expect(yearsToShare(4, 20, 0.8, 0.4, OPPOSITE)).toBeLessThan(
      yearsToShare(4, 20, 0.8, 0.4, CRACKED),
    );
  });

  it('puts the crack at the share it was asked for', () => {
    fc.assert(
      fc.property(
        between(1, 8),
        between(0.4, 0.9),
        between(0.01, 1),
        between(0, 0.5),
        fc.constantFrom('opposite' as const, 'cracked' as const),
        (depth, share, growth, rateMmPerYear, face) => {
          const thinning = { rateMmPerYear, face };
          const years = yearsToShare(depth, 20, share, growth, thinning);
          if (!Number.isFinite(years) || years === 0) return;
          const a = depth + netDepthRate(growth, thinning) * years;
          expect(a - share * wallAfter(20, rateMmPerYear, years)).toBeCloseTo(0, 8);
        },
      ),
    );
  });

  it('is at the share already, or never', () => {
    expect(yearsToShare(17, 20, 0.8, 0.4, OPPOSITE)).toBe(0);
    expect(yearsToShare(4, 20, 0.8, 0, { ...OPPOSITE, rateMmPerYear: 0 })).toBe(Infinity);
    expect(yearsToShare(4, 20, 0.8, 0.01, CRACKED)).toBe(Infinity);
    // crack and wall go to nothing together
    expect(yearsToShare(1, 20, 0.9, 0.2, { ...CRACKED, rateMmPerYear: 0.5 })).toBe(Infinity);
  });
});

describe('the time to a toughness', () => {
  const crack: ThinningCrack = {
    depthMm: 4,
    wallMm: 20,
    growthMmPerYear: 0.1,
    thinning: OPPOSITE,
    stressMPa: 120,
    shapeFactor: 1.12,
  };

  it('stands where K is the toughness', () => {
    const outcome = yearsToToughness(crack, 700);
    if (outcome.status !== 'reached') throw new Error(outcome.status);
    const k =
      1.12 *
      120 *
      stressRise(20, 0.1, outcome.years) *
      Math.sqrt(Math.PI * (4 + 0.1 * outcome.years));
    expect(k).toBeCloseTo(700, 6);
  });

  it('is the closed form without thinning', () => {
    const outcome = yearsToToughness(
      { ...crack, thinning: { ...OPPOSITE, rateMmPerYear: 0 } },
      800,
    );
    const size = (800 / (1.12 * 120)) ** 2 / Math.PI;
    expect(outcome.status === 'reached' ? outcome.years : 0).toBeCloseTo((size - 4) / 0.1, 8);
  });

  it('never gets longer by thinning, growth or stress', () => {
    const years = (changed: Partial<ThinningCrack>) => {
      const outcome = yearsToToughness({ ...crack, ...changed }, 700);
      return outcome.status === 'reached' ? outcome.years : 0;
    };
    expect(years({ thinning: { ...OPPOSITE, rateMmPerYear: 0.2 } })).toBeLessThan(years({}));
    expect(years({ growthMmPerYear: 0.2 })).toBeLessThan(years({}));
    expect(years({ stressMPa: 130 })).toBeLessThan(years({}));
  });

  it('says when it is past, when the wall goes first and when it never comes', () => {
    expect(yearsToToughness(crack, 100)).toEqual({ status: 'reached already' });
    expect(
      yearsToToughness({ ...crack, thinning: { ...OPPOSITE, rateMmPerYear: 0 } }, 15_000),
    ).toEqual({ status: 'through the wall first', years: 160 });
    expect(
      yearsToToughness(
        { ...crack, growthMmPerYear: 0, thinning: { ...OPPOSITE, rateMmPerYear: 0 } },
        700,
      ),
    ).toEqual({ status: 'never' });
  });

  it.each([
    ['depthMm', { depthMm: 0 }],
    ['depthMm', { depthMm: 25 }],
    ['wallMm', { wallMm: Number.NaN }],
    ['growthMmPerYear', { growthMmPerYear: -1 }],
    ['thinning.rateMmPerYear', { thinning: { ...OPPOSITE, rateMmPerYear: Infinity } }],
    ['stressMPa', { stressMPa: 120e6 }],
    ['shapeFactor', { shapeFactor: 0 }],
  ])('refuses an impossible %s', (input, changed) => {
    expect(yearsToToughness({ ...crack, ...changed }, 700)).toMatchObject({
      status: 'refused',
      refusals: [{ input }],
    });
  });
});

describe('corrosion of a wall', () => {
  const readings = [
    { years: 1990, wallMm: 19.05 },
    { years: 1997, wallMm: 18.85 },
    { years: 2003, wallMm: 18.24 },
  ];

  it('goes by the larger of short and long term', () => {
    const outcome = corrosionRate(readings);
    if (outcome.status === 'refused') throw new Error('refused');
    expect(outcome.shortTermMmPerYear).toBeCloseTo(0.61 / 6, 9);
    expect(outcome.longTermMmPerYear).toBeCloseTo(0.81 / 13, 9);
    expect(outcome).toMatchObject({ governs: 'short term', cautions: [] });
    expect(outcome.governingMmPerYear).toBe(outcome.shortTermMmPerYear);
  });

  it('has one rate from two readings', () => {
    const outcome = corrosionRate(readings.slice(0, 2));
    expect(outcome).toMatchObject({ governs: 'long term' });
  });

  it('does not believe a wall that grows', () => {
    const outcome = corrosionRate([...readings, { years: 2005, wallMm: 18.5 }]);
    expect(outcome).toMatchObject({ governs: 'long term', cautions: [expect.any(String)] });
    const grown = corrosionRate([
      { years: 0, wallMm: 10 },
      { years: 5, wallMm: 11 },
    ]);
    expect(grown).toMatchObject({ governingMmPerYear: 0 });
  });

  it.each([
    ['readings', []],
    ['readings', [{ years: 1, wallMm: 10 }]],
    [
      'readings.1.years',
      [
        { years: 5, wallMm: 10 },
        { years: 5, wallMm: 9 },
      ],
    ],
    [
      'readings.1.years',
      [
        { years: 5, wallMm: 10 },
        { years: 2, wallMm: 9 },
      ],
    ],
    [
      'readings.1.wallMm',
      [
        { years: 5, wallMm: 10 },
        { years: 6, wallMm: -9 },
      ],
    ],
    [
      'readings.0.years',
      [
        { years: Number.NaN, wallMm: 10 },
        { years: 6, wallMm: 9 },
      ],
    ],
  ])('refuses impossible %s', (input, given) => {
    expect(corrosionRate(given)).toMatchObject({ status: 'refused', refusals: [{ input }] });
  });

  it('leaves years, none when overdue, never a negative number', () => {
    expect(corrosionLife(18, 12, 0.4)).toMatchObject({ status: 'found' });
    expect(corrosionLife(11, 12, 0.4)).toEqual({ status: 'overdue', missingMm: 1 });
    expect(corrosionLife(12, 12, 0.4)).toEqual({ status: 'overdue', missingMm: 0 });
    expect(corrosionLife(18, 12, 0)).toEqual({ status: 'no corrosion' });
  });

  it.each([
    ['wallMm', 0, 12, 0.4],
    ['requiredMm', 18, Number.NaN, 0.4],
    ['rateMmPerYear', 18, 12, -0.1],
  ])('refuses an impossible %s', (input, wall, required, rate) => {
    expect(corrosionLife(wall, required, rate)).toMatchObject({
      status: 'refused',
      refusals: [{ input }],
    });
  });
});

describe('rates that know the time', () => {
  const steady =
    (a: number, c: number): RatesAt =>
    (_a, _c, into) => {
      into.a = a;
      into.c = c;
    };
  const at = (rates: RatesAt, years = 0) => {
    const into = { a: Number.NaN, c: Number.NaN };
    rates(2, 5, into, years);
    return into;
  };

  it('add up, nested or not', () => {
    expect(at(superposed(steady(0.2, 0.1), steady(0.15, 0)))).toEqual({ a: 0.35, c: 0.1 });
    expect(at(superposed(steady(1, 1), superposed(steady(2, 2), steady(3, 3))))).toEqual({
      a: 6,
      c: 6,
    });
    expect(at(superposed())).toEqual({ a: 0, c: 0 });
  });

  it('follow a K that rises as the wall thins', () => {
    const k = (_a: number, _c: number, years: number) => 250 * stressRise(20, 0.1, years);
    const rates = stressCorrosionRates(rateWithTime(PLATEAU, 20), { deepest: k, end: () => 0 });
    expect(at(rates, 0)).toEqual({ a: 0, c: 0 });
    expect(at(rates, 40)).toEqual({ a: 2, c: 0 });
  });

  it('lose depth at the mouth where the cracked face corrodes', () => {
    expect(at(withThinning(steady(0.4, 0.2), CRACKED))).toEqual({ a: 0.30000000000000004, c: 0.2 });
    expect(at(withThinning(steady(0.4, 0.2), OPPOSITE))).toEqual({ a: 0.4, c: 0.2 });
    expect(at(withThinning(steady(0.05, 0.2), CRACKED))).toEqual({ a: 0, c: 0.2 });
  });
});

describe('the frequency of cycles', () => {
  it('turns growth per cycle into growth per year', () => {
    expect(cyclicRate(1e-9, 1, 0.5)).toBeCloseTo(0.0157788, 9);
    expect(cyclicRate(1e-9, 0, 1)).toBe(0);
  });

  it('is spoken of outside the tests behind the marine laws', () => {
    expect(frequencyCaution(0.01)).toMatch(/faster/);
    expect(frequencyCaution(10)).toMatch(/safe side/);
    expect([0.1, 0.5, 1].map(frequencyCaution)).toEqual([null, null, null]);
  });
});
