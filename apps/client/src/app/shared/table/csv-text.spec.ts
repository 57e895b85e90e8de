import { csvText } from './csv-text';

describe('csvText', () => {
  const lines = (text: string) => text.slice(1).split('\r\n');

  it('starts with a byte order mark and a heading row', () => {
    const text = csvText(['depth a [mm]', 'state'], [[4.6, 'open']]);
    expect(text.charCodeAt(0)).toBe(0xfeff);
    expect(lines(text)).toEqual(['depth a [mm],state', '4.6,open', '']);
  });

  it('quotes commas, quotes and line breaks', () => {
    expect(lines(csvText(['a'], [['say "no", twice']]))[1]).toBe('"say ""no"", twice"');
    expect(csvText(['a'], [['two\nlines']])).toContain('"two\nlines"');
  });

  it.each(['=1+1', '+1', '-1+cmd', '@x', '\tx'])('disarms the text %j', (text) => {
    expect(csvText(['a'], [[text]])).toContain(`'${text}`);
  });

  it('keeps negative numbers numbers and leaves out what is none', () => {
    expect(lines(csvText(['a', 'b', 'c'], [[-1.5, NaN, null]]))[1]).toBe('-1.5,,');
  });
});
