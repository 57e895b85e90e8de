import { fromFahrenheit } from '@ligament/domain/units/convert';
import { MM_PER, MPA_PER } from '@ligament/domain/units/exact-factors';
import { unit } from 'mathjs';

// mathjs keeps its own table of units; its psi is rounded to fifteen figures, hence the tolerance.
const RELATIVE_TOLERANCE = 1e-9;
const LENGTHS = { mm: 'mm', cm: 'cm', m: 'm', in: 'inch', mil: 'mil' } as const;
const STRESSES = {
  MPa: 'MPa',
  'N/mm²': 'N/mm^2',
  bar: 'bar',
  psi: 'psi',
  ksi: 'kpsi',
} as const;

describe('unit factors against an independent table (mathjs 15)', () => {
  it('has a counterpart for every unit', () => {
    expect(Object.keys(LENGTHS).sort()).toEqual(Object.keys(MM_PER).sort());
    expect(Object.keys(STRESSES).sort()).toEqual(Object.keys(MPA_PER).sort());
  });

  it.each(Object.entries(LENGTHS) as [keyof typeof MM_PER, string][])(
    'mm in one %s',
    (own, theirs) => {
      const ratio = MM_PER[own] / unit(1, theirs).toNumber('mm');
      expect(Math.abs(ratio - 1)).toBeLessThanOrEqual(RELATIVE_TOLERANCE);
    },
  );

  it.each(Object.entries(STRESSES) as [keyof typeof MPA_PER, string][])(
    'MPa in one %s',
    (own, theirs) => {
      // kpsi has no entry of its own there: a thousand psi
      const value = theirs === 'kpsi' ? unit(1000, 'psi') : unit(1, theirs);
      expect(Math.abs(MPA_PER[own] / value.toNumber('MPa') - 1)).toBeLessThanOrEqual(
        RELATIVE_TOLERANCE,
      );
    },
  );

  it.each([-40, 32, 212, 700])('°C at %d °F', (fahrenheit) => {
    expect(fromFahrenheit(fahrenheit)).toBeCloseTo(unit(fahrenheit, 'degF').toNumber('degC'), 9);
  });
});
