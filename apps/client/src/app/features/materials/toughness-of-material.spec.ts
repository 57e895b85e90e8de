import { toughnessKnown, withToughness } from './toughness-of-material';

const HELD = {
  name: 'A516-70',
  yieldMpa: 285,
  tensileMpa: null,
  toughnessTemperatureC: 20,
  origins: { yieldMpa: { provenance: 'certificate', note: '4711' } },
};

describe('the toughness of a material by its source', () => {
  it('knows what the form holds, with its origin; what is empty stays open', () => {
    const { numbers } = toughnessKnown(HELD);
    expect(numbers.yieldMPa).toEqual({ value: 285, provenance: 'certificate', note: '4711' });
    expect(numbers.temperatureC?.value).toBe(20);
    expect(numbers.tensileMPa).toEqual({ value: Number.NaN, provenance: 'assumed', note: '' });
  });

  it('takes over value, origin and temperature and leaves the rest', () => {
    const given = { value: 75.8, provenance: 'measured' as const, note: 'Critical J' };
    expect(withToughness(HELD, { given, temperatureC: -20 })).toEqual({
      ...HELD,
      toughnessMpaSqrtM: 75.8,
      toughnessTemperatureC: -20,
      origins: {
        ...HELD.origins,
        toughnessMpaSqrtM: { provenance: 'measured', note: 'Critical J' },
      },
    });
  });
});
