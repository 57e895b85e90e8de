import fc from 'fast-check';
import { secondaryFactor, toughnessRatio, toughnessRatioByFactor } from './toughness-ratio';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const inputs = fc.record({
  kPrimary: between(0, 5000),
  kSecondary: between(-2000, 5000),
  toughness: between(500, 9000),
  lr: between(0, 1.5),
});

describe('the toughness ratio with secondary stress', () => {
  it('is the same with ρ and with V', () => {
    fc.assert(
      fc.property(inputs, (input) => {
        expect(toughnessRatioByFactor(input)).toBeCloseTo(toughnessRatio(input), 10);
      }),
    );
  });

  it('takes compressive secondary stress as none', () => {
    const input = { kPrimary: 1000, kSecondary: -400, toughness: 4000, lr: 0.5 };
    expect(toughnessRatio(input)).toBe(0.25);
    expect(secondaryFactor(input)).toBe(1);
  });

  it('stays a number where nothing is primary', () => {
    const input = { kPrimary: 0, kSecondary: 1000, toughness: 4000, lr: 0.5 };
    expect(toughnessRatio(input)).toBeCloseTo(0.5, 12);
    expect(secondaryFactor(input)).toBeCloseTo(2, 12);
  });

  it('never helps: V is 1 or more', () => {
    fc.assert(
      fc.property(inputs, (input) => {
        expect(secondaryFactor(input)).toBeGreaterThanOrEqual(1);
      }),
    );
  });
});
