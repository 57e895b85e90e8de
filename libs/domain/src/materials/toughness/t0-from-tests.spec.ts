import fc from 'fast-check';
import {
  likelihoodSlope,
  medianOfScale,
  scaleOfTests,
  t0Deviation,
  t0OfScale,
  testWeight,
  type OneInchTest,
} from './t0-from-tests';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('T0 of tests at one temperature', () => {
  it('comes back from tests that all lie on the scale of the curve, within the rounding of 0.91', () => {
    fc.assert(
      fc.property(between(-100, 20), between(-30, 40), (t0, above) => {
        const k0 = 31 + 77 * Math.exp(0.019 * above);
        const scale = scaleOfTests([k0, k0, k0, k0, k0, k0], 6);
        expect(scale).toBeCloseTo(k0, 9);
        expect(Math.abs(t0OfScale(t0 + above, scale) - t0)).toBeLessThan(0.6);
      }),
    );
  });

  it('has a median below its scale', () => {
    expect(medianOfScale(108)).toBeCloseTo(100.08, 9);
  });

  it('rises in scale with a test that did not cleave', () => {
    const values = [70, 85, 95, 102, 118];
    expect(scaleOfTests([...values, 200], 5)).toBeGreaterThan(scaleOfTests(values, 5));
  });
});

describe('the slope of the likelihood', () => {
  const test = (temperatureC: number, kMPaSqrtM: number, censored = false): OneInchTest => ({
    temperatureC,
    kMPaSqrtM,
    censored,
  });
  const tests = [test(-80, 70), test(-60, 110), test(-40, 120), test(-40, 190, true)];
  const logLikelihood = (t0: number) =>
    tests.reduce((sum, { temperatureC, kMPaSqrtM, censored }) => {
      const spread = 11 + 77 * Math.exp(0.019 * (temperatureC - t0));
      const excess = (kMPaSqrtM - 20) ** 4 / spread ** 4;
      return sum - excess - (censored ? 0 : 4 * Math.log(spread));
    }, 0);

  it('is proportional to the derivative of the likelihood itself', () => {
    const factor = 4 * 77 * 0.019;
    for (const t0 of [-90, -70, -50, -20]) {
      const derivative = (logLikelihood(t0 + 1e-4) - logLikelihood(t0 - 1e-4)) / 2e-4;
      expect(derivative / (factor * likelihoodSlope(tests, t0))).toBeCloseTo(1, 6);
    }
  });
});

describe('what a test counts', () => {
  it.each([
    [50, 1 / 6],
    [0, 1 / 6],
    [-14, 1 / 6],
    [-15, 1 / 7],
    [-36, 1 / 8],
    [-50, 1 / 8],
    [-51, 0],
    [51, 0],
    [Number.NaN, 0],
  ])('at %d °C above T0 is %d', (above, weight) => {
    expect(testWeight(above)).toBe(weight);
  });

  it('makes T0 the surer the more tests there are, and the tougher', () => {
    expect(t0Deviation(100, 12)).toBeLessThan(t0Deviation(100, 6));
    expect(t0Deviation(60, 6)).toBeGreaterThan(t0Deviation(70, 6));
    expect(t0Deviation(70, 6)).toBeGreaterThan(t0Deviation(90, 6));
  });
});
