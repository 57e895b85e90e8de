import { optionOneLine } from '../fracture/fad/diagram-lines';
import { characterise } from './characterise';
import { limitingExtent } from './limiting-extent';
import { listAssumed } from './list-assumed';
import { number } from './number-text';
import { readNumbers } from './read-numbers';
import { relaxedResidualAt } from './residual-at';
import { diagramMaterial, flawCase } from './flaw-case';
import { judge, type VerdictSubject } from './verdict';
import { given, sampleInput } from './testing/sample-input';

describe('characterise', () => {
  it('adds the allowance to depth and length of a surface flaw', () => {
    expect(
      characterise(sampleInput({ height: 4, allowance: 1, length: 24, lengthAllowance: 2 })),
    ).toEqual({
      kind: 'surface',
      face: 'inside',
      a: 5,
      c: 13,
      ligament: 0,
      height: 5,
      sizedHeight: 5,
      sizedLength: 26,
      recategorised: false,
      neighbourhood: null,
    });
  });

  it('lets the ligament of an embedded flaw shrink by half of the allowance', () => {
    const flaw = characterise(
      sampleInput({ kind: 'embedded', height: 6, allowance: 1, ligament: 8 }),
    );
    expect(flaw).toMatchObject({ kind: 'embedded', a: 3.5, ligament: 7.5, height: 7 });
  });

  it('takes a flaw that touches the face with its allowance as a surface flaw', () => {
    const flaw = characterise(
      sampleInput({ kind: 'embedded', height: 6, allowance: 2, ligament: 0.5 }),
    );
    expect(flaw).toMatchObject({ kind: 'surface', a: 8, recategorised: true });
  });

  it('opens the flaw to the other face when that is the nearer one', () => {
    const flaw = characterise(
      sampleInput({ kind: 'embedded', height: 6, ligament: 18, thickness: 25 }),
    );
    expect(flaw).toMatchObject({ kind: 'surface', face: 'outside' });
  });
});

describe('listAssumed', () => {
  it('finds weak origins at any depth, by path, in an order that no storage can change', () => {
    const input = {
      wall: { thicknessMm: given(25, 'measured') },
      material: {
        yieldMPa: given(250, 'standard default'),
        toughnessMPaSqrtM: given(60, 'assumed'),
      },
      stress: { crackFacePressureMPa: null, primaryMembraneMPa: given(100, 'certificate') },
      list: [given(1, 'code minimum'), given(2, 'assumed')],
    };
    expect(listAssumed(input)).toEqual([
      'list.1',
      'material.toughnessMPaSqrtM',
      'material.yieldMPa',
    ]);
  });
});

describe('readNumbers', () => {
  const data = { a: { value: 3 }, list: [{ x: 1 }, { x: 'two' }], none: null, plain: 7 };

  it('reads a value with its origin, a plain number and every place of a list', () => {
    expect(readNumbers(data, 'a')).toEqual([{ path: 'a', value: 3 }]);
    expect(readNumbers(data, 'plain')).toEqual([{ path: 'plain', value: 7 }]);
    expect(readNumbers(data, 'list.*.x')).toEqual([
      { path: 'list.0.x', value: 1 },
      { path: 'list.1.x', value: Number.NaN },
    ]);
  });

  it('finds nothing behind a null and NaN where something is missing', () => {
    expect(readNumbers(data, 'none.deep')).toEqual([]);
    expect(readNumbers(data, 'gone.deep')).toEqual([{ path: 'gone.deep', value: Number.NaN }]);
    expect(readNumbers(data, 'plain.*.x')).toEqual([{ path: 'plain', value: Number.NaN }]);
  });
});

describe('number', () => {
  it.each([
    [0, '0'],
    [28, '28'],
    [8.6000001, '8.6'],
    [207_000, '207\u202f000'],
    [1_234_567, '1\u202f235\u202f000'],
    [-45.678, '-45.68'],
    [0.00002, '2e-5'],
    [Infinity, 'Infinity'],
  ])('writes %p as %p', (value, text) => {
    expect(number(value)).toBe(text);
  });
});

describe('judge', () => {
  const subject: VerdictSubject = {
    reserveOnLoad: 1.8,
    lr: 0.4,
    lrMax: 1.2,
    kr: 0.4,
    heightMm: 5,
    limitingHeightMm: 15,
    allowanceMm: 1,
  };

  it('accepts with room on load and on size', () => {
    expect(judge(subject).verdict).toBe('acceptable');
  });

  it('is near the limit below a reserve of 1.2, and not at it', () => {
    expect(judge({ ...subject, reserveOnLoad: 1.199 }).verdict).toBe('near the limit');
    expect(judge({ ...subject, reserveOnLoad: 1.2 }).verdict).toBe('acceptable');
  });

  it('is near the limit when less than the sizing allowance is left', () => {
    const { verdict, reasons } = judge({ ...subject, limitingHeightMm: 5.9 });
    expect(verdict).toBe('near the limit');
    expect(reasons[0]).toMatch(/Only 0\.9 mm are left/);
  });

  it('does not accept below a reserve of 1', () => {
    expect(judge({ ...subject, reserveOnLoad: 0.999 }).verdict).toBe('not acceptable');
    expect(judge({ ...subject, reserveOnLoad: 0.9, lr: 1.3 }).reasons[0]).toMatch(/cut-off/);
  });
});

describe('limitingExtent', () => {
  const search = { largest: 20, largestBecause: 'The solution ends.' };

  it('finds the first height on the line', () => {
    expect(limitingExtent({ ...search, margin: (h) => 7 - h }).extent).toBeCloseTo(7, 7);
  });

  it('gives the end of the solution with its reason when the line is not reached', () => {
    expect(limitingExtent({ ...search, margin: () => 1 })).toEqual({
      extent: 20,
      because: 'The solution ends.',
    });
  });

  it('gives none when even a very small flaw is outside', () => {
    expect(limitingExtent({ ...search, margin: () => -1 }).extent).toBeNull();
    expect(limitingExtent({ ...search, margin: () => Number.NaN }).extent).toBeNull();
  });
});

describe('the residual stress at a factor on the load', () => {
  const input = sampleInput({ residual: { state: 'as-welded' } });
  const flaw = flawCase(input, optionOneLine(diagramMaterial(input)));

  it('is not relaxed by a load that never came', () => {
    expect(relaxedResidualAt(flaw, 300, 2)).toBe(relaxedResidualAt(flaw, 300, 1));
  });

  it('is higher at a lower load', () => {
    expect(relaxedResidualAt(flaw, 300, 0.5)).toBeGreaterThan(relaxedResidualAt(flaw, 300, 1));
    expect(relaxedResidualAt(flaw, 300, 0)).toBe(350);
  });
});
