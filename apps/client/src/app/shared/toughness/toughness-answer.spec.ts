import { foundFromMPaSqrtM } from '@ligament/domain/fracture/toughness/toughness-result';
import { answerOf, roundedDown } from './toughness-answer';

const found = (value: number, source = 'BS 7910') =>
  foundFromMPaSqrtM(value, {
    method: 'Critical J',
    formula: '',
    source,
    inputs: [],
    given: [{ value, provenance: 'code minimum', note: '' }],
    temperatureC: -20,
  });

describe('answerOf', () => {
  it('rounds to three figures, never upwards, and keeps a round value', () => {
    expect([94.39, 123.99, 9.9999, 200, 36.5].map(roundedDown)).toEqual([
      94.3, 123, 9.99, 200, 36.5,
    ]);
    expect(answerOf(found(200)).given.value).toBe(200);
  });

  it('says method, temperature and source, with the origin', () => {
    expect(answerOf(found(94.39))).toEqual({
      given: { value: 94.3, provenance: 'code minimum', note: 'Critical J at -20 °C; BS 7910' },
      temperatureC: -20,
    });
  });

  it('keeps the note to 500 characters', () => {
    expect(answerOf(found(90, 'x'.repeat(900))).given.note).toHaveLength(500);
  });
});
