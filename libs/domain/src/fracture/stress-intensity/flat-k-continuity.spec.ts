import fc from 'fast-check';
import { influenceOf, type CrackSymbols } from '../../verification/crack-of';
import { HOLE_CORNER_TWO_K } from './hole-corner-k';
import { HOLE_THROUGH_TWO_K } from './hole-through-k';
import { PLATE_CORNER_K } from './plate-corner-k';
import { PLATE_EDGE_K } from './plate-edge-k';
import {
  PLATE_EXTENDED_SURFACE_HELD_K,
  PLATE_EXTENDED_SURFACE_K,
} from './plate-extended-surface-k';
import { PLATE_SURFACE_K } from './plate-surface-k';
import { PLATE_THROUGH_WALL_K } from './plate-through-wall-k';
import type { StressIntensitySolution } from './solution';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const tension = (solution: StressIntensitySolution, crack: CrackSymbols, angle: number) =>
  influenceOf(solution, crack, angle).membrane;

// what a flaw becomes as it grows: the next solution may not lie far off
describe('from one solution to the next', () => {
  it('a long surface flaw nears the one without end, and stays below the free strip', () => {
    fc.assert(
      fc.property(between(0.05, 0.35), (depth) => {
        const crack = { a: 1, c: 10, t: 1 / depth };
        const long = tension(PLATE_SURFACE_K, crack, 90);
        expect(long).toBeLessThan(1.03 * tension(PLATE_EXTENDED_SURFACE_K, crack, 90));
        expect(long).toBeGreaterThan(0.7 * tension(PLATE_EXTENDED_SURFACE_K, crack, 90));
      }),
    );
  });

  it('the same nears the held strip better than the free one when deep', () => {
    const off = (solution: StressIntensitySolution, depth: number) => {
      const crack = { a: 1, c: 10, t: 1 / depth };
      return Math.abs(tension(PLATE_SURFACE_K, crack, 90) / tension(solution, crack, 90) - 1);
    };
    for (const depth of [0.4, 0.5, 0.6, 0.7])
      expect(off(PLATE_EXTENDED_SURFACE_HELD_K, depth)).toBeLessThan(
        off(PLATE_EXTENDED_SURFACE_K, depth),
      );
  });

  it('a corner flaw that meets the other face is an edge crack that is not lower', () => {
    fc.assert(
      fc.property(between(0.6, 1.6), (aspect) => {
        const crack = { a: 8, c: 8 / aspect, t: 10, W: 200 };
        const corner = tension(PLATE_CORNER_K, crack, 5);
        const edge = tension(PLATE_EDGE_K, { ...crack, a: crack.c }, 90);
        expect(edge).toBeGreaterThan(corner);
      }),
    );
  });

  it('a deep corner flaw at a hole is not above the crack through the wall', () => {
    fc.assert(
      fc.property(between(0.8, 2), between(0.5, 2), (aspect, hole) => {
        const crack = { a: 8, c: 8 / aspect, t: 10, r: 10 * hole };
        const corner = tension(HOLE_CORNER_TWO_K, crack, 5);
        expect(tension(HOLE_THROUGH_TWO_K, crack, 0)).toBeGreaterThan(0.9 * corner);
      }),
    );
  });

  it('a deep surface flaw has ends below those of the crack through the wall', () => {
    fc.assert(
      fc.property(between(0.3, 1), (aspect) => {
        const crack = { a: 8, c: 8 / aspect, t: 10 };
        expect(tension(PLATE_SURFACE_K, crack, 0)).toBeLessThan(
          1.05 * tension(PLATE_THROUGH_WALL_K, crack, 0),
        );
      }),
    );
  });
});
