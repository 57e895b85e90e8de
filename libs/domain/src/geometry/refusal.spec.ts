import { outOfBounds, refused, type NumberRule } from './refusal';

const rule = (value: number, above = false): NumberRule => ({
  input: 'hole.radiusMm',
  name: 'Hole radius',
  unit: 'mm',
  value,
  min: 0,
  max: 100,
  above,
  instead: 'Give it in millimetres.',
});

describe('bounds of a number', () => {
  it('are met at both ends, unless the lower end is excluded', () => {
    expect(outOfBounds([rule(0), rule(100), rule(50, true)])).toEqual([]);
    expect(outOfBounds([rule(0, true)])).toHaveLength(1);
  });

  it.each([-1, 101, Number.NaN, Infinity, -Infinity])('are broken by %d', (value) => {
    expect(outOfBounds([rule(value)])).toHaveLength(1);
  });

  it('name input, limit and value', () => {
    expect(outOfBounds([rule(5000)])).toEqual([
      {
        input: 'hole.radiusMm',
        limit: 'at least 0 and at most 100 mm',
        value: 5000,
        message: 'Hole radius is 5000 mm; it must be at least 0 and at most 100 mm.',
        instead: 'Give it in millimetres.',
      },
    ]);
  });

  it('are said without roundings', () => {
    const [refusal] = outOfBounds([{ ...rule(-(0.1 + 0.2)), max: 1 / 3 }]);
    expect(refusal?.message).toBe(
      'Hole radius is -0.3 mm; it must be at least 0 and at most 0.333333 mm.',
    );
    expect(refusal?.value).toBe(-(0.1 + 0.2));
  });

  it('say what is not a number', () => {
    const [refusal] = outOfBounds([rule(Number.NaN, true)]);
    expect(refusal?.value).toBe('NaN');
    expect(refusal?.message).toMatch(/not a number/);
  });
});

describe('a refusal', () => {
  it('holds its reasons', () => {
    const reasons = outOfBounds([rule(-1), rule(1000)]);
    expect(refused(...reasons)).toEqual({ status: 'refused', refusals: reasons });
  });
});
