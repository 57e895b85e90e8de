import type { Given } from '../../units/provenance';
import { strengthAtTemperature } from './strength-at-temperature';

const given = (value: number): Given => ({ value, provenance: 'certificate', note: '' });
const STEEL = { yieldMPa: given(350), tensileMPa: given(500) };

describe('strength at a temperature', () => {
  it('rises in the cold', () => {
    expect(strengthAtTemperature({ ...STEEL, temperatureC: -100 })).toMatchObject({
      status: 'found',
      yieldMPa: expect.closeTo(482.5434, 4),
      tensileMPa: expect.closeTo(610.5326, 4),
      provenance: 'certificate',
    });
  });

  it('is that given at room temperature', () => {
    expect(strengthAtTemperature({ ...STEEL, temperatureC: 20 })).toMatchObject({
      yieldMPa: 350,
      tensileMPa: 500,
    });
  });

  it.each([
    [20.1, 'temperatureC'],
    [-200, 'temperatureC'],
    [Number.NaN, 'temperatureC'],
  ])('is refused at %d °C', (temperatureC, input) => {
    expect(strengthAtTemperature({ ...STEEL, temperatureC })).toMatchObject({
      status: 'refused',
      refusals: [{ input }],
    });
  });

  it('is refused for strengths that are swapped', () => {
    const swapped = { yieldMPa: given(500), tensileMPa: given(350), temperatureC: 0 };
    expect(strengthAtTemperature(swapped)).toMatchObject({ refusals: [{ input: 'tensileMPa' }] });
  });
});
