import { assessFlaw } from './assess-flaw';
import type { AssessmentInput } from './assessment-input';
import { checkInput } from './check-input';
import { refuse } from './testing/assess';
import { given, sampleInput, type Variation } from './testing/sample-input';

const paths = (variation: Variation) => refuse(variation).refusals.map(({ input }) => input);

describe('checkInput', () => {
  it('has nothing to say about a sound input', () => {
    expect(checkInput(sampleInput())).toEqual([]);
  });

  it.each<[string, Variation, string]>([
    ['no height', { height: 0 }, 'flaw.heightMm'],
    ['a negative height', { height: -3 }, 'flaw.heightMm'],
    ['a length that is no number', { length: Number.NaN }, 'flaw.lengthMm'],
    ['an infinite wall', { thickness: Infinity }, 'wall.thicknessMm'],
    ['a wall given in metres', { thickness: 0.025 }, 'wall.thicknessMm'],
    ['a negative allowance', { allowance: -1 }, 'sizing.heightAllowanceMm'],
    ['a modulus given in GPa', { modulus: 207 }, 'material.youngsModulusMPa'],
    ['a toughness given in MPa·√mm', { toughness: 2530 }, 'material.toughnessMPaSqrtM'],
    ['a yield strength given in Pa', { yields: 350e6 }, 'material.yieldMPa'],
    ['a stress given in kPa', { membrane: 120_000 }, 'stress.primaryMembraneMPa'],
    ['membrane compression', { membrane: -20 }, 'stress.primaryMembraneMPa'],
    ['a pressure given in kPa', { facePressure: 2600 }, 'stress.crackFacePressureMPa'],
    ['a negative range', { range: -10 }, 'growth.fatigue.blocks.0.membraneRangeMPa'],
    ['cycles that are no number', { cycles: Number.NaN }, 'growth.fatigue.blocks.0.cyclesPerYear'],
    [
      'a negative stress corrosion rate',
      { stressCorrosion: -0.1 },
      'growth.stressCorrosion.depthRateMmPerYear',
    ],
    ['no horizon', { horizon: 0 }, 'horizonYears'],
    ['a negative ligament', { kind: 'embedded', ligament: -1 }, 'flaw.ligamentMm'],
    ['an embedded flaw without a ligament', { kind: 'embedded' }, 'flaw.ligamentMm'],
    ['strengths swapped', { yields: 500, tensile: 350 }, 'material.tensileMPa'],
    ['a height that reaches the wall', { height: 25 }, 'flaw.heightMm'],
    ['a height that reaches the wall with its allowance', { height: 24.5 }, 'flaw.heightMm'],
    ['height and length swapped', { height: 20, length: 4 }, 'flaw.lengthMm'],
    [
      'ligament and height that do not fit',
      { kind: 'embedded', height: 6, ligament: 20 },
      'flaw.ligamentMm',
    ],
    ['a flaw as long as the plate is wide', { length: 24, width: 20 }, 'flaw.lengthMm'],
    ['no primary stress', { membrane: 0 }, 'stress.primaryMembraneMPa'],
    ['an inside diameter given in metres', { insideDiameter: 2.4 }, 'wall.insideDiameterMm'],
  ])('refuses %s by the path of the field', (_, variation, path) => {
    expect(paths(variation)).toContain(path);
  });

  it('says what it got, what it must be and what to do', () => {
    const [refusal] = refuse({ modulus: 207 }).refusals;
    expect(refusal?.message).toMatch(/Young’s modulus is 207 MPa; it must be at least/);
    expect(refusal?.instead).toMatch(/207 GPa/);
    expect(refusal?.value).toBe(207);
  });

  it('gives a value that is no number as a word, so that it survives JSON', () => {
    expect(refuse({ height: Number.NaN }).refusals[0]?.value).toBe('NaN');
  });

  it('names every field at fault at once', () => {
    expect(paths({ height: -1, modulus: 207 })).toEqual([
      'flaw.heightMm',
      'material.youngsModulusMPa',
    ]);
  });

  it('refuses a growth law whose stages never meet', () => {
    const input = sampleInput();
    const fatigue = input.growth.fatigue;
    const stages = [
      { coefficient: 1e-13, exponent: 3 },
      { coefficient: 2e-13, exponent: 3 },
    ];
    const growth = {
      ...input.growth,
      fatigue: fatigue && { ...fatigue, law: { ...fatigue.law, stages } },
    };
    expect(checkInput({ ...input, growth })[0]?.input).toBe('growth.fatigue.law.stages.1.exponent');
  });

  it('refuses a growth law without a stage', () => {
    const input = sampleInput();
    const fatigue = input.growth.fatigue;
    const growth = {
      ...input.growth,
      fatigue: fatigue && { ...fatigue, law: { ...fatigue.law, stages: [] } },
    };
    expect(checkInput({ ...input, growth })[0]?.input).toBe('growth.fatigue.law.stages');
  });

  it('refuses data with parts missing instead of failing', () => {
    const broken = {
      ...sampleInput(),
      material: { yieldMPa: given(350) },
    } as unknown as AssessmentInput;
    const outcome = assessFlaw(broken);
    expect(outcome.status).toBe('refused');
  });

  it('refuses an entered residual stress that is no number', () => {
    const residual = {
      state: 'entered',
      membraneMPa: given(Number.NaN),
      bendingMPa: given(0),
    } as const;
    expect(paths({ residual })).toEqual(['stress.residual.membraneMPa']);
  });
});
