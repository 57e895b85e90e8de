import fc from 'fast-check';
import { degrees, mm, mpa } from '../../units/quantity';
import { influenceOf } from '../../verification/crack-of';
import { ellipseK, pennyK, pennyProfileK } from './embedded-crack';
import { PLATE_EMBEDDED_K } from './plate-embedded-k';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('cracks in an infinite body', () => {
  it('make the ellipse a circle', () => {
    fc.assert(
      fc.property(between(0.5, 50), between(0, 90), (a, angle) => {
        expect(ellipseK(mpa(100), mm(a), mm(a), degrees(angle))).toBeCloseTo(
          pennyK(mpa(100), mm(a)),
          8,
        );
      }),
    );
  });

  it('do not care which half axis comes first', () => {
    fc.assert(
      fc.property(between(1, 20), between(1, 20), between(0, 90), (a, c, angle) => {
        expect(ellipseK(mpa(1), mm(a), mm(c), degrees(angle))).toBeCloseTo(
          ellipseK(mpa(1), mm(c), mm(a), degrees(90 - angle)),
          10,
        );
      }),
    );
  });

  it('make a very long ellipse the through crack', () => {
    const k = ellipseK(mpa(1), mm(3), mm(3e5), degrees(90));
    expect(k).toBeCloseTo(Math.sqrt(Math.PI * 3), 6);
  });

  it('take uniform stress as the circle does, and add profiles', () => {
    fc.assert(
      fc.property(between(1, 20), between(0, 200), between(0, 200), (a, s, t) => {
        const uniform = pennyProfileK(() => mpa(s), mm(a));
        const rising = pennyProfileK((r) => mpa((t * r) / a), mm(a));
        const both = pennyProfileK((r) => mpa(s + (t * r) / a), mm(a));
        expect(uniform).toBeCloseTo(pennyK(mpa(s), mm(a)), 8);
        expect(both).toBeCloseTo(uniform + rising, 8);
      }),
    );
  });

  it('are what the plate form becomes when the faces are far, within the fit of Q', () => {
    fc.assert(
      fc.property(between(0.2, 2), between(0, 90), (aspect, angle) => {
        const crack = { a: 1, c: 1 / aspect, t: 1e6, p: 5e5 };
        const exact = ellipseK(mpa(1), mm(1), mm(1 / aspect), degrees(angle));
        const { membrane } = influenceOf(PLATE_EMBEDDED_K, crack, angle);
        expect(Math.abs(membrane / exact - 1)).toBeLessThan(0.003);
      }),
    );
  });
});
