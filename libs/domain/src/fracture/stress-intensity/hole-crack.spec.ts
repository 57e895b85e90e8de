import fc from 'fast-check';
import { mm } from '../../units/quantity';
import { crackOf, influenceOf } from '../../verification/crack-of';
import {
  holeBiaxialFactor,
  holeOneCrackFactor,
  holeTwoCracksFactor,
  notchLongCrackFactor,
  notchShortCrackFactor,
} from './hole-crack';
import { holeWidthFactor, oneOfTwo } from './hole-parts';
import { HOLE_THROUGH_ONE_K, HOLE_THROUGH_TWO_K } from './hole-through-k';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const one = mm(1);

describe('cracks at a circular hole', () => {
  it('start at three times the half plane, two under equal tension both ways at twice', () => {
    const short = mm(1e-9);
    expect(holeTwoCracksFactor(short, one) / (3 * 1.1215)).toBeCloseTo(1, 2);
    expect(holeOneCrackFactor(short, one) / (3 * 1.1215)).toBeCloseTo(1, 2);
    expect(holeBiaxialFactor(short, one) / (2 * 1.1215)).toBeCloseTo(1, 2);
  });

  it('count the hole as crack when long: √(1 + R/c) for two, half as much length for one', () => {
    fc.assert(
      fc.property(between(3, 1e6), (c) => {
        const two = holeTwoCracksFactor(mm(c), one) / Math.sqrt(1 + 1 / c);
        expect(Math.abs(two - 1)).toBeLessThan(0.007);
        const single = holeOneCrackFactor(mm(c), one) / Math.sqrt((1 + 2 / c) / 2);
        expect(Math.abs(single - 1)).toBeLessThan(0.03);
      }),
    );
    expect(holeBiaxialFactor(mm(1e9), one)).toBeCloseTo(1, 8);
  });

  it('are never worse alone than as two', () => {
    fc.assert(
      fc.property(between(1e-3, 1e3), (c) => {
        expect(holeOneCrackFactor(mm(c), one)).toBeLessThanOrEqual(
          1.0025 * holeTwoCracksFactor(mm(c), one),
        );
      }),
    );
  });

  it('lose by the second tension, which presses the hole together', () => {
    fc.assert(
      fc.property(between(0.01, 3), (c) => {
        expect(holeBiaxialFactor(mm(c), one)).toBeLessThan(holeTwoCracksFactor(mm(c), one));
      }),
    );
  });

  it('depend on c/R alone', () => {
    expect(holeOneCrackFactor(mm(3), mm(5))).toBeCloseTo(holeOneCrackFactor(mm(30), mm(50)), 12);
  });
});

describe('cracks at an elliptical hole', () => {
  it('of a circle are those of the circular hole, when short', () => {
    fc.assert(
      fc.property(between(1e-4, 0.2), (c) => {
        const ratio = notchShortCrackFactor(mm(c), one, one) / holeTwoCracksFactor(mm(c), one);
        expect(Math.abs(ratio - 1)).toBeLessThan(0.02);
      }),
    );
  });

  it('start at the peak stress of the notch', () => {
    expect(notchShortCrackFactor(mm(1e-9), mm(4), mm(1))).toBeCloseTo(9 * 1.1215, 5);
  });

  it('count the notch as crack when long', () => {
    expect(notchLongCrackFactor(mm(1e9), mm(4))).toBeCloseTo(1, 8);
    // half crack length A + c against c
    expect(notchLongCrackFactor(mm(5), mm(4))).toBeCloseTo(Math.sqrt(9 / 5), 12);
  });

  it('pass from short to long without a gap of more than 7 %', () => {
    // where the crack has the length of the root radius
    const ratio =
      notchShortCrackFactor(mm(0.5), mm(2), mm(1)) / notchLongCrackFactor(mm(0.5), mm(2));
    expect(Math.abs(ratio - 1)).toBeLessThan(0.07);
  });
});

describe('the width of a plate with a cracked hole', () => {
  const at = (W: number, sides: 1 | 2) =>
    holeWidthFactor(crackOf({ a: 5, c: 5, t: 10, r: 5, W }), 1, sides);

  it('does nothing when it is large', () => {
    expect(at(Infinity, 2)).toBe(1);
    expect(at(1e6, 1)).toBeCloseTo(1, 8);
  });

  it('raises K the more, the narrower the plate and the more cracks', () => {
    fc.assert(
      fc.property(between(40, 400), (W) => {
        expect(at(W, 2)).toBeGreaterThan(at(W + 10, 2));
        expect(at(W, 2)).toBeGreaterThan(at(W, 1));
      }),
    );
  });

  it('leaves a single crack between √½ of two and all of them', () => {
    const ratio = (c: number) => oneOfTwo(crackOf({ a: c, c, t: 10, r: 5 }), 10);
    expect(ratio(1e-6)).toBeCloseTo(1, 9);
    expect(ratio(1e6)).toBeCloseTo(Math.SQRT1_2, 6);
  });
});

describe('the crack through the wall at a hole', () => {
  it('is the two-dimensional crack in a wide plate, through any thickness', () => {
    for (const t of [5, 50]) {
      const crack = { a: t, c: 4, t, r: 8 };
      const root = Math.sqrt(Math.PI * 4);
      expect(influenceOf(HOLE_THROUGH_ONE_K, crack, 0).membrane).toBeCloseTo(
        root * holeOneCrackFactor(mm(4), mm(8)),
        12,
      );
      expect(influenceOf(HOLE_THROUGH_TWO_K, crack, 0).membrane).toBeCloseTo(
        root * holeTwoCracksFactor(mm(4), mm(8)),
        12,
      );
    }
  });
});
