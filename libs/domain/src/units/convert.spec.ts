import fc from 'fast-check';
import {
  fromFahrenheit,
  fromMm,
  fromMPa,
  fromMPaSqrtMm,
  toFahrenheit,
  toMm,
  toMPa,
  toMPaSqrtM,
  toMPaSqrtMm,
} from './convert';
import { MM_PER, MPA_PER, MPA_SQRT_MM_PER } from './exact-factors';
import { celsius } from './quantity';

const sizes = fc.double({ min: -1e6, max: 1e6, noNaN: true });
const near = (value: number) => Math.max(Math.abs(value) * 1e-12, 1e-12);

describe('conversions', () => {
  it.each([
    [1, 'in', 25.4],
    [1, 'mil', 0.0254],
    [2.5, 'cm', 25],
    [0.028, 'm', 28],
  ] as const)('%d %s is %d mm', (value, unit, expected) => {
    expect(toMm(value, unit)).toBeCloseTo(expected, 12);
  });

  it.each([
    [26, 'bar', 2.6],
    [1000, 'psi', 6.894757293168],
    [36, 'ksi', 248.211262554],
    [350, 'N/mm²', 350],
  ] as const)('%d %s is %d MPa', (value, unit, expected) => {
    expect(toMPa(value, unit)).toBeCloseTo(expected, 8);
  });

  it('takes 1 MPa·√m as √1000 MPa·√mm', () => {
    expect(toMPaSqrtMm(1, 'MPa·√m')).toBe(Math.sqrt(1000));
    expect(toMPaSqrtM(Math.sqrt(1000))).toBeCloseTo(1, 15);
  });

  it('takes 1 ksi·√in as 1.09884 MPa·√m', () => {
    expect(toMPaSqrtM(toMPaSqrtMm(1, 'ksi·√in'))).toBeCloseTo(1.0988434941, 9);
  });

  it('knows the fixed points of the thermometer', () => {
    expect(fromFahrenheit(32)).toBe(0);
    expect(fromFahrenheit(-40)).toBeCloseTo(-40, 12);
    expect(toFahrenheit(celsius(100))).toBeCloseTo(212, 12);
  });

  it('comes back unchanged from every unit of length', () => {
    for (const unit of Object.keys(MM_PER) as (keyof typeof MM_PER)[]) {
      fc.assert(fc.property(sizes, (x) => Math.abs(fromMm(toMm(x, unit), unit) - x) <= near(x)));
    }
  });

  it('comes back unchanged from every unit of stress', () => {
    for (const unit of Object.keys(MPA_PER) as (keyof typeof MPA_PER)[]) {
      fc.assert(fc.property(sizes, (x) => Math.abs(fromMPa(toMPa(x, unit), unit) - x) <= near(x)));
    }
  });

  it('comes back unchanged from every unit of stress intensity', () => {
    for (const unit of Object.keys(MPA_SQRT_MM_PER) as (keyof typeof MPA_SQRT_MM_PER)[]) {
      fc.assert(
        fc.property(
          sizes,
          (x) => Math.abs(fromMPaSqrtMm(toMPaSqrtMm(x, unit), unit) - x) <= near(x),
        ),
      );
    }
  });
});
