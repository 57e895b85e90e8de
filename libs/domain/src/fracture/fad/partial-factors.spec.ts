import { applyPartialFactors, choosePartialFactors } from './choose-partial-factors';
import { PARTIAL_FACTORS, TARGET_PROBABILITIES } from './partial-factor-table';

const SCATTER = { stress: 0.1, size: 0.2, toughness: 0.2, yield: 0.1 };
const INPUTS = {
  primaryMPa: [200, 20],
  heightMm: 5,
  lengthMm: 40,
  toughness: 3000,
  yieldMPa: 350,
  tensileMPa: 500,
};

describe('the table of partial factors', () => {
  it('asks for more at a smaller target and at more scatter', () => {
    for (const { factors } of PARTIAL_FACTORS) {
      expect([...factors].sort((a, b) => a - b)).toEqual(factors);
      expect(factors).toHaveLength(TARGET_PROBABILITIES.length);
    }
    for (const { on, variation, factors } of PARTIAL_FACTORS) {
      const less = PARTIAL_FACTORS.filter((row) => row.on === on && row.variation < variation);
      for (const row of less)
        row.factors.forEach((f, i) => expect(factors[i]).toBeGreaterThanOrEqual(f));
    }
  });

  it('says that it is from memory', () => {
    for (const { source } of PARTIAL_FACTORS) expect(source).toMatch(/from memory/);
  });
});

describe('the choice of partial factors', () => {
  it('takes the column of the target and the rows of the scatter', () => {
    expect(choosePartialFactors(1e-3, SCATTER)).toMatchObject({
      status: 'found',
      factors: { stress: 1.2, size: 1.45, toughness: 1.8, yield: 1.05 },
    });
  });

  it('takes the next row of more scatter between two', () => {
    expect(choosePartialFactors(1e-5, { ...SCATTER, stress: 0.15, yield: 0 })).toMatchObject({
      factors: { stress: 1.4, yield: 1.2 },
    });
  });

  it('reads the site’s own table', () => {
    const own = PARTIAL_FACTORS.map((row) => ({ ...row, factors: [2, 2, 2, 2] as const }));
    expect(choosePartialFactors(7e-5, SCATTER, own)).toMatchObject({ factors: { size: 2 } });
  });

  it('refuses a factor of the site’s own that is less than 1 or none', () => {
    const own = PARTIAL_FACTORS.map((row) => ({
      ...row,
      factors: [1, 0.9, Number.NaN, 1] as const,
    }));
    const chosen = choosePartialFactors(7e-5, SCATTER, own);
    expect(chosen.status).toBe('refused');
    if (chosen.status === 'refused') expect(chosen.refusals).toHaveLength(8);
  });

  it.each([0.31, -0.1, Number.NaN, Infinity])('refuses a scatter of %d by name', (stress) => {
    const chosen = choosePartialFactors(1e-3, { ...SCATTER, stress });
    expect(chosen).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'partialFactors.stress.variation', limit: 'from 0 to 0.3' }],
    });
  });

  it('refuses a target the table has no column for', () => {
    expect(choosePartialFactors(0.01 as 0.001, SCATTER)).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'partialFactors.target', value: 0.01 }],
    });
  });
});

describe('the inputs with partial factors', () => {
  it('are kept as entered beside what the assessment takes', () => {
    const factors = { stress: 1.2, size: 1.5, toughness: 2, yield: 1.25 };
    const { entered, applied } = applyPartialFactors(INPUTS, factors);
    expect(entered).toBe(INPUTS);
    expect(applied).toEqual({
      primaryMPa: [240, 24],
      heightMm: 7.5,
      lengthMm: 60,
      toughness: 1500,
      yieldMPa: 280,
      tensileMPa: 400,
    });
  });

  it('are not changed by factors of 1', () => {
    const ones = { stress: 1, size: 1, toughness: 1, yield: 1 };
    expect(applyPartialFactors(INPUTS, ones).applied).toEqual(INPUTS);
  });
});
