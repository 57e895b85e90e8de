import fc from 'fast-check';
import { degrees } from '../../units/quantity';
import { influenceOf, kOf, type CrackSymbols } from '../../verification/crack-of';
import { HOLE_CORNER_ONE_K, HOLE_CORNER_TWO_K, holeBendingShare } from './hole-corner-k';
import { HOLE_SURFACE_ONE_K, HOLE_SURFACE_TWO_K } from './hole-surface-k';
import { bendingShare, riseTowardsFace, surfacePolynomial } from './newman-raju-1984';
import { cornerFactor, PLATE_CORNER_K } from './plate-corner-k';
import { PLATE_EMBEDDED_K } from './plate-embedded-k';
import { PLATE_SURFACE_K } from './plate-surface-k';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const angles = between(0, 90);
const depths = between(0.05, 0.8);

/** A solution just on both sides of a/c = 1, as a ratio. */
function acrossRound(solution: typeof PLATE_CORNER_K, depth: number, angle: number): number {
  const at = (c: number) =>
    kOf(solution, { a: 1, c, t: 1 / depth, r: 1 / depth, p: 0.5 / depth - 1 }, angle, 1);
  return at(1 - 1e-9) / at(1 + 1e-9);
}

describe('the corner flaw in a plate', () => {
  it('is above the surface flaw of the same size: two faces are free', () => {
    fc.assert(
      fc.property(depths, between(0.3, 1), (depth, aspect) => {
        const crack = { a: 1, c: 1 / aspect, t: 1 / depth };
        const corner = kOf(PLATE_CORNER_K, crack, 80, 1);
        expect(corner).toBeGreaterThan(0.97 * kOf(PLATE_SURFACE_K, crack, 80, 1));
      }),
    );
  });

  it('is even for a small quarter circle: both ends are alike', () => {
    const crack = { a: 1, c: 1, t: 1e6 };
    fc.assert(
      fc.property(angles, (angle) => {
        const k = kOf(PLATE_CORNER_K, crack, angle, 1);
        expect(k / kOf(PLATE_CORNER_K, crack, 90 - angle, 1)).toBeCloseTo(1, 6);
      }),
    );
    expect(cornerFactor(1, 1, 1e9, degrees(45))).toBeCloseTo(1.05 * 1.002, 2);
  });

  it('meets its other branch at a/c = 1 within 2 %', () => {
    fc.assert(
      fc.property(depths, angles, (depth, angle) => {
        expect(Math.abs(acrossRound(PLATE_CORNER_K, depth, angle) - 1)).toBeLessThan(0.02);
      }),
    );
  });

  it('feels bending as tension when shallow', () => {
    const { membrane, bending } = influenceOf(PLATE_CORNER_K, { a: 1, c: 2, t: 1e6 }, 90);
    expect(bending / membrane).toBeCloseTo(1, 5);
  });
});

describe.each([
  ['corner', HOLE_CORNER_ONE_K, HOLE_CORNER_TWO_K, 0.04],
  ['bore', HOLE_SURFACE_ONE_K, HOLE_SURFACE_TWO_K, 0.001],
] as const)('the flaw at a hole, %s', (_, one, two, join) => {
  const crack = (depth: number, aspect: number, hole: number): CrackSymbols => ({
    a: 1,
    c: 1 / aspect,
    t: 1 / depth,
    r: hole / depth,
  });

  it('is alone hardly better when small, and clearly better when large', () => {
    const ratio = (depth: number) =>
      kOf(one, crack(depth, 0.5, 0.5), 45, 1) / kOf(two, crack(depth, 0.5, 0.5), 45, 1);
    expect(ratio(0.02)).toBeGreaterThan(0.98);
    expect(ratio(0.4)).toBeLessThan(ratio(0.02));
  });

  it('is worse the smaller it is against the hole: the peak is three times the stress', () => {
    fc.assert(
      fc.property(between(0.1, 0.38), between(0.3, 1.8), angles, (depth, aspect, angle) => {
        const k = (hole: number) => kOf(two, crack(depth, aspect, hole), angle, 1);
        expect(k(2)).toBeGreaterThan(k(0.5));
      }),
    );
  });

  it('is well above the same flaw without a hole at the bore, below the peak times it', () => {
    fc.assert(
      fc.property(between(0.05, 0.35), between(0.3, 1), (depth, aspect) => {
        const plain = kOf(PLATE_SURFACE_K, crack(depth, aspect, 0), 90, 1);
        const k = kOf(two, crack(depth, aspect, 1), 90, 1);
        expect(k).toBeGreaterThan(1.3 * plain);
        expect(k).toBeLessThan(3.4 * plain);
      }),
    );
  });

  it('meets its other branch at a/c = 1', () => {
    fc.assert(
      fc.property(between(0.05, 0.38), angles, (depth, angle) => {
        expect(Math.abs(acrossRound(two, depth, angle) - 1)).toBeLessThan(join);
      }),
    );
  });
});

describe('the flaw in the bore', () => {
  it('becomes the embedded flaw times the hole far from the faces', () => {
    // φ = 0, the end furthest from the hole: only the factor of the hole is left
    const crack = { a: 1, c: 1, t: 1e4, r: 1e4 };
    const embedded = kOf(PLATE_EMBEDDED_K, { ...crack, p: 5e3 - 1 }, 0, 1);
    expect(kOf(HOLE_SURFACE_TWO_K, crack, 0, 1) / embedded).toBeCloseTo(3.361 / 1.08, 2);
  });

  it('takes bending at its highest over the flaw, for either sign', () => {
    const { membrane, bending, reversedBending } = influenceOf(
      HOLE_SURFACE_ONE_K,
      { a: 2, c: 3, t: 10, r: 5, W: 100 },
      30,
    );
    expect(bending / membrane).toBeCloseTo(0.4, 12);
    expect(reversedBending).toBe(bending);
  });
});

describe('the shared parts of the equations', () => {
  it('start at 1.04 for a small round flaw, and at the half plane for a long one', () => {
    expect(surfacePolynomial(1, 1, 0)).toBeCloseTo(1.04, 12);
    expect(surfacePolynomial(1, 1e9, 0)).toBeCloseTo(1.13, 8);
    expect(Math.abs(surfacePolynomial(1, 1e9, 0) / 1.1215 - 1)).toBeLessThan(0.01);
  });

  it('do not raise K at the deepest point towards the face', () => {
    expect(riseTowardsFace(1, 2, 0.7, 1)).toBe(1);
    expect(riseTowardsFace(1, 2, 0.7, 0)).toBeCloseTo(1.1 + 0.35 * 0.49, 12);
  });

  it('take the whole of bending when shallow, less the deeper', () => {
    fc.assert(
      fc.property(between(0.2, 2), angles, between(0.05, 0.4), (aspect, angle, depth) => {
        const sine = Math.sin((angle * Math.PI) / 180);
        const c = 1 / aspect;
        expect(bendingShare(1, c, 1e-9, sine, 0.55)).toBeCloseTo(1, 7);
        expect(holeBendingShare(1, c, 1e-9, sine)).toBeCloseTo(1, 7);
        expect(bendingShare(1, c, depth, sine, 0.55)).toBeLessThan(1);
        expect(holeBendingShare(1, c, depth, sine)).toBeLessThan(1);
      }),
    );
  });

  it('join their branches of bending within 0.1', () => {
    fc.assert(
      fc.property(depths, angles, (depth, angle) => {
        const sine = Math.sin((angle * Math.PI) / 180);
        const gap = (share: (c: number) => number) => Math.abs(share(1 - 1e-9) - share(1 + 1e-9));
        expect(gap((c) => bendingShare(1, c, depth, sine, 0.64))).toBeLessThan(0.1);
        expect(gap((c) => holeBendingShare(1, c, depth, sine))).toBeLessThan(0.1);
      }),
    );
  });
});
