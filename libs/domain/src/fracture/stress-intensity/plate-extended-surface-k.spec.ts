import fc from 'fast-check';
import { crackOf, influenceOf, kOf } from '../../verification/crack-of';
import { degrees } from '../../units/quantity';
import { edgeBendingFactor } from './edge-crack';
import { heldStripBending, heldStripFactor, shellRestraint } from './held-strip';
import {
  PLATE_EXTENDED_SURFACE_HELD_K,
  PLATE_EXTENDED_SURFACE_K,
} from './plate-extended-surface-k';
import { PLATE_EDGE_K } from './plate-edge-k';
import { PLATE_SURFACE_K } from './plate-surface-k';
import type { StressIntensitySolution } from './solution';
import { kOfTerms, termsOf } from './stress-terms';
import { stripCoefficient } from './strip-coefficient';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const DEGREES = [0, 1, 2, 3, 4] as const;
const k = (solution: StressIntensitySolution, alpha: number, Ri = Infinity) =>
  influenceOf(solution, { a: 1, c: 1e6, t: 1 / alpha, Ri: Ri / alpha }, 90);

/** K of a polynomial Σ sₙ (x/t)ⁿ. */
function kOfProfile(solution: StressIntensitySolution, alpha: number, profile: number[]): number {
  const crack = { a: 1, c: 1e6, t: 1 / alpha };
  const higher = { quadratic: 0, cubic: 0, quartic: 0 };
  solution.higher?.(crackOf(crack), degrees(90), higher);
  return kOfTerms(influenceOf(solution, crack, 90), higher, termsOf(profile));
}

describe('a strip held against bending', () => {
  it('becomes the free strip when nothing near holds it', () => {
    fc.assert(
      fc.property(between(0.02, 0.85), (alpha) => {
        for (const n of DEGREES)
          expect(heldStripFactor(n, alpha, 1e12)).toBeCloseTo(
            alpha ** n * stripCoefficient(n, alpha),
            8,
          );
        expect(heldStripBending(alpha, 1e12)).toBeCloseTo(edgeBendingFactor(alpha), 8);
      }),
    );
  });

  it('sheds all bending and keeps what is left of tension when held hard', () => {
    fc.assert(
      fc.property(between(0.3, 0.85), (alpha) => {
        expect(heldStripBending(alpha, 1e-9)).toBeCloseTo(0, 8);
        expect(heldStripFactor(0, alpha, 0)).toBeGreaterThan(0);
      }),
    );
  });

  it('is relieved by every stiffening, in every term', () => {
    fc.assert(
      fc.property(between(0.1, 0.85), between(1, 40), (alpha, restraint) => {
        for (const n of DEGREES)
          expect(heldStripFactor(n, alpha, restraint)).toBeLessThan(
            heldStripFactor(n, alpha, restraint + 1),
          );
        expect(heldStripBending(alpha, restraint)).toBeLessThan(
          heldStripBending(alpha, restraint + 1),
        );
      }),
    );
  });

  it('takes bending far away and the same stress on the faces alike, within the fit of bending', () => {
    // the bending 1 − 2x/t, taken as face stress, is G0 − 2 G1 less the same moment
    fc.assert(
      fc.property(between(0.1, 0.8), between(2, 30), (alpha, restraint) => {
        const faces =
          heldStripFactor(0, alpha, restraint) - 2 * heldStripFactor(1, alpha, restraint);
        expect(faces / heldStripBending(alpha, restraint)).toBeCloseTo(1, 2);
      }),
    );
  });

  it('is held less by a thinner shell', () => {
    expect(shellRestraint(100)).toBeGreaterThan(shellRestraint(10));
    expect(shellRestraint(10) / Math.sqrt(10.5)).toBeCloseTo(1.556, 3);
  });
});

describe('the surface flaw without end', () => {
  it('is an edge crack over the thickness when free', () => {
    const free = k(PLATE_EXTENDED_SURFACE_K, 0.4);
    const edge = influenceOf(PLATE_EDGE_K, { a: 1, c: 1, W: 2.5 }, 90);
    expect(free.membrane).toBeCloseTo(edge.membrane, 12);
    expect(free.bending).toBeCloseTo(edge.bending, 12);
  });

  it('is never worse held than free', () => {
    fc.assert(
      fc.property(between(0.01, 0.8), between(10, 1000), (alpha, Ri) => {
        const [held, free] = [
          k(PLATE_EXTENDED_SURFACE_HELD_K, alpha, Ri),
          k(PLATE_EXTENDED_SURFACE_K, alpha),
        ];
        expect(held.membrane).toBeLessThanOrEqual(free.membrane);
        expect(held.bending).toBeLessThanOrEqual(free.bending);
      }),
    );
  });

  it('becomes free as the cylinder becomes a plate', () => {
    const held = k(PLATE_EXTENDED_SURFACE_HELD_K, 0.6, 1e12);
    expect(held.membrane / k(PLATE_EXTENDED_SURFACE_K, 0.6).membrane).toBeCloseTo(1, 4);
  });

  it('counts a wall without radius as that of a cylinder of Ri/t = 100', () => {
    const held = k(PLATE_EXTENDED_SURFACE_HELD_K, 0.5).membrane;
    expect(held).toBeCloseTo(k(PLATE_EXTENDED_SURFACE_HELD_K, 0.5, 100).membrane, 12);
  });

  it.each([PLATE_EXTENDED_SURFACE_K, PLATE_EXTENDED_SURFACE_HELD_K])(
    '$key: is a half plane when shallow, and the end of the semi-ellipse there',
    (solution) => {
      const shallow = k(solution, 1e-4).membrane / Math.sqrt(Math.PI);
      expect(shallow).toBeCloseTo(1.12152, 3);
      const ellipse = kOf(PLATE_SURFACE_K, { a: 1, c: 900, t: 1e4 }, 90, 1) / Math.sqrt(Math.PI);
      expect(Math.abs(ellipse / shallow - 1)).toBeLessThan(0.01);
    },
  );

  it.each([PLATE_EXTENDED_SURFACE_K, PLATE_EXTENDED_SURFACE_HELD_K])(
    '$key: adds the terms of a polynomial',
    (solution) => {
      fc.assert(
        fc.property(between(0.05, 0.7), (alpha) => {
          const single = [0, 1, 2, 3, 4].map((n) =>
            kOfProfile(
              solution,
              alpha,
              [0, 0, 0, 0, 0].map((_, i) => (i === n ? 50 : 0)),
            ),
          );
          expect(kOfProfile(solution, alpha, [50, 50, 50, 50, 50])).toBeCloseTo(
            single.reduce((sum, part) => sum + part, 0),
            8,
          );
        }),
      );
    },
  );

  it('rises with depth', () => {
    fc.assert(
      fc.property(between(0.05, 0.77), (alpha) => {
        const at = (depth: number) =>
          influenceOf(PLATE_EXTENDED_SURFACE_HELD_K, { a: 10 * depth, c: 1e5, t: 10 }, 90).membrane;
        expect(at(alpha + 0.02)).toBeGreaterThan(at(alpha));
      }),
    );
  });
});
