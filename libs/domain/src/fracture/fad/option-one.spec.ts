import fc from 'fast-check';
import {
  continuousLine,
  dropStrength,
  hardening,
  lrMax,
  optionOne,
  plateauLine,
  plateauRatio,
  plateauStrain,
  type DiagramMaterial,
} from './option-one';

const STEEL: DiagramMaterial = {
  yieldMPa: 350,
  tensileMPa: 500,
  youngsModulusMPa: 207_000,
  yieldPlateau: false,
};
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const materials = fc
  .record({
    yieldMPa: between(150, 900),
    hardening: between(1.01, 2),
    youngsModulusMPa: between(150_000, 220_000),
    yieldPlateau: fc.boolean(),
  })
  .map(({ hardening, ...m }) => ({ ...m, tensileMPa: m.yieldMPa * hardening }));

describe('the Option 1 line', () => {
  it('starts at 1 and falls', () => {
    fc.assert(
      fc.property(materials, between(0, 1.5), between(0.001, 0.5), (material, lr, more) => {
        expect(optionOne(0, material)).toBe(1);
        expect(optionOne(lr + more, material)).toBeLessThan(optionOne(lr, material));
      }),
    );
  });

  it('is continuous at Lr = 1 for continuous yielding', () => {
    expect(continuousLine(1 + 1e-12, STEEL)).toBeCloseTo(continuousLine(1, STEEL), 10);
  });

  it('jumps at Lr = 1 with a yield plateau, from 0.816 to 0.254', () => {
    expect(plateauLine(1 - 1e-9, STEEL)).toBeCloseTo(Math.sqrt(2 / 3), 6);
    expect(plateauLine(1, STEEL)).toBeCloseTo(0.2543, 3);
  });

  it('caps the exponent for a stiff, soft material', () => {
    const soft = { ...STEEL, yieldMPa: 300 };
    const softer = { ...STEEL, yieldMPa: 200, tensileMPa: 350 };
    expect(continuousLine(0.9, soft)).toBeCloseTo(continuousLine(0.9, softer), 12);
  });

  it('falls without bound beyond 1 for a material without hardening', () => {
    const none = { ...STEEL, tensileMPa: 350 };
    expect(lrMax(none)).toBe(1);
    expect(continuousLine(1.1, none)).toBeCloseTo(0, 10);
  });

  it('stays a number for an infinite load', () => {
    expect(optionOne(Infinity, STEEL)).toBe(0);
  });
});

describe('the constants of Option 1', () => {
  it('come from the strengths', () => {
    expect(hardening(STEEL)).toBeCloseTo(0.09, 12);
    expect(hardening({ ...STEEL, tensileMPa: 350 })).toBe(0);
    expect(dropStrength(STEEL)).toBeCloseTo(207 / 350, 12);
    expect(dropStrength({ ...STEEL, yieldMPa: 200 })).toBe(0.6);
  });

  it('give a plateau that shortens as the steel gets stronger, never below nothing', () => {
    expect(plateauStrain(300)).toBeGreaterThan(plateauStrain(600));
    expect(plateauStrain(1200)).toBe(0);
    expect(plateauRatio({ ...STEEL, yieldMPa: 1200 })).toBe(1);
  });
});
