import fc from 'fast-check';
import { erf, erfc } from './error-function';
import { betaBelow, betaQuantile } from './incomplete-beta';
import { upperGammaShare } from './incomplete-gamma';
import { gamma, logGamma } from './log-gamma';
import { normalBelow, normalDensity, normalQuantile } from './normal-distribution';

// the values beside the arguments were computed with 40 digits
const relative = (computed: number, exact: number) => Math.abs(computed / exact - 1);
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('the error function', () => {
  it.each([
    [-2.5, 1.999593047982555],
    [-0.3, 1.3286267594591274],
    [0.1, 0.88753708398171511],
    [0.46875, 0.50738652678206201],
    [0.5, 0.47950012218695346],
    [1.5, 0.033894853524689273],
    [3.9, 3.4792248597231742e-8],
    [4.1, 6.7000276540848984e-9],
    [6, 2.1519736712498913e-17],
    [10, 2.0884875837625448e-45],
    [20, 5.3958656116079009e-176],
  ])('erfc(%d) is true to twelve digits', (x, exact) => {
    expect(relative(erfc(x), exact)).toBeLessThan(1e-12);
  });

  it.each([
    [0.2, 0.22270258921047845],
    [0.47, 0.49374505088608214],
    [1, 0.84270079294971487],
    [2.5, 0.99959304798255504],
    [-0.7, -0.67780119383741847],
  ])('erf(%d) is true to twelve digits', (x, exact) => {
    expect(relative(erf(x), exact)).toBeLessThan(1e-12);
  });

  it('stays within its ends however far out', () => {
    expect([erfc(100), erfc(-Infinity), erf(Infinity), erf(0)]).toEqual([0, 2, 1, 0]);
  });
});

describe('the standard normal distribution', () => {
  it.each([
    [-37, 5.7255712225245768e-300],
    [-20, 2.7536241186062337e-89],
    [-12, 1.776482112077679e-33],
    [-8, 6.2209605742717841e-16],
    [-5, 2.8665157187919391e-7],
    [-3, 0.0013498980316300945],
    [-1, 0.15865525393145705],
    [0.3, 0.61791142218895264],
    [2, 0.97724986805182079],
    [6, 0.99999999901341235],
  ])('Φ(%d) is true to twelve digits, also in the tail', (u, exact) => {
    expect(relative(normalBelow(u), exact)).toBeLessThan(1e-12);
  });

  it.each([
    [0.3, -0.52440051270804078],
    [0.95, 1.6448536269514727],
    [0.975, 1.9599639845400542],
    [0.99, 2.3263478740408411],
    [1e-3, -3.0902323061678135],
    [1e-7, -5.1993375821928169],
    [1e-12, -7.0344838253011319],
    [1e-20, -9.2623400897984076],
    [1e-100, -21.273453560965324],
    [1e-300, -37.047096299361199],
  ])('Φ⁻¹(%d) is true to twelve digits', (p, exact) => {
    expect(relative(normalQuantile(p), exact)).toBeLessThan(1e-12);
  });

  it('takes back what it gave', () => {
    fc.assert(
      fc.property(between(-30, 5), (u) => {
        expect(normalQuantile(normalBelow(u))).toBeCloseTo(u, 8);
      }),
    );
  });

  it('has its density as its slope', () => {
    for (const u of [-3, -0.5, 0, 1.2]) {
      const slope = (normalBelow(u + 1e-5) - normalBelow(u - 1e-5)) / 2e-5;
      expect(slope).toBeCloseTo(normalDensity(u), 9);
    }
  });

  it('ends at infinity for the certain and the impossible', () => {
    expect([normalQuantile(0), normalQuantile(1)]).toEqual([-Infinity, Infinity]);
  });
});

describe('the gamma function', () => {
  it.each([
    [1e-5, 11.512919692895826],
    [0.1, 2.252712651734206],
    [0.5, 0.57236494292470009],
    [1.3, -0.10817480950786047],
    [1.461632144968362, -0.12148629053584961],
    [2.7, 0.43482055365510453],
    [7.5, 7.534364236758733],
    [12, 17.502307845873886],
    [100.25, 360.28455963776423],
    [1e4, 82099.717496442377],
  ])('ln Γ(%d) is true to twelve digits', (x, exact) => {
    expect(relative(logGamma(x), exact)).toBeLessThan(1e-12);
  });

  it('is a factorial at whole numbers and multiplies by its argument from one to the next', () => {
    expect(gamma(6)).toBeCloseTo(120, 10);
    fc.assert(
      fc.property(between(0.05, 60), (x) => {
        expect(relative(gamma(x + 1), x * gamma(x))).toBeLessThan(1e-12);
      }),
    );
  });
});

describe('the incomplete gamma function', () => {
  it.each([
    [0.5, 0.1, 0.65472084601857703],
    [0.5, 2, 0.045500263896358414],
    [1, 2, 0.13533528323661269],
    [3, 2.5, 0.54381311588332952],
    [10, 25, 0.00022147663824878358],
    [50, 40, 0.92966493334060505],
  ])('Q(%d, %d) is true to twelve digits', (s, x, exact) => {
    expect(relative(upperGammaShare(s, x), exact)).toBeLessThan(1e-12);
  });

  it('falls from 1 to 0', () => {
    expect([upperGammaShare(2, 0), upperGammaShare(2, Infinity)]).toEqual([1, 0]);
  });
});

describe('the incomplete beta function', () => {
  it.each([
    [0.5, 2, 3, 0.6875],
    [0.1, 0.5, 0.5, 0.20483276469913345],
    [0.9, 29, 1, 0.047101286972462448],
    [0.86, 19, 3, 0.4204963802727764],
    [0.3, 120, 250, 0.15871084606546218],
  ])('I of %d (%d, %d) is true to eleven digits', (x, a, b, exact) => {
    expect(relative(betaBelow(x, a, b), exact)).toBeLessThan(1e-11);
  });

  it('has 0 and 1 as its ends', () => {
    expect([betaBelow(0, 2, 2), betaBelow(1, 2, 2)]).toEqual([0, 1]);
  });

  it('is undone by its quantile', () => {
    fc.assert(
      fc.property(between(0.01, 0.99), between(0.3, 60), between(0.3, 60), (p, a, b) => {
        expect(betaBelow(betaQuantile(p, a, b), a, b)).toBeCloseTo(p, 9);
      }),
    );
  });
});
