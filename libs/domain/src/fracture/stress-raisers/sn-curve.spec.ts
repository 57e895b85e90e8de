import fc from 'fast-check';
import { cyclesEndured, GROUND_CLASSES, KNEE_CYCLES, kneeRange, thicknessFactor } from './sn-curve';

const [weld] = GROUND_CLASSES;
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('the fatigue curve', () => {
  it('passes through its class at two million cycles', () => {
    for (const curve of GROUND_CLASSES)
      expect(cyclesEndured(curve.rangeMPa, curve)).toBeCloseTo(2e6, 4);
  });

  it('halves the range for eight times the cycles, above the knee', () => {
    expect(cyclesEndured(200, weld) * 8).toBeCloseTo(cyclesEndured(100, weld), 3);
  });

  it('is continuous at the knee and five times as steep in the exponent below', () => {
    const knee = kneeRange(weld);
    expect(cyclesEndured(knee, weld)).toBeCloseTo(KNEE_CYCLES, 2);
    expect(cyclesEndured(knee * (1 - 1e-9), weld) / KNEE_CYCLES).toBeCloseTo(1, 6);
    expect(cyclesEndured(knee / 2, weld) / KNEE_CYCLES).toBeCloseTo(32, 8);
  });

  it('endures fewer cycles at a larger range', () => {
    fc.assert(
      fc.property(between(1, 500), between(0.1, 100), (range, more) => {
        expect(cyclesEndured(range + more, weld)).toBeLessThan(cyclesEndured(range, weld));
      }),
    );
  });

  it('loses strength in walls above 25 mm only', () => {
    expect(thicknessFactor(10)).toBe(1);
    expect(thicknessFactor(25)).toBe(1);
    expect(thicknessFactor(100)).toBeCloseTo(4 ** -0.1, 12);
  });
});
