import fc from 'fast-check';
import { influenceOf, kOf } from '../../verification/crack-of';
import { BAR_ROWS } from '../../verification/data/flat-elements';
import { BAR_PENNY_K } from './bar-penny-k';
import { BAR_RING_K } from './bar-ring-k';
import { barPennyFactor, barRingBending, barRingFactor, barRingTada } from './round-bar';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('a ring crack around a bar', () => {
  it('is the edge crack of a half plane when shallow', () => {
    // K = 1.1215 σ √(π depth), for tension and for the outer fibre in bending alike
    const { membrane, bending } = influenceOf(BAR_RING_K, { a: 1e-4, c: 1, t: 20 }, 90);
    const root = Math.sqrt(Math.PI * 1e-4);
    expect(membrane / root).toBeCloseTo(1.1215, 3);
    expect(bending / root / 1.1215).toBeCloseTo(1, 2);
  });

  it('is the exact deep ring when little is left: one half, and three eighths', () => {
    expect(barRingFactor(0)).toBe(0.5);
    expect(barRingTada(0)).toBe(0.5);
    expect(barRingBending(0)).toBe(0.375);
  });

  it('has a handbook form that falls short by 2 to 3 % at most', () => {
    for (const [xi, ring] of BAR_ROWS) {
      expect(barRingTada(xi) / ring).toBeLessThan(1.001);
      expect(barRingTada(xi) / ring).toBeGreaterThan(0.965);
    }
  });

  it('rises with its depth in tension and bending', () => {
    fc.assert(
      fc.property(between(0.1, 7.8), (a) => {
        const at = (depth: number) => influenceOf(BAR_RING_K, { a: depth, c: 1, t: 20 }, 90);
        expect(at(a + 0.1).membrane).toBeGreaterThan(at(a).membrane);
        expect(at(a + 0.1).bending).toBeGreaterThan(at(a).bending);
      }),
    );
  });

  it('opens at one side or the other, whichever way the bar bends', () => {
    const crack = { a: 3, c: 1, t: 20 };
    expect(kOf(BAR_RING_K, crack, 90, 0, -50)).toBe(kOf(BAR_RING_K, crack, 90, 0, 50));
  });
});

describe('a flaw inside a bar', () => {
  it('is a penny crack when small', () => {
    expect(barPennyFactor(0)).toBeCloseTo(2 / Math.PI, 12);
    const { membrane } = influenceOf(BAR_PENNY_K, { a: 1, c: 1, t: 1e5, p: 5e4 - 1 }, 45);
    expect(membrane).toBeCloseTo(2 / Math.sqrt(Math.PI), 4);
  });

  it('counts as the circle around it', () => {
    const k = (a: number, c: number) => kOf(BAR_PENNY_K, { a, c, t: 40, p: 20 - a }, 90, 100);
    expect(k(2, 5)).toBeCloseTo(k(5, 5), 10);
    expect(k(5, 2)).toBeCloseTo(k(5, 5), 10);
  });

  it('is worse nearer the surface, whichever it is measured to', () => {
    fc.assert(
      fc.property(between(4, 12), (p) => {
        const k = (ligament: number) =>
          kOf(BAR_PENNY_K, { a: 3, c: 3, t: 40, p: ligament }, 90, 100);
        expect(k(p)).toBeGreaterThan(k(p + 1));
        expect(k(p)).toBeCloseTo(k(40 - 6 - p), 9);
      }),
    );
  });

  it('feels only the bending over its own extent', () => {
    const { membrane, bending, reversedBending } = influenceOf(
      BAR_PENNY_K,
      { a: 2, c: 2, t: 20, p: 8 },
      90,
    );
    expect(bending / membrane).toBeCloseTo(0.2, 12);
    expect(reversedBending).toBeCloseTo(bending, 12);
  });
});
