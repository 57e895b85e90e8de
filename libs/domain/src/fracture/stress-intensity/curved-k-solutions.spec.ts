import fc from 'fast-check';
import { insideLimits } from '../../geometry/limit';
import { degrees } from '../../units/quantity';
import { crackOf, influenceOf, kOf, type CrackSymbols } from '../../verification/crack-of';
import { CURVED_K_SOLUTIONS } from './curved-k-solutions';
import { PLATE_EMBEDDED_K } from './plate-embedded-k';
import { PLATE_EXTENDED_SURFACE_K } from './plate-extended-surface-k';
import { PLATE_SURFACE_K } from './plate-surface-k';
import { PLATE_THROUGH_WALL_K } from './plate-through-wall-k';
import type { HigherInfluence, StressIntensitySolution } from './solution';
import { kOfTerms, profileOf, termsOf } from './stress-terms';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** A wall about a crack, as ratios. */
const shapes = fc.record({
  aspect: between(0.2, 2),
  depth: between(0.05, 0.8),
  wall: between(1, 60),
  angle: between(0, 90),
});
type Shape = typeof shapes extends fc.Arbitrary<infer S> ? S : never;

const isEmbedded = (key: string) => key.endsWith('embedded');

/** The crack of a shape; embedded flaws stand in the middle of the wall. */
function crackIn(key: string, { aspect, depth, wall }: Shape, size = 1): CrackSymbols {
  const t = (isEmbedded(key) ? 2 * size : size) / depth;
  const p = isEmbedded(key) ? t / 2 - size : 0;
  return { a: size, c: size / aspect, t, p, Ri: wall * t };
}

/** The flat wall a solution must come to as the radius grows. */
function plateOf({ key, front }: StressIntensitySolution): StressIntensitySolution {
  if (isEmbedded(key)) return PLATE_EMBEDDED_K;
  if (front === 'through') return PLATE_THROUGH_WALL_K;
  return front === 'straight' ? PLATE_EXTENDED_SURFACE_K : PLATE_SURFACE_K;
}

function kOfPolynomial(
  solution: StressIntensitySolution,
  symbols: CrackSymbols,
  angle: number,
  powers: readonly number[],
): number {
  const higher: HigherInfluence = { quadratic: 0, cubic: 0, quartic: 0 };
  solution.higher?.(crackOf(symbols), degrees(angle), higher);
  return kOfTerms(influenceOf(solution, symbols, angle), higher, termsOf(powers));
}

describe.each(CURVED_K_SOLUTIONS.map((solution) => [solution.key, solution] as const))(
  'K of %s',
  (key, solution) => {
    const shaped = shapes.filter((shape) =>
      insideLimits(solution.limits, crackOf(crackIn(key, shape))),
    );

    it('says what it is, whose, how good and between which limits', () => {
      for (const text of [solution.title, solution.source, solution.formula, solution.accuracy])
        expect(text.length).toBeGreaterThan(10);
      expect(solution.limits.length).toBeGreaterThan(1);
      for (const limit of solution.limits) {
        expect(limit.source).not.toBe('');
        expect(limit.input).toMatch(/^(flaw|wall)\.\w+Mm$/);
        expect(limit.instead.length).toBeGreaterThan(10);
        expect(limit.max).toBeGreaterThan(limit.min);
      }
    });

    it('scales with the stress and with the root of the size at fixed shape', () => {
      fc.assert(
        fc.property(shaped, between(1, 400), between(0.1, 50), (shape, stress, size) => {
          const k = (s: number, of = 1) =>
            kOf(solution, crackIn(key, shape, of), shape.angle, s, 0.3 * s);
          expect(k(2 * stress) / k(stress)).toBeCloseTo(2, 9);
          expect(k(stress, 4 * size) / k(stress, size)).toBeCloseTo(2, 6);
        }),
      );
    });

    it('is positive in tension, closed in compression, a number in bending', () => {
      fc.assert(
        fc.property(shaped, (shape) => {
          const crack = crackIn(key, shape);
          const { membrane, bending, reversedBending } = influenceOf(solution, crack, shape.angle);
          expect(membrane).toBeGreaterThan(0);
          expect(Number.isFinite(bending + reversedBending)).toBe(true);
          expect(bending).toBeLessThanOrEqual(membrane * (1 + 1e-9));
          expect(kOf(solution, crack, shape.angle, -100)).toBe(0);
        }),
      );
    });

    it('stays a number outside its limits, for searches that step there', () => {
      fc.assert(
        fc.property(between(0.5, 60), between(1, 400), between(0.2, 30), (a, c, wall) => {
          const depth = isEmbedded(key) ? a / 8 : a;
          const crack = { a: depth, c, t: 20, p: isEmbedded(key) ? 1 : 0, Ri: 20 * wall };
          const { membrane, bending } = influenceOf(solution, crack, 90);
          expect(Number.isFinite(membrane) && Number.isFinite(bending)).toBe(true);
        }),
      );
    });

    it('is the plate in the limit of a large radius', () => {
      const flat = plateOf(solution);
      fc.assert(
        fc.property(shaped, (shape) => {
          const crack = { ...crackIn(key, shape), Ri: 1e13 };
          const own = influenceOf(solution, crack, shape.angle);
          const plate = influenceOf(flat, crack, shape.angle);
          expect(own.membrane / plate.membrane).toBeCloseTo(1, 3);
          expect(own.bending - plate.bending).toBeCloseTo(0, 2);
        }),
      );
    });

    it('does not jump where the shape passes a/c = 1', () => {
      fc.assert(
        fc.property(shaped, (shape) => {
          const k = (aspect: number) =>
            influenceOf(solution, crackIn(key, { ...shape, aspect }), shape.angle).membrane;
          expect(Math.abs(k(1 + 1e-9) / k(1 - 1e-9) - 1)).toBeLessThan(0.01);
        }),
      );
    });

    it('writes into what it is given', () => {
      const into = { membrane: 0, bending: 0, reversedBending: 0 };
      solution.influence(crackOf({ a: 2, c: 5, t: 20, p: 8, Ri: 200 }), degrees(45), into);
      expect(Object.keys(into)).toHaveLength(3);
      expect(into.membrane).toBeGreaterThan(0);
    });
  },
);

const WITH_TERMS = [...CURVED_K_SOLUTIONS, PLATE_SURFACE_K].filter(({ higher }) => higher);

describe.each(WITH_TERMS.map((solution) => [solution.key, solution] as const))(
  'a stress polynomial on %s',
  (key, solution) => {
    const powers = fc.tuple(...[0, 1, 2, 3, 4].map(() => between(0, 80)));
    const held = shapes.filter((shape) =>
      insideLimits(solution.limits, crackOf(crackIn(key, shape))),
    );

    it('gives the sum of what its terms give', () => {
      fc.assert(
        fc.property(held, powers, (shape, all) => {
          const crack = crackIn(key, shape);
          const k = (profile: readonly number[]) =>
            kOfPolynomial(solution, crack, shape.angle, profile);
          const apart = all.map((value, n) => k(all.map((_, m) => (m === n ? value : 0))));
          const sum = apart.reduce((total, part) => total + part, 0);
          expect(Math.abs(k(all) - sum)).toBeLessThan(1e-9 * (1 + sum));
        }),
      );
    });

    it('is membrane and bending when it is straight', () => {
      fc.assert(
        fc.property(held, between(50, 200), between(0, 50), (shape, membrane, bending) => {
          const crack = crackIn(key, shape);
          const profile = profileOf({ membrane, bending, quadratic: 0, cubic: 0, quartic: 0 });
          expect(kOfPolynomial(solution, crack, shape.angle, profile)).toBeCloseTo(
            kOf(solution, crack, shape.angle, membrane, bending),
            6,
          );
        }),
      );
    });
  },
);

describe('the list of curved solutions', () => {
  it('has no key twice', () => {
    const keys = CURVED_K_SOLUTIONS.map(({ key }) => key);
    expect(new Set(keys).size).toBe(keys.length);
    expect(keys.every((key) => /^(cylinder|sphere)-/.test(key))).toBe(true);
  });
});
