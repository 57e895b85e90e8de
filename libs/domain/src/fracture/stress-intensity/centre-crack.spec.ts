import fc from 'fast-check';
import { ECCENTRIC_ROWS } from '../../verification/data/flat-elements';
import { mm } from '../../units/quantity';
import { influenceOf, kOf } from '../../verification/crack-of';
import {
  centreCrackFactor,
  doubleEdgeFactor,
  doubleEdgeTada,
  eccentricCrackFactor,
  pointForceK,
  secantFactor,
} from './centre-crack';
import { PLATE_THROUGH_WALL_K } from './plate-through-wall-k';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('cracks through a strip', () => {
  it('have no edge effect when short', () => {
    expect(centreCrackFactor(0)).toBe(1);
    expect(secantFactor(0)).toBe(1);
    expect(eccentricCrackFactor(0, 0.5)).toBe(1);
    expect(doubleEdgeFactor(0)).toBe(1.12152);
    expect(doubleEdgeTada(0)).toBeCloseTo(1.122, 12);
  });

  it('agree with the secant alone as far as it claims', () => {
    fc.assert(
      fc.property(between(0, 0.7), (alpha) => {
        expect(Math.abs(secantFactor(alpha) / centreCrackFactor(alpha) - 1)).toBeLessThan(0.0035);
      }),
    );
  });

  it('rise with length', () => {
    fc.assert(
      fc.property(between(0, 0.85), (alpha) => {
        expect(centreCrackFactor(alpha + 0.02)).toBeGreaterThan(centreCrackFactor(alpha));
        const two = (x: number) => Math.sqrt(x) * doubleEdgeFactor(x);
        expect(two(alpha + 0.02)).toBeGreaterThan(two(alpha));
      }),
    );
  });

  it('become central without offset', () => {
    fc.assert(
      fc.property(between(0, 0.9), (lambda) => {
        expect(eccentricCrackFactor(lambda, 0)).toBe(secantFactor(lambda));
        expect(eccentricCrackFactor(lambda, 1e-9)).toBeCloseTo(secantFactor(lambda), 9);
      }),
    );
  });

  it('open the tip nearer the edge more than the other', () => {
    for (const [lambda, , other] of ECCENTRIC_ROWS)
      expect(eccentricCrackFactor(lambda, 0.5)).toBeGreaterThan(other);
  });

  it('agree in both forms for two edges within 1 %', () => {
    fc.assert(
      fc.property(between(0, 0.8), (alpha) => {
        expect(Math.abs(doubleEdgeTada(alpha) / doubleEdgeFactor(alpha) - 1)).toBeLessThan(0.01);
      }),
    );
  });
});

describe('forces on the faces of a crack', () => {
  it('open the nearer tip more, by the ratio of the distances', () => {
    fc.assert(
      fc.property(between(1, 50), between(0, 0.95), (a, share) => {
        const k = (x: number) => pointForceK(100, mm(a), mm(x));
        expect(k(share * a) / k(-share * a)).toBeCloseTo((1 + share) / (1 - share), 8);
      }),
    );
  });

  it('add up to uniform pressure', () => {
    const steps = 20_000;
    let sum = 0;
    for (let i = 0; i < steps; i++) {
      // x = a sin θ takes the singularity at the tip away
      const theta = Math.PI * ((i + 0.5) / steps - 0.5);
      sum += pointForceK(1, mm(4), mm(4 * Math.sin(theta))) * 4 * Math.cos(theta);
    }
    expect((sum * Math.PI) / steps).toBeCloseTo(Math.sqrt(Math.PI * 4), 6);
  });
});

describe('the crack through a plate', () => {
  it('counts bending as membrane of the face in tension, for either sign', () => {
    const crack = { a: 10, c: 20, t: 10, W: 200 };
    expect(kOf(PLATE_THROUGH_WALL_K, crack, 0, 0, 50)).toBe(
      kOf(PLATE_THROUGH_WALL_K, crack, 0, 50),
    );
    expect(kOf(PLATE_THROUGH_WALL_K, crack, 0, 0, -50)).toBe(
      kOf(PLATE_THROUGH_WALL_K, crack, 0, 50),
    );
  });

  it('is that of a wide plate far from the edges', () => {
    const { membrane } = influenceOf(PLATE_THROUGH_WALL_K, { a: 10, c: 20, t: 10, W: 1e6 }, 0);
    expect(membrane).toBeCloseTo(Math.sqrt(Math.PI * 20), 7);
  });
});
