import fc from 'fast-check';
import { convertParisCoefficient, ENGINE_PARIS_UNITS } from './convert-paris';

const METRE = { growth: 'm', range: 'MPa·√m' } as const;
const INCH = { growth: 'in', range: 'ksi·√in' } as const;

describe('convertParisCoefficient', () => {
  it('multiplies by √1000 to the power m over 1000 from millimetres to metres', () => {
    const metres = convertParisCoefficient(5.21e-13, 3, { from: ENGINE_PARIS_UNITS, to: METRE });
    expect(metres).toBeCloseTo(5.21e-13 * Math.sqrt(1000) ** 3 * 1e-3, 20);
    expect(metres / 1.6475e-11).toBeCloseTo(1, 4);
  });

  it('gives the engine’s units when none are asked for', () => {
    expect(convertParisCoefficient(1.6475e-11, 3, { from: METRE }) / 5.21e-13).toBeCloseTo(1, 4);
  });

  it('gives the same growth in every pair of units', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-15, max: 1e-9, noNaN: true }),
        fc.double({ min: 1, max: 8, noNaN: true }),
        (a, m) => {
          const inch = convertParisCoefficient(a, m, { from: ENGINE_PARIS_UNITS, to: INCH });
          const back = convertParisCoefficient(inch, m, { from: INCH });
          expect(back / a).toBeCloseTo(1, 10);
        },
      ),
    );
  });
});
