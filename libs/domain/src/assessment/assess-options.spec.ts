import { assessFlaw } from './assess-flaw';
import type { AssessmentInput } from './assessment-input';
import type { AssessedFlaw } from './assessment-outcome';
import { given, sampleInput } from './testing/sample-input';

function assessed(input: AssessmentInput): AssessedFlaw {
  const outcome = assessFlaw(input);
  if (outcome.status === 'refused') throw new Error(JSON.stringify(outcome.refusals));
  return outcome;
}

const note = { provenance: 'measured', note: 'test' } as const;
const plain = sampleInput({ bending: 30 });
const withStress = (more: Partial<AssessmentInput['stress']>): AssessmentInput => ({
  ...plain,
  stress: { ...plain.stress, ...more },
});

describe('a stress polynomial', () => {
  it('of the first degree is membrane and bending', () => {
    const profile = assessed(withStress({ primaryProfileMPa: { value: [150, -60], ...note } }));
    const entered = assessed(plain);
    expect(profile.kr).toBeCloseTo(entered.kr, 12);
    expect(profile.lr).toBeCloseTo(entered.lr, 12);
    expect(profile.reserveOnLoad).toBeCloseTo(entered.reserveOnLoad, 9);
  });

  it('counts for collapse by its force and moment alone, and stands on the sheet', () => {
    const peak = [200, -400, 300];
    const curved = assessed(withStress({ primaryProfileMPa: { value: peak, ...note } }));
    expect(curved.lr).toBeLessThan(assessed(plain).lr);
    expect(
      curved.sheet.some(({ inputs }) => inputs.some((text) => text.includes('σ(x) = 200'))),
    ).toBe(true);
  });

  it('is refused by name when a coefficient cannot be meant', () => {
    const outcome = assessFlaw(withStress({ primaryProfileMPa: { value: [1e5], ...note } }));
    expect(outcome).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'stress.primaryProfileMPa.value.0' }],
    });
  });
});

describe('an offset of the walls', () => {
  it('adds bending of three offsets over the wall', () => {
    const offset = assessed(withStress({ offsetMm: given(1) }));
    const added = (3 * 1 * 120) / 25;
    expect(offset.kr).toBeCloseTo(assessed(sampleInput({ bending: 30 + added })).kr, 12);
  });
});

describe('a proof test', () => {
  const welded = (residual: AssessmentInput['stress']['residual']) =>
    assessed(sampleInput({ membrane: 80, residual }));
  const proof = (membrane: number) =>
    welded({ state: 'proof-tested', membraneMPa: given(membrane), bendingMPa: given(0) });

  it('relaxes the residual stress of the weld', () => {
    expect(proof(280).residualMembraneMPa).toBeCloseTo(350 * (1.4 - 280 / 425), 8);
    expect(proof(280).residualMembraneMPa).toBeLessThan(
      welded({ state: 'as-welded' }).residualMembraneMPa,
    );
  });

  it('below the service load changes nothing', () => {
    expect(proof(0).residualMembraneMPa).toBe(welded({ state: 'as-welded' }).residualMembraneMPa);
  });
});

describe('partial factors', () => {
  const factored = (change: Partial<NonNullable<AssessmentInput['partialFactors']>>) =>
    assessed({
      ...plain,
      partialFactors: { stress: 1, size: 1, toughness: 1, yield: 1, note: 'test', ...change },
    });

  it('of one change nothing', () => {
    expect(factored({}).reserveOnLoad).toBe(assessed(plain).reserveOnLoad);
  });

  it('each lower the reserve, that on stress by itself', () => {
    const { reserveOnLoad } = assessed(plain);
    for (const key of ['stress', 'size', 'toughness', 'yield'] as const) {
      expect(factored({ [key]: 1.2 }).reserveOnLoad).toBeLessThan(reserveOnLoad);
    }
    expect(factored({ stress: 1.2 }).reserveOnLoad).toBeCloseTo(reserveOnLoad / 1.2, 8);
  });

  it('on size multiply the measured size with its allowance', () => {
    expect(factored({ size: 1.4 }).assessed).toMatchObject({ heightMm: 1.4 * 5, aMm: 1.4 * 5 });
  });
});

describe('a stress–strain curve', () => {
  const E = 207_000;
  const shares = [0.4, 0.7, 0.8, 0.9, 0.98, 1, 1.02, 1.1, 1.2, 1.35];
  const value = shares.map((share) => {
    const stress = 350 * share;
    return { stressMPa: stress, strain: stress / E + 0.002 * share ** 12 };
  });
  const curved = {
    ...plain,
    material: { ...plain.material, stressStrainCurve: { value, ...note } },
  };

  it('makes the diagram Option 2', () => {
    const flaw = assessed(curved);
    expect(flaw.diagram).toMatch(/^Option 2/);
    expect(assessed(plain).diagram).toBe('Option 1');
    expect(flaw.line[0]).toEqual({ lr: 0, kr: 1 });
    expect(flaw.sheet.find(({ symbol }) => symbol === 'f(Lr)')?.source).toMatch(/7\.3\.4/);
  });

  it('with too few points gives no verdict', () => {
    const few = { ...curved.material.stressStrainCurve, value: value.slice(0, 4) };
    const outcome = assessFlaw({
      ...plain,
      material: { ...plain.material, stressStrainCurve: few },
    });
    expect(outcome).toMatchObject({
      status: 'refused',
      refusals: expect.arrayContaining([
        expect.objectContaining({ input: 'material.stressStrainCurve' }),
      ]),
    });
  });
});

describe('a body that cannot hold the flaw', () => {
  it('gives no verdict and says what it can hold', () => {
    const bar = { shape: 'round bar', thicknessMm: given(40) } as const;
    const outcome = assessFlaw({ ...plain, wall: bar });
    expect(outcome).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'flaw.kind', value: 'surface' }],
    });
  });
});

describe('the peak stress of a nozzle corner', () => {
  const corner: AssessmentInput = {
    ...plain,
    wall: { shape: 'nozzle corner', thicknessMm: given(28), holeRadiusMm: given(100) },
    flaw: { ...plain.flaw, kind: 'corner', heightMm: given(4), lengthMm: given(4) },
  };
  const peak = (value: readonly number[]): AssessmentInput => ({
    ...corner,
    stress: { ...corner.stress, peakProfileMPa: { value, ...note } },
  });

  it('drives K and leaves collapse alone', () => {
    const [with2, without] = [assessed(peak([300, -100])), assessed(corner)];
    expect(with2.kPrimaryMPaSqrtM).toBeGreaterThan(1.5 * without.kPrimaryMPaSqrtM);
    expect(with2.lr).toBe(without.lr);
  });

  it('is refused where the solution holds the concentration already', () => {
    const stress = { ...plain.stress, peakProfileMPa: { value: [300], ...note } };
    expect(assessFlaw({ ...plain, stress })).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'stress.peakProfileMPa' }],
    });
  });
});
