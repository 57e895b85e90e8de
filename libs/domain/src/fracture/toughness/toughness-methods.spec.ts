import fc from 'fast-check';
import { toMPaSqrtM } from '../../units/convert';
import type { Given, Provenance } from '../../units/provenance';
import { toughnessFromCharpy, toughnessOnShelf, type ShelfInput } from './from-charpy';
import { toughnessFromReferenceCurve } from './from-reference-curve';
import { toughnessFromMasterCurve, type MasterCurveInput } from './from-reference-temperature';
import { toughnessFromCtod, toughnessFromJ, toughnessFromKIc } from './from-specimen';
import { weakestOrigin, type FoundToughness, type ToughnessResult } from './toughness-result';

const given = (value: number, provenance: Provenance = 'measured'): Given => ({
  value,
  provenance,
  note: 'report 12',
});
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const ELASTIC = { youngsModulusMPa: 207_000, poissonsRatio: 0.3 };

function found(result: ToughnessResult): FoundToughness {
  if (result.status === 'refused') throw new Error(result.refusals[0]?.message);
  return result;
}
const inMPaSqrtM = (result: ToughnessResult) => toMPaSqrtM(found(result).kMatMPaSqrtMm);
const refusedInputs = (result: ToughnessResult) =>
  result.status === 'refused' ? result.refusals.map(({ input }) => input) : [];

describe('a toughness', () => {
  const result = found(
    toughnessFromCharpy({ energyJ: given(40, 'certificate'), thicknessMm: 50, temperatureC: 0 }),
  );

  it('says its method, source, origin, temperature and steps', () => {
    expect(result).toMatchObject({ provenance: 'certificate', temperatureC: 0 });
    expect(result.source).toMatch(/from memory/);
    expect(result.steps.map(({ name }) => name)).toEqual([
      'Transition',
      'Upper shelf',
      'Lower bound from Charpy energy',
    ]);
    expect(result.steps.at(-1)?.value).toBeCloseTo(67.00162, 5);
  });

  it('has the weakest origin of its inputs', () => {
    expect(weakestOrigin([given(1), given(2, 'assumed'), given(3, 'certificate')])).toBe('assumed');
    expect(weakestOrigin([given(1)])).toBe('measured');
  });
});

describe('toughness from a plane-strain test', () => {
  const test = {
    kQMPaSqrtM: given(50),
    yieldMPa: 500,
    crackLengthMm: 26,
    thicknessMm: 25,
    ligamentMm: 26,
    loadRatio: 1.05,
    temperatureC: -50,
  };

  it('is KQ where the specimen is large enough', () => {
    expect(inMPaSqrtM(toughnessFromKIc(test))).toBeCloseTo(50, 12);
  });

  it('names the size that is too small', () => {
    expect(refusedInputs(toughnessFromKIc({ ...test, thicknessMm: 24.9, ligamentMm: 20 }))).toEqual(
      ['thicknessMm', 'ligamentMm'],
    );
  });

  it('refuses a test that yielded too much, and a wrong unit', () => {
    expect(refusedInputs(toughnessFromKIc({ ...test, loadRatio: 1.2 }))).toEqual(['loadRatio']);
    expect(refusedInputs(toughnessFromKIc({ ...test, kQMPaSqrtM: given(1581) }))).toEqual([
      'kQMPaSqrtM',
    ]);
  });
});

describe('toughness from J and CTOD', () => {
  const ctod = { ctodMm: given(0.2), yieldMPa: 350, tensileMPa: 500, temperatureC: 0, ...ELASTIC };

  it('is in MPa·√mm', () => {
    const j = found(toughnessFromJ({ jNPerMm: given(100), temperatureC: 0, ...ELASTIC }));
    expect(j.kMatMPaSqrtMm).toBeCloseTo(4769.408, 3);
    expect(inMPaSqrtM(toughnessFromCtod(ctod))).toBeCloseTo(164.512, 3);
  });

  it('refuses strengths outside the range of the factor', () => {
    expect(refusedInputs(toughnessFromCtod({ ...ctod, yieldMPa: 495 }))).toEqual(['tensileMPa']);
    expect(refusedInputs(toughnessFromCtod({ ...ctod, yieldMPa: 500, tensileMPa: 350 }))).toEqual([
      'tensileMPa',
    ]);
  });

  it.each([0, -1, Number.NaN, Infinity, 200])('refuses a CTOD of %d mm', (value) => {
    expect(refusedInputs(toughnessFromCtod({ ...ctod, ctodMm: given(value) }))).toEqual(['ctodMm']);
  });

  it('refuses a modulus in GPa', () => {
    const test = {
      jNPerMm: given(100),
      temperatureC: 0,
      youngsModulusMPa: 207,
      poissonsRatio: 0.3,
    };
    expect(refusedInputs(toughnessFromJ(test))).toEqual(['youngsModulusMPa']);
  });
});

describe('toughness on the upper shelf', () => {
  const input: ShelfInput = {
    energyJ: given(100),
    form: 'yield',
    yieldMPa: 450,
    ductileShare: 1,
    temperatureC: 20,
    ...ELASTIC,
  };

  it('is by yield strength or at 0.2 mm of tearing', () => {
    expect(inMPaSqrtM(toughnessOnShelf(input))).toBeCloseTo(165.8433, 4);
    expect(inMPaSqrtM(toughnessOnShelf({ ...input, form: 'tearing' }))).toBeCloseTo(147.7, 1);
  });

  it('is refused where the specimens were not ductile or the energy too low', () => {
    expect(refusedInputs(toughnessOnShelf({ ...input, ductileShare: 0.8 }))).toEqual([
      'ductileShare',
    ]);
    expect(refusedInputs(toughnessOnShelf({ ...input, energyJ: given(4) }))).toEqual(['energyJ']);
    expect(refusedInputs(toughnessOnShelf({ ...input, ductileShare: Number.NaN }))).toEqual([
      'ductileShare',
    ]);
  });
});

describe('toughness from the master curve', () => {
  const input: MasterCurveInput = {
    reference: { from: 'T0', valueC: given(-38) },
    temperatureC: 0,
    thicknessMm: 40,
    probability: 0.05,
    allowanceC: 25,
    yieldMPa: 350,
    form: 'BS 7910',
  };

  it('takes the allowance for scatter where the reference comes from Charpy tests', () => {
    expect(inMPaSqrtM(toughnessFromMasterCurve(input))).toBeCloseTo(66.365169, 5);
    const charpy = toughnessFromMasterCurve({
      ...input,
      reference: { from: 'T27J', valueC: given(-20) },
      allowanceC: null,
    });
    expect(inMPaSqrtM(charpy)).toBeCloseTo(66.365169, 5);
    const none = toughnessFromMasterCurve({ ...input, allowanceC: null });
    expect(inMPaSqrtM(none)).toBeGreaterThan(70);
  });

  it('differs between the two forms only by the length of the reference front', () => {
    const [bs, astm] = [input, { ...input, form: 'ASTM E1921' as const }].map((each) =>
      inMPaSqrtM(toughnessFromMasterCurve(each)),
    );
    expect(((astm ?? 0) - 20) / ((bs ?? 0) - 20)).toBeCloseTo(1.016 ** 0.25, 9);
  });

  it('rises with temperature and probability, falls with thickness', () => {
    fc.assert(
      fc.property(between(-80, 0), between(0.5, 10), (temperatureC, more) => {
        const at = (change: Partial<MasterCurveInput>) =>
          inMPaSqrtM(toughnessFromMasterCurve({ ...input, temperatureC, ...change }));
        expect(at({ temperatureC: temperatureC + more })).toBeGreaterThan(at({}));
        expect(at({ probability: 0.05 + 0.04 * more })).toBeGreaterThan(at({}));
        expect(at({ thicknessMm: 40 + more })).toBeLessThan(at({}));
      }),
    );
  });

  it('is refused beyond 50 °C from T0, naming the limit', () => {
    for (const temperatureC of [-89, 13]) {
      const result = toughnessFromMasterCurve({ ...input, temperatureC });
      expect(result).toMatchObject({
        status: 'refused',
        refusals: [{ input: 'temperatureC', limit: 'T0 − 50 to T0 + 50 °C', value: temperatureC }],
      });
    }
  });

  it.each<[string, Partial<MasterCurveInput>, string]>([
    ['a strength outside its range', { yieldMPa: 250 }, 'yieldMPa'],
    ['a probability above one half', { probability: 0.9 }, 'probability'],
    ['a probability of 0', { probability: 0 }, 'probability'],
    ['a negative allowance', { allowanceC: -5 }, 'allowanceC'],
    ['no thickness', { thicknessMm: 0 }, 'thicknessMm'],
  ])('refuses %s by name', (_, change, name) => {
    expect(refusedInputs(toughnessFromMasterCurve({ ...input, ...change }))).toEqual([name]);
  });
});

describe('toughness from a curve by reference temperature', () => {
  it('is the initiation, arrest or exemption curve', () => {
    const at = (curve: 'initiation' | 'initiation, metric' | 'arrest' | 'exemption') =>
      inMPaSqrtM(toughnessFromReferenceCurve({ curve, referenceC: given(10), temperatureC: 10 }));
    expect(at('initiation')).toBeCloseTo(59.26503, 4);
    expect(at('initiation, metric')).toBeCloseTo(59.283, 3);
    expect(at('arrest')).toBeCloseTo(43.124, 3);
    expect(at('exemption')).toBeCloseTo(59.265, 2);
  });

  it('refuses a temperature that is none', () => {
    const input = { curve: 'arrest', referenceC: given(Number.NaN), temperatureC: -400 } as const;
    expect(refusedInputs(toughnessFromReferenceCurve(input))).toEqual([
      'referenceC',
      'temperatureC',
    ]);
  });
});

describe('toughness from Charpy energy', () => {
  it.each([0, -1, 2.7, 5000, Number.NaN])('refuses an energy of %d J', (energy) => {
    const input = { energyJ: given(energy), thicknessMm: 25, temperatureC: 0 };
    expect(refusedInputs(toughnessFromCharpy(input))).toEqual(['energyJ']);
  });

  it('is capped by the shelf', () => {
    const input = { energyJ: given(200), thicknessMm: 10, temperatureC: 20 };
    expect(inMPaSqrtM(toughnessFromCharpy(input))).toBeCloseTo(163, 9);
  });
});
