import fc from 'fast-check';
import { degrees, mpa } from '../../units/quantity';
import { crackOf, influenceOf } from '../../verification/crack-of';
import { powerFactors } from '../../verification/curved-k-element-checks';
import {
  FULL_CIRCUMFERENCE_INSIDE,
  FULL_CIRCUMFERENCE_OUTSIDE,
  LONG_AXIAL_INSIDE,
  LONG_AXIAL_OUTSIDE,
} from '../../verification/data/long-crack-rows';
import { insideLimits } from '../../geometry/limit';
import { fullCircumferenceZahoor } from './circumferential-factors';
import {
  CYLINDER_AXIAL_EXTENDED_INSIDE_K,
  CYLINDER_AXIAL_EXTENDED_OUTSIDE_K,
  CYLINDER_CIRCUMFERENTIAL_FULL_INSIDE_K,
  CYLINDER_CIRCUMFERENTIAL_FULL_OUTSIDE_K,
} from './cylinder-long-k';
import { CYLINDER_CIRCUMFERENTIAL_OUTSIDE_K } from './cylinder-surface-k';
import { longCrackFactor, ringRestraint } from './long-crack';
import { AXIAL_INSIDE_FIT } from './long-crack-fit';
import { kOfTerms, linearTerms } from './stress-terms';
import { stripCoefficient, type FaceDegree } from './strip-coefficient';
import { pressureHoopTerms, termsOverDepth } from './wall-stress-terms';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const CASES = [
  [CYLINDER_AXIAL_EXTENDED_INSIDE_K, LONG_AXIAL_INSIDE],
  [CYLINDER_AXIAL_EXTENDED_OUTSIDE_K, LONG_AXIAL_OUTSIDE],
  [CYLINDER_CIRCUMFERENTIAL_FULL_INSIDE_K, FULL_CIRCUMFERENCE_INSIDE],
  [CYLINDER_CIRCUMFERENTIAL_FULL_OUTSIDE_K, FULL_CIRCUMFERENCE_OUTSIDE],
] as const;
const DEGREES: readonly FaceDegree[] = [0, 1, 2, 3, 4];

describe.each(CASES.map(([solution, rows]) => [solution.key, solution, rows] as const))(
  '%s',
  (key, solution, rows) => {
    it('meets every finite-element coefficient within 0.2 %', () => {
      expect(rows).toHaveLength(22);
      for (const [wall, depth, ...published] of rows) {
        const own = powerFactors(solution, { a: 1, c: 1, t: 1 / depth, Ri: wall / depth }, 90);
        for (const [n, value] of published.entries())
          expect(Math.abs((own[n] ?? 0) / value - 1)).toBeLessThan(0.002);
      }
    });

    it('is the strip free to bend when the wall is a plate', () => {
      fc.assert(
        fc.property(between(0.01, 0.8), (depth) => {
          const own = powerFactors(solution, { a: 1, c: 1, t: 1 / depth }, 90);
          for (const n of DEGREES) expect(own[n]).toBeCloseTo(stripCoefficient(n, depth), 8);
        }),
      );
    });

    it('comes to the plate without a jump as the radius grows', () => {
      const g0 = (Ri: number) => powerFactors(solution, { a: 4, c: 1, t: 10, Ri }, 90)[0] ?? 0;
      expect(g0(1e10) / g0(Infinity)).toBeCloseTo(1, 3);
      expect(Math.abs(g0(1e5) / g0(Infinity) - 1)).toBeLessThan(
        Math.abs(g0(1e3) / g0(Infinity) - 1),
      );
    });

    it('is the half plane when shallow, in any wall', () => {
      fc.assert(
        fc.property(between(1, 200), (wall) => {
          const own = powerFactors(solution, { a: 1e-5, c: 1, t: 1, Ri: wall }, 90);
          expect(own[0]).toBeCloseTo(1.1215, 3);
          expect(own[2]).toBeCloseTo(0.5246, 3);
        }),
      );
    });

    it('rises with depth, and does not jump between radii', () => {
      fc.assert(
        fc.property(between(1, 150), between(0.02, 0.79), (wall, depth) => {
          const g0 = (d: number, w: number) =>
            influenceOf(solution, { a: d, c: 1, t: 1, Ri: w }, 90).membrane;
          expect(g0(depth + 0.005, wall)).toBeGreaterThan(g0(depth, wall));
          expect(g0(depth, wall * 1.0001) / g0(depth, wall)).toBeCloseTo(1, 3);
        }),
      );
    });

    it('refuses a deeper flaw and a thicker wall than computed, by its limits', () => {
      const at = (a: number, Ri: number) =>
        insideLimits(solution.limits, crackOf({ a, c: 1, t: 10, Ri }));
      expect(at(8, 10)).toBe(true);
      expect(at(8.1, 10)).toBe(false);
      expect(at(8, 9.9)).toBe(false);
      expect(key).toMatch(/^cylinder-/);
    });
  },
);

describe('long cracks against other evidence', () => {
  it('leaves the strip as the ring gets stiff', () => {
    expect(ringRestraint(10)).toBeCloseTo((2 * Math.PI * 10.5) / 3, 12);
    const crack = (Ri: number) => crackOf({ a: 5, c: 1, t: 10, Ri });
    expect(longCrackFactor(0, crack(50), 'axial', AXIAL_INSIDE_FIT)).toBeLessThan(
      longCrackFactor(0, crack(500), 'axial', AXIAL_INSIDE_FIT),
    );
  });

  it('is within 8 % of Zahoor for a crack around the inside', () => {
    for (const [wall, depth] of [
      [5, 0.4],
      [10, 0.4],
      [10, 0.6],
      [20, 0.6],
    ] as const) {
      const { membrane } = influenceOf(
        CYLINDER_CIRCUMFERENTIAL_FULL_INSIDE_K,
        { a: depth, c: 1, t: 1, Ri: wall },
        90,
      );
      const own = membrane / Math.sqrt(Math.PI * depth);
      expect(Math.abs(own / fullCircumferenceZahoor(depth, wall) - 1)).toBeLessThan(0.08);
    }
  });

  it('stays below the plate bound that stands for finite outside flaws', () => {
    for (const [wall, depth, g0] of FULL_CIRCUMFERENCE_OUTSIDE) {
      if (wall < 5) continue;
      const symbols = { a: 1, c: 1000, t: 1 / depth, Ri: wall / depth };
      const bound = influenceOf(CYLINDER_CIRCUMFERENTIAL_OUTSIDE_K, symbols, 90).membrane;
      expect(bound / Math.sqrt(Math.PI)).toBeGreaterThan(0.975 * g0);
    }
  });
});

describe('the stress over the depth of a crack as terms', () => {
  const crack = crackOf({ a: 4, c: 9, t: 10 });

  it('gives back a stress of the fourth degree', () => {
    const terms = termsOverDepth((x) => 100 - 8 * x + 0.03 * x ** 4, crack);
    expect(terms.membrane).toBeCloseTo(60, 8);
    expect(terms.bending).toBeCloseTo(40, 8);
    expect(terms.quadratic).toBeCloseTo(0, 6);
    expect(terms.cubic).toBeCloseTo(0, 6);
    expect(terms.quartic).toBeCloseTo(300, 6);
  });

  it('puts the pressure on the faces of an inside crack only', () => {
    const wall = crackOf({ a: 4, c: 9, t: 10, Ri: 100 });
    const inside = pressureHoopTerms(mpa(10), wall, 'inside');
    const outside = pressureHoopTerms(mpa(10), wall, 'outside');
    // Lamé at the two faces
    expect(inside.membrane + inside.bending).toBeCloseTo(10 + 105.238095, 3);
    expect(outside.membrane + outside.bending).toBeCloseTo(95.238095, 3);
  });

  it('agrees with the linearised stress in a thin wall', () => {
    const thin = crackOf({ a: 4, c: 9, t: 10, Ri: 1000 });
    const k = (terms: Parameters<typeof kOfTerms>[2]) => {
      const linear = influenceOf(
        CYLINDER_AXIAL_EXTENDED_OUTSIDE_K,
        { a: 4, c: 9, t: 10, Ri: 1000 },
        90,
      );
      const higher = { quadratic: 0, cubic: 0, quartic: 0 };
      CYLINDER_AXIAL_EXTENDED_OUTSIDE_K.higher?.(thin, degrees(90), higher);
      return kOfTerms(linear, higher, terms);
    };
    const exact = k(pressureHoopTerms(mpa(1), thin, 'outside'));
    expect(exact / k(linearTerms(100, -0.4999))).toBeCloseTo(1, 3);
  });
});
