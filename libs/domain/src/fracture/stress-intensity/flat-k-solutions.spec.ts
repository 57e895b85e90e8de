import fc from 'fast-check';
import { insideLimits } from '../../geometry/limit';
import { degrees } from '../../units/quantity';
import { crackOf, influenceOf, kOf, type CrackSymbols } from '../../verification/crack-of';
import { FLAT_K_SOLUTIONS } from './flat-k-solutions';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** A wall about a crack, as ratios. */
const shapes = fc.record({
  aspect: between(0.2, 2),
  depth: between(0.02, 0.9),
  across: between(0.02, 0.45),
  hole: between(0.25, 2),
  angle: between(0, 90),
});
type Shape = typeof shapes extends fc.Arbitrary<infer S> ? S : never;

const isInside = (key: string) => key.endsWith('embedded') || key.endsWith('penny');

/** The crack of a shape; embedded flaws and those in a bar stand in the middle of the wall. */
function crackIn(key: string, { aspect, depth, across, hole }: Shape, size = 1): CrackSymbols {
  const inside = isInside(key);
  const [a, c] = [size, size / aspect];
  const t = (inside ? 2 * a : a) / depth;
  const r = key.startsWith('hole') ? hole * t : 0;
  return { a, c, t, r, p: inside ? t / 2 - a : 0, W: (Math.max(a, c) + r) / across };
}

const limitsOf = (key: string) => FLAT_K_SOLUTIONS.find((s) => s.key === key)?.limits ?? [];
const within = (key: string, crack: CrackSymbols) => insideLimits(limitsOf(key), crackOf(crack));

describe.each(FLAT_K_SOLUTIONS.map((solution) => [solution.key, solution] as const))(
  'K of %s',
  (key, solution) => {
    const shaped = shapes.filter((shape) => within(key, crackIn(key, shape)));

    it('says what it is, whose, how good and between which limits', () => {
      for (const text of [solution.title, solution.source, solution.formula, solution.accuracy])
        expect(text.length).toBeGreaterThan(10);
      expect(solution.limits.length).toBeGreaterThan(0);
      for (const limit of solution.limits) {
        expect(limit.text).not.toBe('');
        expect(limit.source).not.toBe('');
        expect(limit.input).toMatch(/^(flaw|wall)\.\w+Mm$/);
        expect(limit.instead.length).toBeGreaterThan(10);
        expect(limit.max).toBeGreaterThan(limit.min);
      }
    });

    it('is a number everywhere within its limits, and positive in tension', () => {
      fc.assert(
        fc.property(shaped, (shape) => {
          const crack = crackIn(key, shape);
          const { membrane, bending, reversedBending } = influenceOf(solution, crack, shape.angle);
          expect(membrane).toBeGreaterThan(0);
          expect(Number.isFinite(membrane + bending + reversedBending)).toBe(true);
          const higher = { quadratic: 0, cubic: 0, quartic: 0 };
          solution.higher?.(crackOf(crack), degrees(shape.angle), higher);
          expect(Object.values(higher).every(Number.isFinite)).toBe(true);
        }),
      );
    });

    it('stays a number outside its limits, for searches that step there', () => {
      fc.assert(
        fc.property(between(1, 60), between(1, 60), between(0, 90), (a, c, angle) => {
          // an embedded flaw never leaves the wall
          const crack = { a: isInside(key) ? a / 7 : a, c, t: 20, r: 10, p: 1, W: 50 };
          const { membrane, bending } = influenceOf(solution, crack, angle);
          expect(Number.isFinite(membrane) && Number.isFinite(bending)).toBe(true);
        }),
      );
    });

    it('scales with the stress', () => {
      fc.assert(
        fc.property(shaped, between(1, 400), (shape, stress) => {
          const k = (s: number) => kOf(solution, crackIn(key, shape), shape.angle, s, 0.3 * s);
          expect(k(2 * stress) / k(stress)).toBeCloseTo(2, 9);
        }),
      );
    });

    it('scales with the root of the size at fixed shape', () => {
      fc.assert(
        fc.property(shaped, between(0.1, 50), (shape, size) => {
          const k = (s: number) => influenceOf(solution, crackIn(key, shape, s), shape.angle);
          expect(k(4 * size).membrane / k(size).membrane).toBeCloseTo(2, 8);
          expect(k(4 * size).bending - 2 * k(size).bending).toBeCloseTo(0, 6);
        }),
      );
    });

    it('closes in compression', () => {
      fc.assert(
        fc.property(shaped, (shape) => {
          expect(kOf(solution, crackIn(key, shape), shape.angle, -100)).toBe(0);
        }),
      );
    });

    it('never gives bending more than tension of the same peak, seen from either face', () => {
      // on the ligament of a ring, bending rises with one power of the radius more than tension
      const share = (crack: CrackSymbols) =>
        key === 'bar-ring' ? 1.003 / (1 - (2 * crack.a) / (crack.t ?? Infinity)) : 1 + 1e-9;
      fc.assert(
        fc.property(shaped, (shape) => {
          const crack = crackIn(key, shape);
          const { membrane, bending, reversedBending } = influenceOf(solution, crack, shape.angle);
          const highest = membrane * share(crack);
          expect(Math.max(bending, reversedBending)).toBeLessThanOrEqual(highest);
        }),
      );
    });

    it('is not lower in a narrower plate', () => {
      fc.assert(
        fc.property(shaped, (shape) => {
          const crack = crackIn(key, shape);
          const wide = { ...crack, W: 1e7 };
          const k = (of: CrackSymbols) => influenceOf(solution, of, shape.angle).membrane;
          expect(k(crack)).toBeGreaterThanOrEqual(k(wide) * 0.998);
          expect(k({ ...crack, W: Infinity }) / k(wide)).toBeCloseTo(1, 4);
        }),
      );
    });

    it('rises as the whole flaw grows in the same wall', () => {
      fc.assert(
        fc.property(shaped, (shape) => {
          const crack = crackIn(key, shape);
          const grown = { ...crack, a: 1.02 * crack.a, c: 1.02 * crack.c };
          const placed = { ...grown, p: Math.max((crack.p ?? 0) - 0.02 * crack.a, 0) };
          fc.pre(within(key, placed));
          const k = (of: CrackSymbols) => influenceOf(solution, of, 90).membrane;
          expect(k(placed)).toBeGreaterThan(k(crack) * (key.startsWith('hole') ? 0.99 : 1));
        }),
      );
    });
  },
);

describe('the list of flat solutions', () => {
  it('has no key twice', () => {
    const keys = FLAT_K_SOLUTIONS.map(({ key }) => key);
    expect(new Set(keys).size).toBe(keys.length);
  });

  it.each(['hole-through', 'hole-corner', 'hole-surface'])(
    '%s: one crack is never worse than two',
    (kind) => {
      const solution = (sides: string) =>
        FLAT_K_SOLUTIONS.find(({ key }) => key === `${kind}-${sides}`);
      const [one, two] = [solution('one'), solution('two')];
      if (!one || !two) throw new Error(`no pair for ${kind}`);
      fc.assert(
        fc.property(
          shapes.filter((shape) => within(two.key, crackIn(two.key, shape))),
          (shape) => {
            const crack = crackIn(two.key, shape);
            const [single, double] = [one, two].map(
              (s) => influenceOf(s, crack, shape.angle).membrane,
            );
            expect(single).toBeLessThanOrEqual((double ?? 0) * 1.0025);
          },
        ),
      );
    },
  );
});
