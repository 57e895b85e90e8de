import fc from 'fast-check';
import { EDGE_ROWS } from '../../verification/data/flat-elements';
import { influenceOf } from '../../verification/crack-of';
import {
  edgeBendingFactor,
  edgeBendingPolynomial,
  edgeBendingTada,
  edgeTensionPolynomial,
  edgeTensionTada,
  halfPlaneEdgeFactor,
} from './edge-crack';
import { PLATE_EDGE_K } from './plate-edge-k';
import { stripCoefficient } from './strip-coefficient';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** Largest relative deviation of a factor from the finite elements up to a depth. */
const worst = (factor: (alpha: number) => number, column: 1 | 2, to: number) =>
  Math.max(
    ...EDGE_ROWS.filter(([alpha]) => alpha <= to).map((row) =>
      Math.abs(factor(row[0]) / row[column] - 1),
    ),
  );

describe('the edge crack in a strip', () => {
  it('keeps the accuracy each form claims', () => {
    expect(worst(edgeTensionTada, 1, 0.8)).toBeLessThan(0.007);
    expect(worst(edgeTensionPolynomial, 1, 0.6)).toBeLessThan(0.005);
    expect(worst(edgeBendingPolynomial, 2, 0.6)).toBeLessThan(0.0045);
    expect(worst(edgeBendingTada, 2, 0.8)).toBeLessThan(0.025);
    expect(worst(edgeBendingFactor, 2, 0.8)).toBeLessThan(0.005);
  });

  it('shows that the polynomial falls short beyond its limit', () => {
    expect(edgeTensionPolynomial(0.8) / stripCoefficient(0, 0.8)).toBeLessThan(0.9);
  });

  it.each([edgeTensionTada, edgeTensionPolynomial, edgeBendingPolynomial, edgeBendingTada])(
    '%p starts at the half plane',
    (factor) => {
      expect(Math.abs(factor(0) / halfPlaneEdgeFactor() - 1)).toBeLessThan(0.001);
    },
  );

  it('takes less from a stress that rises later', () => {
    fc.assert(
      fc.property(between(0, 0.9), (alpha) => {
        for (const n of [0, 1, 2, 3] as const)
          expect(stripCoefficient(n, alpha)).toBeGreaterThan(
            stripCoefficient((n + 1) as 1 | 2 | 3 | 4, alpha),
          );
      }),
    );
  });

  it('rises with depth for every stress', () => {
    fc.assert(
      fc.property(between(0.02, 0.88), (alpha) => {
        for (const n of [0, 1, 2, 3, 4] as const)
          expect(stripCoefficient(n, alpha + 0.01)).toBeGreaterThan(stripCoefficient(n, alpha));
      }),
    );
  });

  it('is held beyond its range, so that searches meet a number', () => {
    expect(stripCoefficient(2, 1.4)).toBe(stripCoefficient(2, 0.9));
    expect(edgeBendingFactor(1.4)).toBe(edgeBendingFactor(0.9));
  });
});

describe('the crack through the edge of a plate', () => {
  it('is a half plane in a wide plate, bending then being as even as tension', () => {
    const { membrane, bending } = influenceOf(PLATE_EDGE_K, { a: 10, c: 10, t: 5 }, 90);
    expect(membrane / Math.sqrt(Math.PI * 10)).toBeCloseTo(1.12152, 9);
    expect(bending).toBe(membrane);
  });

  it('does not depend on the thickness', () => {
    const k = (t: number) => influenceOf(PLATE_EDGE_K, { a: 10, c: 10, t, W: 40 }, 90).membrane;
    expect(k(5)).toBe(k(50));
  });

  it('closes under bending that compresses its edge', () => {
    const { bending, reversedBending } = influenceOf(PLATE_EDGE_K, { a: 9, c: 9, W: 40 }, 90);
    expect(reversedBending).toBe(-bending);
    expect(bending).toBeGreaterThan(0);
  });
});
