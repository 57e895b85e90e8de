import fc from 'fast-check';
import { degrees, mpa } from '../../units/quantity';
import { crackOf, type CrackSymbols } from '../../verification/crack-of';
import { LONG_AXIAL_PRESSURE } from '../../verification/data/long-crack-rows';
import { axialPressureK } from './axial-pressure-k';
import { CYLINDER_AXIAL_THROUGH_WALL_K } from './curved-through-wall-k';
import {
  CYLINDER_AXIAL_EXTENDED_INSIDE_K,
  CYLINDER_AXIAL_EXTENDED_OUTSIDE_K,
} from './cylinder-long-k';
import { CYLINDER_AXIAL_INSIDE_K } from './cylinder-surface-k';
import { newmanRaju1980 } from './newman-raju-1980';
import { stripCoefficient } from './strip-coefficient';

const LONG = CYLINDER_AXIAL_EXTENDED_INSIDE_K;
const at = (symbols: CrackSymbols, pressure = 10, solution = LONG) =>
  axialPressureK(solution, 'inside', mpa(pressure), crackOf(symbols), degrees(90));
const kOf = (...given: Parameters<typeof at>): number => {
  const found = at(...given);
  if (found.status === 'refused') throw new Error('refused');
  return found.k;
};

describe('K of an axial flaw from pressure', () => {
  it('meets the finite elements of outside flaws within 0.3 %', () => {
    for (const [face, wall, depth, factor] of LONG_AXIAL_PRESSURE) {
      if (face === 'inside') continue;
      const crack = crackOf({ a: 1, c: 1, t: 1 / depth, Ri: wall / depth });
      const solution = CYLINDER_AXIAL_EXTENDED_OUTSIDE_K;
      const found = axialPressureK(solution, face, mpa(1), crack, degrees(90));
      if (found.status === 'refused') throw new Error('refused');
      expect(Math.abs(found.k / Math.sqrt(Math.PI) / factor - 1)).toBeLessThan(0.003);
    }
  });

  it('adds the pressure on the faces of inside flaws', () => {
    // G0 and the factor without it, Ri/t = 5, a/t = 0.4, from finite elements
    const k = kOf({ a: 4, c: 1, t: 10, Ri: 50 }, 1);
    expect(k / Math.sqrt(4 * Math.PI) / (9.72873 + 1.8378)).toBeCloseTo(1, 2);
  });

  it('is 1.12 times Lamé’s stress at the bore and the pressure when shallow', () => {
    const k = kOf({ a: 1e-4, c: 1, t: 10, Ri: 100 });
    const bore = 105.238095 + 10;
    expect(k / (stripCoefficient(0, 1e-5) * bore * Math.sqrt(Math.PI * 1e-4))).toBeCloseTo(1, 3);
  });

  it('is within 10 % of Newman and Raju 1980 for a semi-elliptical flaw', () => {
    for (const [a, c, Ri] of [
      [5, 12.5, 100],
      [5, 25, 100],
      [8, 20, 100],
      [2, 10, 200],
    ] as const) {
      const symbols = { a, c, t: 10, Ri };
      const other = newmanRaju1980(mpa(10), crackOf(symbols), degrees(90));
      expect(Math.abs(kOf(symbols, 10, CYLINDER_AXIAL_INSIDE_K) / other - 1)).toBeLessThan(0.1);
    }
  });

  it('scales with the pressure', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 300, noNaN: true }),
        fc.double({ min: 0.2, max: 7.9, noNaN: true }),
        (pressure, a) => {
          const symbols = { a, c: 1, t: 10, Ri: 40 };
          expect(kOf(symbols, 2 * pressure) / kOf(symbols, pressure)).toBeCloseTo(2, 9);
        },
      ),
    );
  });

  it.each([
    ['no pressure', { a: 4, c: 9, t: 10, Ri: 50 }, 0, 'pressureMPa'],
    ['a pressure below 0', { a: 4, c: 9, t: 10, Ri: 50 }, -3, 'pressureMPa'],
    ['a pressure that is no number', { a: 4, c: 9, t: 10, Ri: 50 }, Number.NaN, 'pressureMPa'],
    ['a pressure in Pa', { a: 4, c: 9, t: 10, Ri: 50 }, 1e7, 'pressureMPa'],
    ['a deep flaw', { a: 9, c: 9, t: 10, Ri: 50 }, 10, 'flaw.heightMm'],
    ['a very thick wall', { a: 4, c: 9, t: 10, Ri: 5 }, 10, 'wall.insideDiameterMm'],
    ['a plate', { a: 4, c: 9, t: 10 }, 10, 'wall.insideDiameterMm'],
  ])('refuses %s by name', (_, symbols, pressure, input) => {
    const found = at(symbols, pressure);
    expect(found.status === 'refused' && found.refusals.map((r) => r.input)).toContain(input);
  });

  it('refuses a crack through the wall', () => {
    const found = at({ a: 5, c: 20, t: 10, Ri: 100 }, 10, CYLINDER_AXIAL_THROUGH_WALL_K);
    expect(found.status === 'refused' && found.refusals[0]?.input).toBe('flaw.kind');
  });
});
