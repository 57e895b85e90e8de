import type { GrowthLawView } from '@ligament/domain/contract/growth-laws';
import { decade, lawChart, lawTwin } from './law-chart';
import { formValueOf, lawBodyOf, lawFields } from './law-form-value';

const law = (over: Partial<GrowthLawView> = {}): GrowthLawView => ({
  id: '5e0d8c52-7f0f-4b59-9f0b-0d6a3c2f1a11',
  key: 'steel-air-simplified',
  title: 'Steel, air, simplified',
  environment: 'air',
  stages: [{ coefficient: 5.21e-13, exponent: 3 }],
  thresholdMpaSqrtMm: 63,
  source: 'a test',
  version: 1,
  ...over,
});

interface Line {
  readonly data: readonly (readonly [number, number])[];
  readonly lineStyle: { readonly color: string };
  readonly endLabel: { readonly show: boolean };
}
const lines = (laws: readonly GrowthLawView[], chosen?: string) =>
  lawChart(laws, chosen)['series'] as readonly Line[];

describe('the diagram of growth laws', () => {
  it('begins each line at its threshold', () => {
    const [drawn] = lines([law()]);
    expect(drawn?.data[0]?.[0]).toBe(63);
    expect(drawn?.data[0]?.[1]).toBeCloseTo(5.21e-13 * 63 ** 3, 15);
    expect(drawn?.data.at(-1)?.[0]).toBeCloseTo(3000, 6);
  });

  it('draws out the chosen law only', () => {
    const other = law({ id: 'other', key: 'other' });
    const [first, second] = lines([law(), other], 'other');
    expect([first?.endLabel.show, second?.endLabel.show]).toEqual([false, true]);
    expect(second?.lineStyle.color).toBe('var(--steel)');
  });

  it('reads the laws off at round ranges, nothing below the threshold', () => {
    const twin = lawTwin([law()]);
    expect(twin.columns.map(({ label }) => label)).toEqual(['ΔK', 'steel-air-simplified']);
    expect(twin.rows[0]).toEqual([50, '0.00e+0']);
    expect(twin.rows[4]).toEqual([1000, '5.21e-4']);
  });

  it.each([
    [1, '1'],
    [0.001, '10⁻³'],
    [1e-10, '10⁻¹⁰'],
    [100, '10²'],
  ])('writes the decade %p as %p', (value, text) => {
    expect(decade(value)).toBe(text);
  });
});

describe('the form of a growth law', () => {
  const two = law({
    stages: [
      { coefficient: 2.1e-17, exponent: 5.1 },
      { coefficient: 1.29e-12, exponent: 2.88 },
    ],
  });

  it('holds each piece in fields of its own and puts them together again', () => {
    const value = formValueOf(two);
    expect(value).toMatchObject({ coefficient2: 1.29e-12, exponent2: 2.88 });
    expect(lawBodyOf(value)['stages']).toEqual(two.stages);
    expect(lawBodyOf(formValueOf(law()))['stages']).toEqual(law().stages);
  });

  it('asks for the key of a new law only', () => {
    expect(lawFields(true).map(({ name }) => name)).toContain('key');
    expect(lawFields(false).map(({ name }) => name)).not.toContain('key');
  });
});
