import fc from 'fast-check';
import { constantThreshold, scope, STEEL_IN_AIR } from '../../materials/crack-law-scopes';
import { NO_THRESHOLD, type CrackLaw } from '../../materials/crack-law';
import { CRACK_LAW_LIBRARY, crackLaw } from '../../materials/crack-law-library';
import { heated, scaledByModulus } from '../../materials/scaled-by-modulus';
import { growthPerCycle } from '../growth-law';
import { austeniticHeat, austeniticScale } from './austenitic-air';
import { newmanShare, openingLevel, openShare } from './closure';
import { evaluateLaw } from './evaluate-law';
import { ferriticAirScale, tensileRange } from './ferritic-air';
import { highWaterScale, lowWaterScale, waterTransition } from './ferritic-water';
import { formanRate, stabilityMargin } from './forman';
import { ratePerCycle } from './rate-per-cycle';
import { thresholdAt } from './threshold-line';
import { walkerRange } from './walker';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const REST = {
  key: 'own',
  title: 'Own law',
  environment: 'air',
  source: 'own',
  threshold: NO_THRESHOLD,
  scope: scope({}),
} as const;
const law = (key: string): CrackLaw => {
  const found = crackLaw(key);
  if (!found) throw new Error(`no law ${key}`);
  return found;
};
const ELBER: CrackLaw = {
  ...REST,
  form: 'elber',
  coefficient: 1e-11,
  exponent: 3,
  constant: 0.5,
  slope: 0.4,
};
const NEWMAN: CrackLaw = {
  ...REST,
  form: 'newman',
  coefficient: 1e-11,
  exponent: 3,
  constraint: 2,
  stressOverFlow: 0.3,
};
const EVERY = [...CRACK_LAW_LIBRARY, ELBER, NEWMAN].map((each) => [each.key, each] as const);

describe('every law', () => {
  it.each(EVERY)('%s: grows no slower at a larger range', (_, each) => {
    const rate = ratePerCycle(each);
    fc.assert(
      fc.property(between(1, 2500), between(0, 500), between(0, 0.79), (range, more, r) => {
        expect(rate(range + more, r)).toBeGreaterThanOrEqual(rate(range, r) * (1 - 1e-12));
      }),
    );
  });

  it.each(EVERY)('%s: grows no slower at a larger stress ratio', (_, each) => {
    const rate = ratePerCycle(each);
    // published factors step back by a quarter of a percent in water (R = 0.25), by 0.05 % in air (R = 0)
    const step = /water/.test(each.form) ? 0.003 : each.form === 'asme ferritic air' ? 5e-4 : 1e-12;
    fc.assert(
      fc.property(between(1, 2500), between(-1, 0.79), between(0, 1), (range, r, share) => {
        const higher = r + share * (0.79 - r);
        expect(rate(range, higher)).toBeGreaterThanOrEqual(rate(range, r) * (1 - step));
      }),
    );
  });

  it.each(EVERY)('%s: is a number at any range, and nothing for none', (_, each) => {
    const rate = ratePerCycle(each);
    expect([0, -5, Number.NaN].map((range) => rate(range, 0.5))).toEqual([0, 0, 0]);
    fc.assert(
      fc.property(between(0, 1e6), between(-5, 0.99), (range, r) => {
        expect(Number.isFinite(rate(range, r))).toBe(true);
        expect(rate(range, r)).toBeGreaterThanOrEqual(0);
      }),
    );
  });

  it.each(EVERY)('%s: has limits in order and says where it comes from', (_, each) => {
    const { rangeMPaSqrtMm, stressRatio, temperatureC } = each.scope;
    for (const [min, max] of [rangeMPaSqrtMm, stressRatio, temperatureC]) {
      expect(max).toBeGreaterThan(min);
    }
    expect(each.source.length).toBeGreaterThan(2);
  });

  it('has a key of its own, and none has a wrong one', () => {
    expect(new Set(CRACK_LAW_LIBRARY.map(({ key }) => key)).size).toBe(CRACK_LAW_LIBRARY.length);
    expect(crackLaw('no-such-law')).toBeUndefined();
  });
});

describe('thresholds', () => {
  it('fall with the stress ratio without a jump', () => {
    expect(thresholdAt(STEEL_IN_AIR, 0.5)).toBe(63);
    expect(thresholdAt(STEEL_IN_AIR, 0.9)).toBe(63);
    expect(thresholdAt(STEEL_IN_AIR, -3)).toBe(170);
    expect(thresholdAt(constantThreshold(63), -3)).toBe(63);
  });

  it('are whole from the range on', () => {
    const rate = ratePerCycle(law('steel-air-high-upper'));
    expect(rate(62.99, 0.5)).toBe(0);
    expect(rate(63, 0.5)).toBeGreaterThan(0);
  });

  it('are higher in parent metal than at a weld, where the stress ratio is low', () => {
    const parent = ratePerCycle(law('steel-air-simplified-parent'));
    expect(parent(150, 0)).toBe(0);
    expect(parent(150, 0.5)).toBe(ratePerCycle(law('steel-air-simplified'))(150, 0));
  });

  it('are none in sea water', () => {
    for (const each of CRACK_LAW_LIBRARY) {
      if (/^marine/.test(each.environment)) expect(each.threshold).toEqual(NO_THRESHOLD);
    }
  });
});

describe('the reference curves in air', () => {
  it('scale by 1 at R = 0, nearly, and by more above', () => {
    expect(ferriticAirScale(0)).toBeCloseTo(1, 3);
    expect(ferriticAirScale(-1)).toBe(1);
    expect(ferriticAirScale(0.9)).toBeGreaterThan(3);
  });

  it('count the tensile part of a cycle, without a jump at R = 0 and −2', () => {
    expect(tensileRange(300, -1, Infinity)).toBe(150);
    expect(tensileRange(300, -1e-12, Infinity)).toBeCloseTo(300, 8);
    expect(tensileRange(300, -2, Infinity)).toBe(100);
    expect(tensileRange(300, -5, Infinity)).toBe(100);
    expect(tensileRange(300, -1, 299)).toBe(300);
    expect(tensileRange(300, 0.4, 1)).toBe(300);
  });

  it('count the whole range once it is large against flow stress', () => {
    const reference = law('ferritic-air-code');
    const part = ratePerCycle(reference)(1000, -1);
    const whole = ratePerCycle(reference, { wholeRangeAbove: 900 })(1000, -1);
    expect(whole / part).toBeCloseTo(2 ** 3.07, 9);
  });

  it('grow faster in hot austenitic steel, hardly at room temperature', () => {
    const reference = law('austenitic-air-code');
    const cold = ratePerCycle(reference, { temperatureC: 20 })(500, 0);
    const hot = ratePerCycle(reference, { temperatureC: 400 })(500, 0);
    expect(ratePerCycle(reference)(500, 0)).toBe(cold);
    expect(hot / cold).toBeCloseTo(austeniticHeat(400) / austeniticHeat(20), 12);
    expect(hot).toBeGreaterThan(cold);
  });

  it('step by no more than a percent where the published factor steps', () => {
    expect(austeniticScale(0.79 + 1e-9) / austeniticScale(0.79) - 1).toBeLessThan(0.011);
    expect(austeniticScale(-1)).toBe(1);
    expect(austeniticScale(1e-12)).toBeCloseTo(1, 9);
  });
});

describe('the reference curve in water', () => {
  it('scales without a jump at its breaks', () => {
    for (const [r, low, high] of [
      [0.25, 1, 1],
      [0.65, 11.76, 2.5],
    ] as const) {
      for (const side of [-1e-9, 1e-9]) {
        expect(lowWaterScale(r + side)).toBeCloseTo(low, 2);
        expect(highWaterScale(r + side)).toBeCloseTo(high, 2);
      }
    }
  });

  it('has its transition where the pieces meet', () => {
    const reference = law('ferritic-water-code');
    if (reference.form !== 'asme ferritic water') throw new Error('wrong form');
    for (const r of [0, 0.4, 0.9]) {
      const at = waterTransition(reference, r);
      const rate = ratePerCycle(reference);
      expect(rate(at * (1 + 1e-9), r) / rate(at * (1 - 1e-9), r)).toBeCloseTo(1, 6);
      expect(rate(at * 1.01, r) / rate(at, r)).toBeCloseTo(1.01 ** 1.95, 6);
      expect(rate(at / 1.01, r) / rate(at, r)).toBeCloseTo(1.01 ** -5.95, 6);
    }
  });
});

describe('Walker and Forman', () => {
  it('leave Kmax of a cycle below R = 0', () => {
    expect(walkerRange(200, -1, 0.6)).toBe(100);
    expect(walkerRange(200, 0, 0.6)).toBe(200);
  });

  it.each(['2024-t3', '7075-t6'])('agree for %s in the middle of their range', (metal) => {
    const [walker, forman] = [`walker-${metal}`, `forman-${metal}`].map((key) =>
      ratePerCycle(law(key)),
    );
    // two fits of the same kind of test: within a quarter of each other at 10 MPa·√m
    for (const r of [0, 0.3, 0.5]) {
      const share = (forman?.(316.2, r) ?? 0) / (walker?.(316.2, r) ?? 1);
      expect(share).toBeGreaterThan(0.75);
      expect(share).toBeLessThan(1.25);
    }
  });

  it('run away as Kmax nears the toughness, and stay a number beyond it', () => {
    const constants = { coefficient: 1e-6, exponent: 3, toughnessMPaSqrtMm: 100 };
    expect(stabilityMargin(50, 0.5, 100)).toBe(0);
    expect(formanRate(constants, 49.99, 0.5)).toBeGreaterThan(100 * formanRate(constants, 40, 0.5));
    expect(formanRate(constants, 80, 0.5)).toBeGreaterThan(formanRate(constants, 50, 0.5));
    expect(Number.isFinite(formanRate(constants, 50, 0.5))).toBe(true);
  });
});

describe('crack closure', () => {
  it('keeps the share open between 0 and 1', () => {
    expect(openShare(0.5, 0.4, -5)).toBe(0);
    expect(openShare(0.5, 0.4, 5)).toBe(1);
    fc.assert(
      fc.property(between(-2, 0.99), between(1, 3), between(0, 0.8), (r, alpha, level) => {
        const open = newmanShare(r, alpha, level);
        expect(open).toBeGreaterThan(0);
        expect(open).toBeLessThanOrEqual(1 + 1e-9);
      }),
    );
  });

  it('is all of Kmax at R = 1 and has no jump at R = 0', () => {
    for (const alpha of [1, 2, 3]) {
      expect(openingLevel(1, alpha, 0.3)).toBeCloseTo(1, 12);
      expect(openingLevel(-1e-9, alpha, 0.3)).toBeCloseTo(openingLevel(0, alpha, 0.3), 8);
    }
  });

  it('opens later in plane stress than in plane strain', () => {
    expect(openingLevel(0, 1, 0.3)).toBeGreaterThan(openingLevel(0, 3, 0.3));
  });
});

describe('a law for another modulus', () => {
  const steel = law('steel-air-simplified');

  it('takes the cube of the ratio at m = 3, and the threshold falls', () => {
    const aluminium = law('aluminium-air-simplified');
    const factor = (207_000 / 70_000) ** 3;
    expect(ratePerCycle(aluminium)(500, 0.5) / ratePerCycle(steel)(500, 0.5)).toBeCloseTo(
      factor,
      9,
    );
    expect(thresholdAt(aluminium.threshold, 0.5)).toBeCloseTo(21.3, 1);
  });

  it('holds at the temperature it is heated to alone', () => {
    const hot = heated(steel, { modulusCold: 207_000, modulusHot: 185_000, temperatureC: 300 });
    const point = { rangeMPaSqrtMm: 500, stressRatio: 0.5 };
    expect(evaluateLaw(steel, { ...point, temperatureC: 300 })).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'temperatureC', value: 300 }],
    });
    const growth = evaluateLaw(hot, { ...point, temperatureC: 300 });
    expect(growth.status === 'grows' ? growth.mmPerCycle : 0).toBeCloseTo(
      5.21e-13 * 500 ** 3 * (207 / 185) ** 3,
      12,
    );
  });

  it('leaves laws with their own temperature or toughness as they are', () => {
    expect(scaledByModulus(law('forman-2024-t3'), 1, 2)).toBe(law('forman-2024-t3'));
  });
});

describe('one cycle by a law', () => {
  const upper = law('steel-air-high-upper');
  const point = { rangeMPaSqrtMm: 300, stressRatio: 0.6 };

  it('grows as the law says', () => {
    expect(evaluateLaw(upper, point)).toEqual({
      status: 'grows',
      mmPerCycle: ratePerCycle(upper)(300, 0.6),
      cautions: [],
    });
    if (upper.form !== 'stages') throw new Error('wrong form');
    const plain = growthPerCycle({ stages: upper.stages, thresholdMPaSqrtMm: 63 });
    expect(plain(300)).toBe(ratePerCycle(upper)(300, 0.6));
  });

  it('stands still below the threshold', () => {
    expect(evaluateLaw(upper, { ...point, rangeMPaSqrtMm: 50 })).toEqual({
      status: 'below threshold',
    });
  });

  it('says so where the law is on the safe side or below what was measured', () => {
    expect(evaluateLaw(upper, { ...point, stressRatio: 0.1 })).toMatchObject({
      cautions: [expect.stringMatching(/safe side/)],
    });
    expect(
      evaluateLaw(law('walker-2024-t3'), { rangeMPaSqrtMm: 50, stressRatio: 0.1 }),
    ).toMatchObject({ cautions: [expect.stringMatching(/below the range/)] });
  });

  it('is unstable where Kmax reaches the toughness', () => {
    const forman: CrackLaw = {
      ...REST,
      form: 'forman',
      coefficient: 1e-6,
      exponent: 3,
      toughnessMPaSqrtMm: 1000,
    };
    expect(evaluateLaw(forman, { rangeMPaSqrtMm: 500, stressRatio: 0.5 })).toEqual({
      status: 'unstable',
      largestRangeMPaSqrtMm: 500,
    });
  });

  it.each([
    ['rangeMPaSqrtMm', { ...point, rangeMPaSqrtMm: -1 }],
    ['rangeMPaSqrtMm', { ...point, rangeMPaSqrtMm: Number.NaN }],
    ['rangeMPaSqrtMm', { ...point, rangeMPaSqrtMm: 1e6 }],
    ['stressRatio', { ...point, stressRatio: 1 }],
    ['stressRatio', { ...point, stressRatio: Number.NaN }],
    ['temperatureC', { ...point, temperatureC: 350 }],
  ])('is refused for an impossible %s', (input, wrong) => {
    expect(evaluateLaw(upper, wrong)).toMatchObject({ status: 'refused', refusals: [{ input }] });
  });

  it('is refused where the law needs a temperature and none is given', () => {
    const austenitic = law('austenitic-air-code');
    expect(evaluateLaw(austenitic, point)).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'temperatureC', value: null }],
    });
    expect(evaluateLaw(austenitic, { ...point, temperatureC: 300 })).toMatchObject({
      status: 'grows',
    });
  });

  it('says so where the curve in air is above the one in water', () => {
    const water = law('ferritic-water-code');
    expect(evaluateLaw(water, { rangeMPaSqrtMm: 190, stressRatio: 0 })).toMatchObject({
      cautions: [expect.stringMatching(/larger of the two/)],
    });
    expect(evaluateLaw(water, { rangeMPaSqrtMm: 600, stressRatio: 0 })).toMatchObject({
      cautions: [],
    });
  });

  it('is refused at a stress ratio above the law’s', () => {
    const low = evaluateLaw(law('steel-air-low-upper'), point);
    expect(low).toMatchObject({ status: 'refused', refusals: [{ input: 'stressRatio' }] });
  });
});
