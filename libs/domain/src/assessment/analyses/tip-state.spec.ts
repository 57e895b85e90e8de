import { assess } from '../testing/assess';
import { sampleInput, type Variation } from '../testing/sample-input';
import { tipState } from './tip-state';

function tip(variation: Variation = {}) {
  const found = tipState(sampleInput(variation));
  if (found.status === 'refused') throw new Error('refused');
  return found;
}

describe('the state around the tip', () => {
  it('has the K and the place of the governing point', () => {
    const flaw = assess({});
    const found = tip();
    expect(found.kMPaSqrtM).toBeCloseTo(flaw.kPrimaryMPaSqrtM + flaw.kSecondaryMPaSqrtM, 10);
    expect(found.angleDeg).toBe(flaw.governingAngleDeg);
  });

  it('releases K² (1 − ν²)/E in plane strain and K²/E in plane stress', () => {
    const strain = tip({ membrane: 40 });
    expect(strain.condition).toBe('plane strain');
    const k = strain.kMPaSqrtM * Math.sqrt(1000);
    expect(strain.energyReleaseNPerMm).toBeCloseTo((k * k * (1 - 0.09)) / 207_000, 10);
    const stress = tip({ membrane: 150, toughness: 200 });
    expect(stress.condition).toBe('plane stress');
    const higher = stress.kMPaSqrtM * Math.sqrt(1000);
    expect(stress.energyReleaseNPerMm).toBeCloseTo((higher * higher) / 207_000, 10);
  });

  it('holds crack, ligament and wall against 2.5 (K/σY)²', () => {
    const { elasticUse, kMPaSqrtM } = tip();
    const need = 2.5 * ((kMPaSqrtM * Math.sqrt(1000)) / 350) ** 2;
    const crack = elasticUse.checks.find(({ name }) => name === 'crack');
    expect(crack).toMatchObject({ haveMm: 5 });
    expect(crack?.needMm).toBeCloseTo(need, 8);
  });

  it('shows a square that holds the yielded zone', () => {
    const { reachMm, elasticUse } = tip();
    expect(reachMm).toBeGreaterThan(2 * elasticUse.plasticRadiusMm.planeStress);
  });

  it('answers a case without verdict with its refusal', () => {
    expect(tipState(sampleInput({ height: 30 }))).toMatchObject({ status: 'refused' });
  });
});
