import fc from 'fast-check';
import { influenceOf, kOf } from '../../verification/crack-of';
import { PLATE_EMBEDDED_K } from './plate-embedded-k';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** Eccentric through crack in a strip, near tip (Kanninen and Popelar): K/(σ√(πa)). */
function eccentric(lambda: number, offset: number): number {
  const x = 2 * offset * lambda;
  const held = x > 0 ? Math.sin(x) / x : 1;
  return Math.sqrt(held / Math.cos((Math.PI * lambda) / 2));
}

describe('the embedded flaw', () => {
  it('feels the nearer face, whichever it is measured to', () => {
    const k = (p: number) => kOf(PLATE_EMBEDDED_K, { a: 2, c: 6, t: 30, p }, 90, 100);
    expect(k(3)).toBeCloseTo(k(30 - 4 - 3), 9);
    expect(k(3)).toBeGreaterThan(k(13));
  });

  it('rises as it nears the face', () => {
    fc.assert(
      fc.property(between(1, 10), (p) => {
        const k = (ligament: number) =>
          kOf(PLATE_EMBEDDED_K, { a: 2, c: 6, t: 40, p: ligament }, 90, 100);
        expect(k(p)).toBeGreaterThan(k(p + 0.5));
      }),
    );
  });

  it('is never below the eccentric solution in two dimensions, off the centre', () => {
    // a long flaw against the strip: the symmetric form at the nearer face bounds the eccentric one
    fc.assert(
      fc.property(between(0.1, 0.6), between(0, 0.8), (lambda, offset) => {
        expect(Math.sqrt(1 / Math.cos((Math.PI * lambda) / 2))).toBeGreaterThanOrEqual(
          eccentric(lambda, offset),
        );
      }),
    );
  });

  it('takes bending at its highest over the flaw, for either sign', () => {
    const crack = { a: 2, c: 6, t: 20, p: 3 };
    const { membrane, bending, reversedBending } = influenceOf(PLATE_EMBEDDED_K, crack, 90);
    expect(bending / membrane).toBeCloseTo(1 - (2 * 3) / 20, 12);
    expect(reversedBending / membrane).toBeCloseTo((2 * 7) / 20 - 1, 12);
    expect(kOf(PLATE_EMBEDDED_K, crack, 90, 0, 100)).toBeCloseTo(70 * membrane, 9);
  });

  it('is bounded by uniform tension of the same peak', () => {
    fc.assert(
      fc.property(between(0.5, 3), between(0, 12), (a, p) => {
        const crack = { a, c: 8, t: 20, p };
        fc.pre(p + 2 * a < 20);
        expect(kOf(PLATE_EMBEDDED_K, crack, 90, 0, 100)).toBeLessThanOrEqual(
          kOf(PLATE_EMBEDDED_K, crack, 90, 100),
        );
      }),
    );
  });

  it('scales with the root of the size', () => {
    const k = (s: number) =>
      kOf(PLATE_EMBEDDED_K, { a: s, c: 3 * s, t: 20 * s, p: 4 * s }, 30, 100);
    expect(k(9) / k(1)).toBeCloseTo(3, 10);
  });

  it('stays a number with no ligament left', () => {
    const { membrane } = influenceOf(PLATE_EMBEDDED_K, { a: 5, c: 9, t: 20, p: 0 }, 0);
    expect(Number.isFinite(membrane)).toBe(true);
  });
});
