import fc from 'fast-check';
import { stripCoefficient } from '../stress-intensity/strip-coefficient';
import { bueckner, BUECKNER_DEPTH, HALF_PLANE_WEIGHTS } from './edge-weights';
import {
  deepestCoefficient,
  deepestPowerFactor,
  faceCoefficient,
  facePowerFactor,
} from './universal-factors';
import { centreKOfStress, faceKOfStress, tipKOfStress } from './weighted-stress';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const POWERS = [0, 1, 2, 3, 4] as const;
const COEFFICIENTS = [0, 1, 2, 3] as const;
const shapes = [between(0.3, 5), between(0.1, 0.8)] as const;

describe('the universal weight function', () => {
  it('gives back the two stresses it is made from, at either point', () => {
    fc.assert(
      fc.property(...shapes, (g0, share) => {
        const g1 = g0 * share;
        expect(deepestPowerFactor(0, g0, g1)).toBeCloseTo(g0, 10);
        expect(deepestPowerFactor(1, g0, g1)).toBeCloseTo(g1, 10);
        expect(facePowerFactor(0, g0, g1)).toBeCloseTo(g0, 9);
        expect(facePowerFactor(1, g0, g1)).toBeCloseTo(g1, 9);
      }),
    );
  });

  it('has closed forms that are its integral', () => {
    fc.assert(
      fc.property(...shapes, between(0.1, 40), (g0, share, a) => {
        const g1 = g0 * share;
        const root = Math.sqrt(Math.PI * a);
        const deep = COEFFICIENTS.map((i) => deepestCoefficient(i, g0, g1));
        const face = COEFFICIENTS.map((i) => faceCoefficient(i, g0, g1));
        for (const n of POWERS) {
          const stress = (x: number) => (x / a) ** n;
          expect(tipKOfStress(stress, a, deep) / root).toBeCloseTo(
            deepestPowerFactor(n, g0, g1),
            9,
          );
          expect(faceKOfStress(stress, a, face) / root).toBeCloseTo(facePowerFactor(n, g0, g1), 9);
        }
      }),
    );
  });

  it('reproduces the edge crack within 1.7 % from its first two coefficients, 2.1 % when shallow', () => {
    for (let alpha = 0.01; alpha < 0.81; alpha += 0.05) {
      const [g0, g1] = [stripCoefficient(0, alpha), stripCoefficient(1, alpha)];
      for (const n of [2, 3, 4] as const) {
        const off = deepestPowerFactor(n, g0, g1) / stripCoefficient(n, alpha) - 1;
        expect(Math.abs(off)).toBeLessThan(alpha < 0.1 ? 0.021 : 0.0171);
      }
    }
  });

  it('is linear in the stress and meets one of large gradient', () => {
    const m = COEFFICIENTS.map((i) => deepestCoefficient(i, 1.12152, 0.68148));
    const sharp = (x: number) => 200 * Math.exp(-3 * x);
    const k = (f: (x: number) => number) => tipKOfStress(f, 2, m);
    expect(k((x) => 2 * sharp(x) + 50)).toBeCloseTo(2 * k(sharp) + k(() => 50), 9);
    // more of the stress lies near the tip when it is turned round
    expect(k((x) => sharp(2 - x))).toBeGreaterThan(k(sharp));
  });
});

describe('weight functions of other cracks', () => {
  it('Bueckner: within 0.7 % of the strip to its limit, for uniform and linear stress', () => {
    for (let alpha = 0.05; alpha <= BUECKNER_DEPTH; alpha += 0.05) {
      for (const n of [0, 1] as const) {
        const own = tipKOfStress((x) => x ** n, 1, bueckner(alpha)) / Math.sqrt(Math.PI);
        expect(Math.abs(own / stripCoefficient(n, alpha) - 1)).toBeLessThan(0.0075);
      }
    }
  });

  it('Bueckner: is wrong beyond its limit', () => {
    const own = tipKOfStress(() => 1, 1, bueckner(0.8)) / Math.sqrt(Math.PI);
    expect(Math.abs(own / stripCoefficient(0, 0.8) - 1)).toBeGreaterThan(0.1);
  });

  it('half plane: the coefficients of a shallow edge crack', () => {
    for (const n of POWERS) {
      const own = tipKOfStress((x) => x ** n, 1, HALF_PLANE_WEIGHTS) / Math.sqrt(Math.PI);
      expect(own).toBeCloseTo(stripCoefficient(n, 0), 2);
    }
    const uniform = tipKOfStress(() => 1, 1, HALF_PLANE_WEIGHTS) / Math.sqrt(Math.PI);
    expect(Math.abs(uniform / 1.1215222552 - 1)).toBeLessThan(0.0011);
  });

  it('centre crack: exact for uniform, linear and square pressure', () => {
    fc.assert(
      fc.property(between(0.1, 100), (a) => {
        const root = Math.sqrt(Math.PI * a);
        expect(centreKOfStress(() => 7, a) / root).toBeCloseTo(7, 10);
        expect(centreKOfStress((x) => x / a, a) / root).toBeCloseTo(2 / Math.PI, 10);
        expect(centreKOfStress((x) => (x / a) ** 2, a) / root).toBeCloseTo(0.5, 10);
      }),
    );
  });
});
