import { CHECK_ROWS, evaluateChecks } from '@ligament/domain/verification/checks';

const results = evaluateChecks();

describe('the engine against published values', () => {
  it.each(results.map((result) => [`${result.group}: ${result.quantity}`, result] as const))(
    '%s',
    (_, { computed, deviation, tolerance, met }) => {
      expect(Number.isFinite(computed)).toBe(true);
      expect(Math.abs(deviation)).toBeLessThanOrEqual(tolerance);
      expect(met).toBe(true);
    },
  );

  it('has an identity and a source for every value', () => {
    expect(new Set(CHECK_ROWS.map(({ id }) => id)).size).toBe(CHECK_ROWS.length);
    for (const { source } of CHECK_ROWS) expect(source.length).toBeGreaterThan(3);
  });

  it('covers every step of the computation', () => {
    expect([...new Set(CHECK_ROWS.map(({ group }) => group))]).toEqual([
      'Units',
      'Stress from pressure',
      'Characterisation',
      'Stress raisers',
      'Crack-tip field',
      'Stress intensity',
      'Stress intensity against finite elements',
      'Reference stress',
      'Toughness',
      'Failure assessment diagram',
      'Crack growth',
      'Limiting size',
      'Probability',
      'Intervals',
      'End to end',
    ]);
  });

  it('says from memory where a standard was not opened', () => {
    for (const { kind, source } of CHECK_ROWS) {
      if (kind === 'from memory') expect(source).toMatch(/from memory|secondary source/);
    }
  });
});
