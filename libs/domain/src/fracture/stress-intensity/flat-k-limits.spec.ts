import { checkLimit } from '../../geometry/limit';
import { crackOf, type CrackSymbols } from '../../verification/crack-of';
import { FLAT_K_SOLUTIONS } from './flat-k-solutions';

/** Limits a crack breaks, by name. */
function broken(key: string, symbols: CrackSymbols): readonly string[] {
  const solution = FLAT_K_SOLUTIONS.find((one) => one.key === key);
  if (!solution) throw new Error(`no solution ${key}`);
  const crack = crackOf(symbols);
  return solution.limits
    .map((limit) => checkLimit(limit, crack))
    .flatMap(({ met, name }) => (met ? [] : [name]));
}

// one crack inside every limit of its solution, and what is changed to leave them one by one
const CASES: readonly (readonly [
  key: string,
  inside: CrackSymbols,
  changes: readonly (readonly [Partial<CrackSymbols>, readonly string[]])[],
])[] = [
  [
    'plate-through-wall',
    { a: 10, c: 20, t: 10, W: 100 },
    [
      [{ c: 45 }, []],
      [{ c: 46 }, ['2c/W']],
      [{ W: Infinity }, []],
    ],
  ],
  [
    'plate-edge',
    { a: 20, c: 20, t: 10, W: 100 },
    [
      [{ a: 90 }, []],
      [{ a: 91 }, ['a/W']],
    ],
  ],
  [
    'plate-extended-surface',
    { a: 2, c: 500, t: 10 },
    [
      [{ a: 9 }, []],
      [{ a: 9.1 }, ['a/t']],
    ],
  ],
  [
    'plate-extended-surface-held',
    { a: 2, c: 500, t: 10, Ri: 100 },
    [
      [{ a: 8.1 }, ['a/t']],
      [{ Ri: 90 }, ['Ri/t']],
      [{ Ri: Infinity }, []],
    ],
  ],
  [
    'plate-corner',
    { a: 2, c: 4, t: 10, W: 100 },
    [
      [{ c: 11 }, ['a/c']],
      [{ c: 0.9 }, ['a/c']],
      [{ a: 8.2 }, ['a/c', 'a/t']],
      [{ W: 7 }, ['c/W']],
    ],
  ],
  [
    'hole-corner-one',
    { a: 2, c: 4, t: 10, r: 10, W: 100 },
    [
      [{ a: 8.1, c: 5 }, ['a/t']],
      [{ r: 4 }, ['r/t']],
      [{ r: 20.5 }, ['r/t']],
      [{ W: 50 }, ['2(r + c)/W']],
      [{ c: 12 }, ['a/c']],
    ],
  ],
  [
    'hole-surface-two',
    { a: 2, c: 4, t: 20, r: 10, W: 100 },
    [
      [{ a: 8.1, c: 5 }, ['2a/t']],
      [{ r: 4 }, ['2r/t']],
      [{ W: 50 }, ['2(r + c)/W']],
    ],
  ],
  [
    'hole-through-two',
    { a: 10, c: 4, t: 10, r: 10, W: 100 },
    [
      [{ c: 16 }, ['2(r + c)/W']],
      [{ W: Infinity, c: 500 }, []],
    ],
  ],
  [
    'nozzle-corner',
    { a: 10, c: 10, t: 50 },
    [
      [{ a: 26, c: 26 }, ['a/t']],
      [{ c: 26 }, ['a/c', 'a/t']],
      [{ c: 4 }, ['a/c']],
    ],
  ],
  [
    'bar-ring',
    { a: 4, c: 4, t: 20 },
    [
      [{ a: 8 }, []],
      [{ a: 8.1 }, ['a/t']],
    ],
  ],
  [
    'bar-penny',
    { a: 4, c: 4, t: 20, p: 6 },
    [
      [{ c: 8.1 }, ['a/b']],
      [{ p: 0.9 }, ['a/b']],
      [{ p: 11.1 }, ['a/b']],
    ],
  ],
];

describe.each(CASES)('the limits of %s', (key, inside, changes) => {
  it('hold a usual crack', () => {
    expect(broken(key, inside)).toEqual([]);
  });

  it.each(changes)('for %j: %j', (change, names) => {
    expect(broken(key, { ...inside, ...change })).toEqual(names);
  });

  it('are broken by a size that is not a number', () => {
    expect(broken(key, { ...inside, a: Number.NaN, c: Number.NaN })).not.toEqual([]);
  });
});
