import fc from 'fast-check';
import { degrees, mm, mpa, mpaSqrtMm } from '../../units/quantity';
import { noStress, type StressField } from '../stress-state';
import { residueAt } from '../testing/equilibrium';
import { nearTipStress } from './near-tip-field';
import { westergaardField } from './westergaard-field';
import { openingCoefficient, openingTerm, slidingTerm } from './williams-series';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const fieldOf =
  (term: typeof openingTerm, n: number): StressField =>
  (x, y, into) =>
    Object.assign(into, term(n, Math.hypot(x, y), Math.atan2(y, x)));

describe('the terms around a crack tip', () => {
  it.each([1, 2, 3, 4, 5, 8])('number %d is in equilibrium with free faces, both modes', (n) => {
    for (const term of [openingTerm, slidingTerm]) {
      const residue = residueAt(fieldOf(term, n), 0.7, 0.6, 1e-3);
      expect(residue.alongX).toBeCloseTo(0, 6);
      expect(residue.alongY).toBeCloseTo(0, 6);
      expect(residue.laplacian).toBeCloseTo(0, 3);
      for (const face of [Math.PI, -Math.PI]) {
        expect(term(n, 0.8, face).yy).toBeCloseTo(0, 12);
        expect(term(n, 0.8, face).xy).toBeCloseTo(0, 12);
      }
    }
  });

  it('begin with the near-tip field', () => {
    fc.assert(
      fc.property(between(0.01, 3), between(-179, 179), (r, theta) => {
        const load = { opening: mpaSqrtMm(2), sliding: mpaSqrtMm(3), along: mpa(5) };
        const near = nearTipStress(load, mm(r), degrees(theta));
        const angle = (theta * Math.PI) / 180;
        const root = Math.sqrt(2 * Math.PI);
        for (const part of ['xx', 'yy', 'xy'] as const) {
          const sum =
            (2 / root) * openingTerm(1, r, angle)[part] -
            (3 / root) * slidingTerm(1, r, angle)[part] +
            (5 / 4) * openingTerm(2, r, angle)[part];
          expect(sum).toBeCloseTo(near[part], 9);
        }
      }),
    );
  });
});

describe('the series of a crack in a wide plate', () => {
  const crack = { halfLength: mm(2), stress: mpa(100), ratio: 0.3 };

  it('has K, T and no other even term', () => {
    expect(openingCoefficient(crack, 1) * Math.sqrt(2 * Math.PI)).toBeCloseTo(
      100 * Math.sqrt(2 * Math.PI),
      9,
    );
    expect(4 * openingCoefficient(crack, 2)).toBeCloseTo(-70, 12);
    expect(openingCoefficient(crack, 4)).toBe(0);
  });

  it('converges to the exact field within the crack’s own length', () => {
    fc.assert(
      fc.property(between(0.01, 1), between(-3.1, 3.1), (r, theta) => {
        const exact = westergaardField(crack)(
          2 + r * Math.cos(theta),
          r * Math.sin(theta),
          noStress(),
        );
        const sum = noStress();
        for (let n = 1; n <= 40; n++) {
          const factor = openingCoefficient(crack, n);
          const term = openingTerm(n, r, theta);
          sum.xx += factor * term.xx;
          sum.yy += factor * term.yy;
          sum.xy += factor * term.xy;
        }
        for (const part of ['xx', 'yy', 'xy'] as const)
          expect(sum[part]).toBeCloseTo(exact[part], 5);
      }),
    );
  });
});
