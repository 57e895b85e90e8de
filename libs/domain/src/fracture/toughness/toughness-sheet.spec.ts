import type { Given, Provenance } from '../../units/provenance';
import { toMPaSqrtM } from '../../units/convert';
import { toughnessAt, type ToughnessBasis } from './find-toughness';
import { REFERENCE_CURVES, type ReferenceCurve } from './from-reference-curve';
import type { FoundToughness } from './toughness-result';

const given = (value: number, provenance: Provenance = 'certificate'): Given => ({
  value,
  provenance,
  note: 'report',
});
const ELASTIC = { youngsModulusMPa: 207_000, poissonsRatio: 0.3 };

function found(basis: ToughnessBasis, temperatureC = 0): FoundToughness {
  const answer = toughnessAt(basis, temperatureC);
  if (answer.status === 'refused') throw new Error(answer.refusals[0]?.message);
  return answer;
}

const masterCurve = (
  from: 'T0' | 'T27J' | 'T40J',
  form: 'BS 7910' | 'ASTM E1921',
  allowanceC: number | null = null,
): ToughnessBasis => ({
  method: 'master curve',
  curve: {
    reference: { from, valueC: given(-10, 'assumed') },
    thicknessMm: 30,
    probability: 0.05,
    allowanceC,
    yieldMPa: 355,
    form,
  },
});
const referenceCurve = (curve: ReferenceCurve): ToughnessBasis => ({
  method: 'reference curve',
  curve: { curve, referenceC: given(-10, 'code minimum') },
});
const BASES: readonly (readonly [name: string, basis: ToughnessBasis, steps: readonly string[]])[] =
  [
    [
      'a plane-strain test',
      {
        method: 'KIc',
        test: {
          kQMPaSqrtM: given(45),
          yieldMPa: 500,
          crackLengthMm: 25,
          thicknessMm: 25,
          ligamentMm: 25,
          loadRatio: 1,
          temperatureC: 0,
        },
      },
      ['Least crack length, thickness and ligament', 'Plane-strain fracture test'],
    ],
    [
      'a critical J',
      { method: 'J', test: { jNPerMm: given(80), temperatureC: 0, ...ELASTIC } },
      ['Critical J'],
    ],
    [
      'a critical CTOD',
      {
        method: 'CTOD',
        test: { ctodMm: given(0.1), yieldMPa: 355, tensileMPa: 490, temperatureC: 0, ...ELASTIC },
      },
      ['Factor on CTOD', 'Critical CTOD'],
    ],
    [
      'Charpy energy',
      { method: 'Charpy', test: { energyJ: given(27), thicknessMm: 25, temperatureC: 0 } },
      ['Transition', 'Upper shelf', 'Lower bound from Charpy energy'],
    ],
    [
      'T27J',
      masterCurve('T27J', 'BS 7910'),
      ['Reference temperature', 'Master curve, 5 % fractile'],
    ],
    [
      'T40J',
      masterCurve('T40J', 'BS 7910'),
      ['Reference temperature', 'Master curve, 5 % fractile'],
    ],
    [
      'T0',
      masterCurve('T0', 'ASTM E1921'),
      ['Reference temperature', 'Master curve, 5 % fractile'],
    ],
    ...(Object.keys(REFERENCE_CURVES) as ReferenceCurve[]).map(
      (curve) =>
        [`the ${curve} curve`, referenceCurve(curve), [REFERENCE_CURVES[curve].method]] as const,
    ),
  ];

describe.each(BASES)('the sheet of a toughness from %s', (_, basis, steps) => {
  const result = found(basis);

  it('lists its steps in order, the last with the value itself', () => {
    expect(result.steps.map(({ name }) => name)).toEqual(steps);
    const last = result.steps.at(-1);
    expect(last?.symbol).toBe('Kmat');
    expect(last?.unit).toBe('MPa·√m');
    expect(last?.value).toBe(toMPaSqrtM(result.kMatMPaSqrtMm));
  });

  it('has a formula, a source and inputs in every step that has any', () => {
    for (const { formula, source, value } of result.steps) {
      expect(formula.length).toBeGreaterThan(4);
      expect(source).toMatch(/from memory|ASTM|JCSS/);
      expect(Number.isFinite(value)).toBe(true);
    }
    expect(result.steps.at(-1)?.inputs.length).toBeGreaterThan(0);
  });

  it('says where a standard was not opened', () => {
    expect(result.source).toMatch(/from memory/);
  });
});

describe('the origin of a toughness', () => {
  it('is that of the input it rests on', () => {
    expect(found(masterCurve('T0', 'BS 7910')).provenance).toBe('assumed');
    expect(found(referenceCurve('arrest')).provenance).toBe('code minimum');
  });
});

describe('the allowance on a reference temperature', () => {
  it('is none for fracture tests and 25 °C for Charpy tests, unless one is given', () => {
    const allowanceOf = (basis: ToughnessBasis) =>
      found(basis)
        .steps.at(-1)
        ?.inputs.find((input) => input.startsWith('Tk'));
    expect(allowanceOf(masterCurve('T0', 'BS 7910'))).toBe('Tk = 0 °C');
    expect(allowanceOf(masterCurve('T27J', 'BS 7910'))).toBe('Tk = 25 °C');
    expect(allowanceOf(masterCurve('T27J', 'BS 7910', 14))).toBe('Tk = 14 °C');
  });

  it('lowers the toughness', () => {
    const at = (allowance: number) => found(masterCurve('T0', 'BS 7910', allowance)).kMatMPaSqrtMm;
    expect(at(25)).toBeLessThan(at(10));
    expect(at(10)).toBeLessThan(at(0));
  });
});

describe('the cautions of a toughness', () => {
  it('speak of what the method does not see', () => {
    expect(found(masterCurve('T0', 'BS 7910')).cautions.join()).toMatch(/upper shelf/);
    expect(found(referenceCurve('exemption')).cautions.join()).toMatch(/hydrogen/);
    expect(found(referenceCurve('initiation')).cautions).toEqual([]);
  });

  it('speak of a temperature above that of the test', () => {
    const [, basis] = BASES[3] ?? [];
    if (!basis) throw new Error('no basis');
    expect(found(basis, 15).cautions.at(-1)).toMatch(/Tested at 0 °C and taken for 15 °C/);
  });
});
