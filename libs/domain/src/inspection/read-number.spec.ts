import fc from 'fast-check';
import { detectDecimalMark, mayBeThousands, readNumber } from './read-number';

const value = (cell: string, mark: '.' | ',' = '.') => {
  const result = readNumber(cell, mark);
  return result.state === 'number' ? result.read : result.state;
};

describe('readNumber', () => {
  it.each([
    ['7.6', '.', 7.6],
    ['7,6', ',', 7.6],
    ['1.250,5', ',', 1250.5],
    ['1,250.5', '.', 1250.5],
    ['1 250', '.', 1250],
    ['-1.0', '.', -1],
    ['−2', '.', -2],
    ['+6', '.', 6],
    ['.5', '.', 0.5],
    ['５.２', '.', 5.2],
  ] as const)('reads %s with the decimal mark %s', (cell, mark, number) => {
    expect(value(cell, mark)).toEqual({ value: number, qualifier: '=', unit: null });
  });

  it.each(['', '-', '—', 'N/A', 'n/a', '?', 'nil', 'k.A.'])(
    'takes %s as missing, never as 0',
    (cell) => {
      expect(value(cell)).toBe('missing');
    },
  );

  it.each([
    ['<2', 2, '<', null],
    ['≤ 3', 3, '<', null],
    ['>25', 25, '>', null],
    ['~6', 6, '~', null],
    ['2-3', 3, '<', null],
    ['4-2', 4, '<', null],
    ['2.0 mm', 2, '=', 'mm'],
    ['0.12in', 0.12, '=', 'in'],
    ['1.5"', 1.5, '=', 'in'],
    ['40 mil', 40, '=', 'mil'],
  ] as const)('keeps what stands beside the number in %s', (cell, number, qualifier, unit) => {
    expect(value(cell)).toEqual({ value: number, qualifier, unit });
  });

  it.each(['1.250,5', '7,6', '0x10', '1e3', 'abc', '1e999'])('does not guess %s', (cell) => {
    expect(value(cell)).toBe('unreadable');
  });

  it('never throws and never gives what is no number, whatever the cell holds', () => {
    fc.assert(
      fc.property(fc.string(), fc.constantFrom('.' as const, ',' as const), (cell, mark) => {
        const result = readNumber(cell, mark);
        return result.state !== 'number' || Number.isFinite(result.read.value);
      }),
    );
  });
});

describe('mayBeThousands', () => {
  it.each([
    ['75,250', '.', true],
    ['<75,250 mm', '.', true],
    ['1.250', ',', true],
    ['1,250.5', '.', false],
    ['0,250', '.', false],
    ['75.250', '.', false],
    ['1,250,000', '.', false],
  ] as const)('of %s in a file with %s: %s', (cell, mark, doubtful) => {
    expect(mayBeThousands(cell, mark)).toBe(doubtful);
  });
});

describe('detectDecimalMark', () => {
  it('sees the comma where numbers use it, even beside grouped thousands', () => {
    expect(detectDecimalMark(['1.250,5', '7,6', '20,4', '74'])).toMatchObject({
      mark: ',',
      comma: 3,
    });
  });

  it('sees the point otherwise', () => {
    expect(detectDecimalMark(['7.6', '1,250', '74'])).toMatchObject({ mark: '.', point: 1 });
  });
});
