import fc from 'fast-check';
import { optionOneLine } from './diagram-lines';
import { governingPoint, rayFactor } from './governing-point';
import { reserveOnLoad } from './reserve-on-load';
import { reserveOnSize } from './reserve-on-size';
import { sensitivity } from './sensitivity';
import { toughnessRatio } from './toughness-ratio';

const LINE = optionOneLine({
  yieldMPa: 350,
  tensileMPa: 500,
  youngsModulusMPa: 207_000,
  yieldPlateau: false,
});
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('the reserve on load with secondary stress', () => {
  it('puts the point on the line or at the cut-off, the interaction renewed on the way', () => {
    const cases = fc.record({
      kp: between(200, 3000),
      ks: between(0, 2500),
      lr: between(0.1, 1.2),
    });
    fc.assert(
      fc.property(cases, ({ kp, ks, lr }) => {
        const at = (f: number) =>
          toughnessRatio({ kPrimary: f * kp, kSecondary: ks, toughness: 4000, lr: f * lr });
        const margin = (f: number) => Math.min(LINE.height(f * lr) - at(f), LINE.lrMax - f * lr);
        const factor = reserveOnLoad(margin, LINE.lrMax / lr);
        expect(factor).toBeGreaterThan(0);
        expect(margin(factor)).toBeCloseTo(0, 7);
        expect(margin(factor * 0.999)).toBeGreaterThan(0);
      }),
    );
  });
});

describe('the reserve on size', () => {
  it('is the square of that on toughness where K alone decides', () => {
    fc.assert(
      fc.property(between(0.2, 0.9), (kr) => {
        const { factor, end } = reserveOnSize((f) => 1 - kr * Math.sqrt(f), 40);
        expect(end).toBe('line');
        expect(factor).toBeCloseTo(1 / (kr * kr), 6);
      }),
    );
  });

  it('is below 1 outside', () => {
    expect(reserveOnSize((f) => 1 - 2 * Math.sqrt(f), 3).factor).toBeCloseTo(0.25, 8);
  });

  it('says when validity ends it, and when even the smallest flaw is outside', () => {
    expect(reserveOnSize(() => 0.3, 2.5)).toEqual({ factor: 2.5, end: 'validity' });
    expect(reserveOnSize(() => -0.1, 2.5)).toEqual({ factor: 0, end: 'smallest' });
    expect(reserveOnSize(() => Number.NaN, 2.5)).toEqual({ factor: 0, end: 'smallest' });
    expect(reserveOnSize(() => 1, Number.NaN)).toEqual({ factor: 0, end: 'smallest' });
  });
});

describe('the factor along a ray', () => {
  it('puts the point on the line', () => {
    fc.assert(
      fc.property(between(0.05, 1.1), between(0.05, 1.2), (lr, kr) => {
        const factor = rayFactor({ lr, kr }, LINE) ?? Number.NaN;
        const onLine = Math.abs(LINE.height(factor * lr) - factor * kr) < 1e-8;
        const atEnd = Math.abs(factor * lr - LINE.lrMax) < 1e-8;
        expect(onLine || atEnd).toBe(true);
      }),
    );
  });

  it('is that of one ratio alone on an axis, and none at the origin', () => {
    expect(rayFactor({ lr: 0, kr: 0.5 }, LINE)).toBeCloseTo(2, 8);
    expect(rayFactor({ lr: 0.5, kr: 0 }, LINE)).toBeCloseTo(LINE.lrMax / 0.5, 8);
    expect(rayFactor({ lr: 0, kr: 0 }, LINE)).toBeNull();
    expect(rayFactor({ lr: Number.NaN, kr: Number.NaN }, LINE)).toBe(0);
  });
});

describe('the governing point', () => {
  it('is the one nearest to the line along its ray', () => {
    const points = [
      { lr: 0.5, kr: 0.3, angle: 90 },
      { lr: 0.5, kr: 0.4, angle: 0 },
      { lr: 0.5, kr: 0.35, angle: 45 },
    ];
    expect(governingPoint(points, LINE)?.point.angle).toBe(0);
    expect(governingPoint([], LINE)).toBeNull();
  });

  it('is the first of equals, and any point before the origin', () => {
    const equal = { lr: 0.2, kr: 0.2 };
    expect(governingPoint([{ lr: 0, kr: 0 }, equal, { ...equal }], LINE)?.point).toBe(equal);
  });
});

describe('a sensitivity study', () => {
  const inputs = [
    { name: 'toughness', value: 100, change: 10 },
    { name: 'stress', value: 200, change: 10 },
    { name: 'size', value: 5, change: 1 },
  ];
  const power = ([k = 0, s = 0, a = 0]: readonly number[]) => k / (s * Math.sqrt(a));

  it('finds the exponents of a power law', () => {
    const found = sensitivity(inputs, power);
    const of = (name: string) => found.find((effect) => effect.name === name)?.elasticity;
    expect(of('toughness')).toBeCloseTo(1, 7);
    expect(of('stress')).toBeCloseTo(-1, 7);
    expect(of('size')).toBeCloseTo(-0.5, 7);
  });

  it('puts the strongest first and answers twice the same', () => {
    const found = sensitivity(inputs, power);
    expect(found.map(({ name }) => name)).toEqual(['size', 'toughness', 'stress']);
    expect(sensitivity(inputs, power)).toEqual(found);
  });

  it('keeps the order of inputs of equal effect', () => {
    const twins = ['one', 'two', 'three'].map((name) => ({ name, value: 1, change: 0.1 }));
    const found = sensitivity(twins, (v) => v.reduce((sum, x) => sum + x, 0));
    expect(found.map(({ name }) => name)).toEqual(['one', 'two', 'three']);
  });

  it('says where no reserve exists instead of giving a number that is none', () => {
    const [effect] = sensitivity([{ name: 'depth', value: 8, change: 3 }], ([a = 0]) =>
      a > 10 ? null : 20 / a,
    );
    expect(effect).toMatchObject({ low: 4, high: null, swing: 0 });
    expect(effect?.elasticity).toBeCloseTo(-1, 6);
    const [zero] = sensitivity(
      [{ name: 'residual', value: 0, change: 10 }],
      ([q = 0]) => 2 - q / 100,
    );
    expect(zero).toMatchObject({ elasticity: null, low: 2.1, high: 1.9 });
    const [none] = sensitivity([{ name: 'x', value: 1, change: 1 }], () => Number.NaN);
    expect(none).toEqual({ name: 'x', elasticity: null, low: null, high: null, swing: 0 });
  });
});
