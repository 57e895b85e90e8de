import fc from 'fast-check';
import { linePoints } from './diagram-line';
import { optionTwoLine } from './diagram-lines';
import type { CurveInput, CurvePoint } from './curve-limits';
import { measuredCurve } from './measured-curve';
import {
  rambergOsgoodCurve,
  trueStrain,
  trueStress,
  type StressStrainCurve,
} from './stress-strain-curve';

const E = 200_000;
const YIELD = 400;
const LAW = rambergOsgoodCurve({
  youngsModulusMPa: E,
  yieldMPa: YIELD,
  exponent: 10,
  plasticStrain: 0.002,
});
const STRESSES = [100, 200, 250, 280, 320, 350, 380, 392, 400, 408, 420, 440, 460, 480, 500];

/** Points of the smooth law, in true or in engineering values. */
const lawPoints = (values: CurveInput['values']): readonly CurvePoint[] =>
  STRESSES.map((stress) => {
    const strain = (LAW.secantRatio(stress) * stress) / E;
    const stretch = Math.exp(strain);
    return values === 'true'
      ? { strain, stressMPa: stress }
      : { strain: stretch - 1, stressMPa: stress / stretch };
  });

const input = (change: Partial<CurveInput> = {}): CurveInput => ({
  points: lawPoints('true'),
  values: 'true',
  yieldMPa: YIELD,
  youngsModulusMPa: E,
  ...change,
});

function curveOf(change: Partial<CurveInput> = {}): StressStrainCurve {
  const found = measuredCurve(input(change));
  if (found.status === 'refused') throw new Error(found.refusals[0]?.message);
  return found.curve;
}

const limitsOf = (change: Partial<CurveInput>) => {
  const found = measuredCurve(input(change));
  return found.status === 'refused' ? found.refusals.map(({ limit }) => limit) : [];
};

describe('a curve through measured points', () => {
  it('goes through its points', () => {
    const curve = curveOf();
    for (const stress of STRESSES) {
      expect(curve.secantRatio(stress)).toBeCloseTo(LAW.secantRatio(stress), 9);
    }
  });

  it('is within half a per cent of the smooth law between them', () => {
    const curve = curveOf();
    for (let stress = 5; stress <= 500; stress += 5) {
      expect(Math.abs(curve.secantRatio(stress) / LAW.secantRatio(stress) - 1)).toBeLessThan(0.005);
    }
  });

  it('is the same from engineering and from true values', () => {
    const [one, other] = [
      curveOf(),
      curveOf({ values: 'engineering', points: lawPoints('engineering') }),
    ];
    for (const stress of [50, 300, 399, 455]) {
      expect(other.secantRatio(stress)).toBeCloseTo(one.secantRatio(stress), 9);
    }
    expect(other.lastStressMPa).toBeCloseTo(500, 9);
  });

  it('takes the origin as given', () => {
    const withOrigin = curveOf({ points: [{ strain: 0, stressMPa: 0 }, ...lawPoints('true')] });
    expect(withOrigin.secantRatio(330)).toBe(curveOf().secantRatio(330));
    expect(withOrigin.secantRatio(0)).toBe(1);
  });

  it('never lets the secant rise, whatever the scatter of the elastic points', () => {
    const scatter = fc.array(fc.double({ min: 0.97, max: 1.03, noNaN: true }), {
      minLength: 4,
      maxLength: 4,
    });
    fc.assert(
      fc.property(scatter, fc.double({ min: 1, max: 490, noNaN: true }), (factors, stress) => {
        const points = lawPoints('true').map((point, i) => ({
          ...point,
          strain: point.strain * (factors[i] ?? 1),
        }));
        const curve = curveOf({ points });
        expect(curve.secantRatio(stress)).toBeGreaterThanOrEqual(1);
        expect(curve.secantRatio(stress + 5)).toBeGreaterThanOrEqual(
          curve.secantRatio(stress) - 1e-12,
        );
      }),
    );
  });

  it('gives two thirds at yield on the diagram', () => {
    const material = { yieldMPa: YIELD, tensileMPa: 600, youngsModulusMPa: E, yieldPlateau: false };
    const line = optionTwoLine(material, curveOf());
    expect(line.height(1)).toBeCloseTo(2 / 3, 9);
    expect(line.lrMax).toBeCloseTo(1.25, 12);
  });
});

describe('a yield plateau in true values', () => {
  const points = [
    ...[0.1, 0.3, 0.5, 0.7, 0.8, 0.9, 0.98, 1].map((share) => ({
      strain: (share * YIELD) / E,
      stressMPa: share * YIELD,
    })),
    { strain: 0.02, stressMPa: YIELD },
    { strain: 0.04, stressMPa: 440 },
    { strain: 0.08, stressMPa: 480 },
  ];
  const curve = curveOf({ points });

  it('is a step of the curve and a drop of the line, drawn with both ends', () => {
    expect(curve.steps).toEqual([{ stressMPa: YIELD, before: 1, after: 10 }]);
    const material = { yieldMPa: YIELD, tensileMPa: 600, youngsModulusMPa: E, yieldPlateau: true };
    const line = optionTwoLine(material, curve);
    const ends = linePoints(line).filter(({ lr }) => lr === 1);
    expect(ends.map(({ kr }) => kr)).toEqual([
      expect.closeTo(Math.sqrt(2 / 3), 12),
      expect.closeTo(1 / Math.sqrt(10.05), 12),
    ]);
  });

  it('is elastic below it', () => {
    expect(curve.secantRatio(0.999 * YIELD)).toBeCloseTo(1, 12);
    expect(curve.secantRatio(YIELD)).toBeCloseTo(10, 12);
  });
});

describe('points that make no curve', () => {
  it.each<[string, Partial<CurveInput>, RegExp]>([
    ['too few', { points: lawPoints('true').slice(-4) }, /8 points/],
    ['none', { points: [] }, /8 points/],
    ['out of order', { points: [...lawPoints('true')].reverse() }, /increases/],
    [
      'falling beyond the greatest load',
      { points: [...lawPoints('true'), { strain: 0.5, stressMPa: 450 }] },
      /does not fall/,
    ],
    [
      'strain in per cent',
      { points: lawPoints('true').map((p) => ({ ...p, strain: Math.min(p.strain * 100, 1) })) },
      /0\.95 ≤ E ε\/σ/,
    ],
    [
      'stress in GPa',
      { points: lawPoints('true').map((p) => ({ ...p, stressMPa: p.stressMPa / 1000 })) },
      /0\.95/,
    ],
    ['nothing elastic', { points: lawPoints('true').slice(4) }, /0\.7 σY/],
    [
      'bare about yield',
      { points: lawPoints('true').filter((_, i) => i < 3 || i > 11), yieldMPa: 400 },
      /5 points/,
    ],
    ['an end below yield', { yieldMPa: 501 }, /σY or above/],
  ])('are refused: %s', (_, change, reason) => {
    expect(limitsOf(change).join('; ')).toMatch(reason);
  });

  it('are refused where a number is none', () => {
    const points = [{ strain: Number.NaN, stressMPa: -1 }, ...lawPoints('true')];
    expect(limitsOf({ points })).toEqual(['from 0 to 1', 'at least 0 MPa']);
    expect(limitsOf({ yieldMPa: 0, youngsModulusMPa: Infinity })).toHaveLength(2);
  });
});

describe('true values', () => {
  it('are the engineering ones at no strain and grow away from them', () => {
    expect(trueStrain(0)).toBe(0);
    expect(trueStress(400, 0)).toBe(400);
    expect(trueStrain(0.2)).toBeLessThan(0.2);
    expect(trueStress(400, 0.2)).toBeCloseTo(480, 12);
  });
});
