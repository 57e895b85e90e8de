import { crackOf } from '../../verification/crack-of';
import { brokenLimits } from './broken-limits';
import { PLATE_SURFACE_LIMITS } from './plate-surface-k';

describe('the limits a crack breaks', () => {
  it('are none for a crack within them', () => {
    expect(brokenLimits(PLATE_SURFACE_LIMITS, crackOf({ a: 4, c: 10, t: 10 }))).toEqual([]);
  });

  it('are told each with input, limit, value and what to do', () => {
    const [aspect, depth] = brokenLimits(PLATE_SURFACE_LIMITS, crackOf({ a: 9, c: 3, t: 10 }));
    expect(aspect?.input).toBe('flaw.lengthMm');
    expect(aspect?.value).toBe(3);
    expect(depth).toMatchObject({
      input: 'flaw.heightMm',
      limit: 'a/t ≤ 0.8',
      value: 0.9,
      message: 'a/t is 0.9; the solution holds for a/t ≤ 0.8.',
    });
    expect(depth?.instead).not.toBe('');
  });

  it('hold a value that is no number as text', () => {
    const broken = brokenLimits(PLATE_SURFACE_LIMITS, crackOf({ a: Number.NaN, c: 3, t: 10 }));
    expect(broken.map(({ value }) => value)).toContain('NaN');
  });
});
