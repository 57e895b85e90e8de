import { numberText, quantityText } from './quantity-text';

describe('quantityText', () => {
  it('sets the unit behind a narrow space that does not break', () => {
    expect(quantityText(4.64, 'mm')).toBe('4.6\u202fmm');
  });

  it('is a dash where there is no number', () => {
    expect([null, undefined, NaN, Infinity].map((value) => quantityText(value, 'mm'))).toEqual([
      '—',
      '—',
      '—',
      '—',
    ]);
  });

  it('shows zero as a number', () => {
    expect(quantityText(0, 'MPa')).toBe('0\u202fMPa');
    expect(quantityText(0.98, '', 2)).toBe('0.98');
  });
});

describe('numberText', () => {
  it.each([
    [1234567.891, 2, '1\u202f234\u202f567.89'],
    [-5.5, 1, '−5.5'],
    [25, 3, '25'],
  ])('writes %p to %p decimals as %p', (value, digits, text) => {
    expect(numberText(value, digits)).toBe(text);
  });
});
