import fc from 'fast-check';
import { toMPaSqrtM } from '../../units/convert';
import {
  charpyLowerBoundMPaSqrtM,
  charpyShelfMPaSqrtM,
  robertsNewtonMPaSqrtM,
  sailorsCortenMPaSqrtM,
  shelfAtTearingMPaSqrtM,
  upperShelfMPaSqrtM,
} from './charpy';
import {
  capacityLimit,
  ctodFactor,
  kFromCtod,
  kFromJ,
  planeStrainSize,
} from './from-fracture-test';
import {
  masterCurveBoundMPaSqrtM,
  masterCurveFractileMPaSqrtM,
  masterCurveMedianMPaSqrtM,
  masterCurveScaleMPaSqrtM,
  toFrontLengthMPaSqrtM,
  toughnessScaleMPaSqrtM,
} from './master-curve';
import {
  SHELF_CAP_MPA_SQRT_M,
  arrestCurveMPaSqrtM,
  exemptionCurveMPaSqrtM,
  initiationCurveMPaSqrtM,
  initiationCurveMetricMPaSqrtM,
} from './reference-curves';
import { t0FromT27, t0FromT40 } from './reference-temperature';
import {
  toughnessDensity,
  toughnessDeviation,
  toughnessFractile,
  toughnessMean,
  toughnessProbability,
} from './weibull-toughness';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const STEEL = { yieldMPa: 350, tensileMPa: 500, youngsModulusMPa: 207_000, poissonsRatio: 0.3 };

describe('toughness from a fracture test', () => {
  it('gives back the J it came from', () => {
    fc.assert(
      fc.property(between(1, 1000), between(0, 0.4), (j, nu) => {
        const k = kFromJ(j, 207_000, nu);
        expect(((1 - nu * nu) * k * k) / 207_000).toBeCloseTo(j, 6);
      }),
    );
  });

  it('rises with the root of CTOD, by a factor that falls as hardening is lost', () => {
    expect(kFromCtod(0.4, STEEL) / kFromCtod(0.1, STEEL)).toBeCloseTo(2, 12);
    expect(ctodFactor(480, 500)).toBeLessThan(ctodFactor(300, 500));
  });

  it('asks a specimen that grows with the square of K, and can measure K with the root of its size', () => {
    expect(planeStrainSize(2000, 500) / planeStrainSize(1000, 500)).toBeCloseTo(4, 12);
    expect(
      capacityLimit(207_000, 100, 450, 0.3) / capacityLimit(207_000, 25, 450, 0.3),
    ).toBeCloseTo(2, 12);
  });
});

describe('toughness from Charpy energy', () => {
  it('rises with energy, falls with thickness and never passes the shelf', () => {
    fc.assert(
      fc.property(between(4, 300), between(5, 200), between(1.001, 2), (energy, wall, more) => {
        const k = charpyLowerBoundMPaSqrtM(energy, wall);
        expect(k).toBeLessThanOrEqual(charpyShelfMPaSqrtM(energy));
        expect(charpyLowerBoundMPaSqrtM(energy * more, wall)).toBeGreaterThan(k);
        expect(charpyLowerBoundMPaSqrtM(energy, wall * more)).toBeLessThanOrEqual(k);
      }),
    );
  });

  it('agrees between the forms within their scatter at 27 J in 25 mm', () => {
    expect(charpyLowerBoundMPaSqrtM(27, 25)).toBeLessThan(robertsNewtonMPaSqrtM(27));
    expect(robertsNewtonMPaSqrtM(27)).toBeLessThan(sailorsCortenMPaSqrtM(27));
  });

  it('rises with energy on the upper shelf', () => {
    expect(upperShelfMPaSqrtM(150, 450)).toBeGreaterThan(upperShelfMPaSqrtM(100, 450));
    expect(shelfAtTearingMPaSqrtM(150, 207_000, 0.3)).toBeGreaterThan(
      shelfAtTearingMPaSqrtM(100, 207_000, 0.3),
    );
  });
});

describe('the master curve', () => {
  const T = between(-50, 50);

  it('rises with temperature', () => {
    fc.assert(
      fc.property(T, between(0.1, 30), between(0.001, 0.999), (t, more, p) => {
        expect(masterCurveFractileMPaSqrtM(t + more, 0, p)).toBeGreaterThan(
          masterCurveFractileMPaSqrtM(t, 0, p),
        );
      }),
    );
  });

  it('has its fractiles in order', () => {
    fc.assert(
      fc.property(T, between(0.001, 0.9), between(1.001, 1.1), (t, p, more) => {
        expect(masterCurveFractileMPaSqrtM(t, 0, p * more)).toBeGreaterThan(
          masterCurveFractileMPaSqrtM(t, 0, p),
        );
      }),
    );
  });

  it('has its scale at 63 % and its median near one half', () => {
    expect(masterCurveFractileMPaSqrtM(10, 0, 1 - Math.exp(-1))).toBeCloseTo(
      masterCurveScaleMPaSqrtM(10, 0),
      9,
    );
    const half = masterCurveFractileMPaSqrtM(10, 0, 0.5);
    expect(Math.abs(half / masterCurveMedianMPaSqrtM(10, 0) - 1)).toBeLessThan(0.005);
  });

  it('keeps a toughness at its own length of front, and comes back from another', () => {
    fc.assert(
      fc.property(between(20, 300), between(5, 200), between(5, 200), (k, one, other) => {
        expect(toFrontLengthMPaSqrtM(k, one, one)).toBeCloseTo(k, 9);
        const there = toFrontLengthMPaSqrtM(k, one, other);
        expect(toFrontLengthMPaSqrtM(there, other, one)).toBeCloseTo(k, 8);
        if (other > one) expect(there).toBeLessThanOrEqual(k);
      }),
    );
  });

  it('is lower with an allowance on temperature', () => {
    const options = { t0C: -38, thicknessMm: 25, probability: 0.05, allowanceC: 0 };
    expect(masterCurveBoundMPaSqrtM(0, options)).toBeCloseTo(
      masterCurveFractileMPaSqrtM(0, -38, 0.05),
      9,
    );
    expect(masterCurveBoundMPaSqrtM(0, { ...options, allowanceC: 25 })).toBeLessThan(
      masterCurveBoundMPaSqrtM(0, options),
    );
  });

  it('is met by the spread written from T27J within a twentieth', () => {
    const scale = toughnessScaleMPaSqrtM(0, 0, 25);
    expect(scale / (masterCurveScaleMPaSqrtM(0, t0FromT27(0)) - 20)).toBeCloseTo(1, 1);
    expect(t0FromT40(0)).toBeLessThan(t0FromT27(0));
  });
});

describe('the curves by nil-ductility temperature', () => {
  it('rise to the shelf and stop there', () => {
    fc.assert(
      fc.property(between(-100, 150), between(0.1, 50), (t, more) => {
        for (const curve of [initiationCurveMPaSqrtM, arrestCurveMPaSqrtM]) {
          expect(curve(t + more)).toBeGreaterThanOrEqual(curve(t));
          expect(curve(t)).toBeLessThanOrEqual(SHELF_CAP_MPA_SQRT_M);
        }
        expect(arrestCurveMPaSqrtM(t)).toBeLessThanOrEqual(initiationCurveMPaSqrtM(t));
      }),
    );
  });

  it('are the same in every set of constants within 0.3 %', () => {
    for (const t of [-50, 0, 40]) {
      const k = initiationCurveMPaSqrtM(t);
      expect(Math.abs(initiationCurveMetricMPaSqrtM(t) / k - 1)).toBeLessThan(0.003);
      expect(Math.abs(exemptionCurveMPaSqrtM(t) / k - 1)).toBeLessThan(0.003);
    }
  });
});

describe('the Weibull form of toughness', () => {
  it('has fractiles that are the inverse of its probability', () => {
    fc.assert(
      fc.property(between(0.0001, 0.999), between(30, 400), (p, scale) => {
        expect(toughnessProbability(toughnessFractile(p, scale), scale)).toBeCloseTo(p, 10);
      }),
    );
  });

  it('claims nothing at or below 20', () => {
    expect(toughnessProbability(20, 100)).toBe(0);
    expect(toughnessProbability(5, 100)).toBe(0);
    expect(toughnessDensity(10, 100)).toBe(0);
  });

  it('has density, mean and deviation that belong to its probability', () => {
    const [scale, width] = [120, 0.01];
    const ks = Array.from({ length: 38_000 }, (_, i) => 20 + (i + 0.5) * width);
    const mean = ks.reduce((sum, k) => sum + k * toughnessDensity(k, scale) * width, 0);
    const square = ks.reduce((sum, k) => sum + k * k * toughnessDensity(k, scale) * width, 0);
    expect(mean).toBeCloseTo(toughnessMean(scale), 5);
    expect(Math.sqrt(square - mean * mean)).toBeCloseTo(toughnessDeviation(scale), 4);
  });

  it('is in one unit with the engine', () => {
    expect(toMPaSqrtM(kFromJ(100, 207_000, 0.3))).toBeCloseTo(150.82192, 5);
  });
});
