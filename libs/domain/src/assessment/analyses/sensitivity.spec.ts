import type { SensitivityRow } from './sensitivity';
import { sensitivity } from './sensitivity';
import { given, sampleInput, type Variation } from '../testing/sample-input';

function rowsOf(variation: Variation = {}): ReadonlyMap<string, SensitivityRow> {
  const found = sensitivity(sampleInput(variation));
  if (found.status === 'refused') throw new Error('refused');
  return new Map(found.rows.map((row) => [row.name, row]));
}

describe('sensitivity of the verdict', () => {
  it('says which way each input moves it', () => {
    const rows = rowsOf({
      residual: { state: 'entered', membraneMPa: given(80), bendingMPa: given(0) },
    });
    const falls = ['Flaw height', 'Primary membrane stress', 'Residual membrane stress'];
    for (const name of falls) {
      const row = rows.get(name);
      expect(row?.low.reserveOnLoad).toBeGreaterThan(row?.high.reserveOnLoad ?? Infinity);
    }
    for (const name of ['Fracture toughness', 'Yield strength', 'Wall thickness']) {
      const row = rows.get(name);
      expect(row?.low.reserveOnLoad).toBeLessThan(row?.high.reserveOnLoad ?? -Infinity);
    }
  });

  it('moves life and not the verdict by what only makes the flaw grow', () => {
    const found = sensitivity(sampleInput());
    if (found.status === 'refused') throw new Error('refused');
    for (const name of ['Growth law coefficient', 'Cycles per year']) {
      const row = found.rows.find((each) => each.name === name);
      expect(row?.low.reserveOnLoad).toBe(found.reserveOnLoad);
      expect(row?.low.years).toBeGreaterThan(row?.high.years ?? Infinity);
    }
  });

  it('halves the life when the flaw grows twice as fast', () => {
    const row = rowsOf({ toughness: 50, cycles: 40_000, horizon: 100 }).get(
      'Growth law coefficient',
    );
    expect((row?.low.years ?? 0) / (row?.high.years ?? 1)).toBeCloseTo(4, 1);
  });

  it('has the strongest input first and always the same order', () => {
    const found = sensitivity(sampleInput());
    if (found.status === 'refused') throw new Error('refused');
    expect(sensitivity(sampleInput())).toEqual(found);
    expect(found.rows.length).toBeGreaterThan(5);
  });

  it('gives no figure where the changed case has no verdict', () => {
    const rows = rowsOf({ height: 15.8, allowance: 4, thickness: 25, membrane: 40 });
    expect(rows.get('Flaw height')?.high.reserveOnLoad).toBeNull();
  });

  it('moves nothing that the case does not have', () => {
    const rows = rowsOf({ cycles: 0, allowance: 0 });
    expect(rows.has('Growth law coefficient')).toBe(false);
    expect(rows.has('Flaw height')).toBe(false);
    expect(rows.has('Primary bending stress')).toBe(false);
    expect(rowsOf({ cycles: 0, stressCorrosion: 0.5 }).has('Stress corrosion rate')).toBe(true);
  });

  it('answers a case without verdict with its refusal', () => {
    expect(sensitivity(sampleInput({ height: 30 })).status).toBe('refused');
  });
});
