import fc from 'fast-check';
import { continuousLine, lrMax, optionOne, plateauLine, type DiagramMaterial } from './option-one';
import { optionOneLine } from './option-one-line';

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

describe('the drawn line', () => {
  it('runs from the axis to the cut-off and down', () => {
    const line = optionOneLine(STEEL);
    expect(line).toHaveLength(62);
    expect(line[0]).toEqual({ lr: 0, kr: 1 });
    expect(line[61]).toEqual({ lr: lrMax(STEEL), kr: 0 });
  });

  it('has both ends of the jump with a yield plateau', () => {
    const line = optionOneLine({ ...STEEL, yieldPlateau: true });
    const [before, at, end] = line.slice(-3);
    expect(before?.kr).toBeCloseTo(0.8165, 4);
    expect(at?.kr).toBeCloseTo(0.2543, 3);
    expect(end).toEqual({ lr: 1, kr: 0 });
  });
});
