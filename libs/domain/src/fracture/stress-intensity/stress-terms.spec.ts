import fc from 'fast-check';
import {
  fromOtherFace,
  highestBetween,
  isCurved,
  kOfTerms,
  linearised,
  linearTerms,
  profileOf,
  scaled,
  stressAt,
  termsOf,
} from './stress-terms';

const number = fc.double({ min: -300, max: 300, noNaN: true });
const profile = fc.array(number, { minLength: 1, maxLength: 5 });
const depth = fc.double({ min: 0, max: 1, noNaN: true });
const value = (coefficients: readonly number[], u: number) =>
  coefficients.reduce((sum, s, n) => sum + s * u ** n, 0);

describe('a stress through the wall', () => {
  it('has the value of its polynomial everywhere', () => {
    fc.assert(
      fc.property(profile, depth, (s, u) => {
        expect(stressAt(termsOf(s), u)).toBeCloseTo(value(s, u), 6);
      }),
    );
  });

  it('gives its polynomial back', () => {
    expect(profileOf(termsOf([10, -4, 3, 2, 1]))).toEqual([10, -4, 3, 2, 1]);
  });

  it('is membrane and bending when it is straight', () => {
    expect(termsOf([150, -100])).toEqual(linearTerms(100, 50));
    expect(isCurved(termsOf([150, -100]))).toBe(false);
    expect(isCurved(termsOf([0, 0, 1]))).toBe(true);
  });

  it('keeps force and moment when it is linearised', () => {
    fc.assert(
      fc.property(profile, (s) => {
        const { membrane, bending } = linearised(termsOf(s));
        const steps = 4000;
        let [force, moment] = [0, 0];
        for (let i = 0; i < steps; i++) {
          const u = (i + 0.5) / steps;
          force += value(s, u) / steps;
          moment += (6 * value(s, u) * (0.5 - u)) / steps;
        }
        expect(membrane).toBeCloseTo(force, 3);
        expect(bending).toBeCloseTo(moment, 3);
      }),
      { numRuns: 25 },
    );
  });

  it('reads the same from the other face', () => {
    fc.assert(
      fc.property(profile, depth, (s, u) => {
        expect(stressAt(fromOtherFace(termsOf(s)), u)).toBeCloseTo(value(s, 1 - u), 6);
      }),
    );
  });

  it('is nowhere above its highest value by more than the sampling leaves', () => {
    fc.assert(
      fc.property(profile, depth, (s, u) => {
        const terms = termsOf(s);
        expect(stressAt(terms, u)).toBeLessThanOrEqual(highestBetween(terms, 0, 1) + 5);
      }),
    );
    expect(highestBetween(termsOf([0, 4, -4]), 0, 1)).toBeCloseTo(1, 12);
  });

  it('drives K term by term, and not below zero', () => {
    const influence = { membrane: 2, bending: 1, reversedBending: -1 };
    const higher = { quadratic: 0.5, cubic: 0.25, quartic: 0.125 };
    expect(kOfTerms(influence, higher, termsOf([10, -4, 4, 8, 16]))).toBeCloseTo(
      2 * 8 + 1 * 2 + 2 + 2 + 2,
      12,
    );
    expect(kOfTerms(influence, higher, linearTerms(-10, 5))).toBe(0);
    expect(kOfTerms(influence, higher, scaled(linearTerms(10, -5), 2))).toBe(30);
  });
});
