import { assessFlaw } from '@ligament/domain/assessment/assess-flaw';
import type { AssessedFlaw } from '@ligament/domain/assessment/assessment-outcome';
import {
  sampleInput,
  given,
  type Variation,
} from '@ligament/domain/assessment/testing/sample-input';

// flaws of the invented plant, computed beforehand with a simpler, separate program on formulas from memory

const MATERIAL = {
  P355GH: { yields: 285, tensile: 460, toughness: 60 },
  'A516-70': { yields: 260, tensile: 485, toughness: 85 },
  'A537-1': { yields: 345, tensile: 490, toughness: 95 },
  'P355, cold': { yields: 285, tensile: 460, toughness: 45 },
  'P355, warm': { yields: 285, tensile: 460, toughness: 75 },
} as const;

const reactor: Variation = {
  insideDiameter: 2600,
  thickness: 28,
  membrane: 106.8,
  bending: 90,
  residual: { state: 'entered', membraneMPa: given(57), bendingMPa: given(0) },
  ...MATERIAL.P355GH,
};

/** Full batches and part batches of a year. */
function assessBatch(
  variation: Variation,
  batches: readonly (readonly [share: number, cycles: number])[],
): AssessedFlaw {
  const input = sampleInput(variation);
  const law = input.growth.fatigue?.law;
  if (!law) throw new Error('law missing');
  const blocks = batches.map(([share, cyclesPerYear]) => ({
    membraneRangeMPa: share * (variation.membrane ?? 0),
    bendingRangeMPa: share * (variation.bending ?? 0),
    cyclesPerYear,
    note: 'batch',
  }));
  const outcome = assessFlaw({ ...input, growth: { ...input.growth, fatigue: { law, blocks } } });
  if (outcome.status === 'refused') throw new Error(JSON.stringify(outcome.refusals));
  return outcome;
}

const BATCHES = [
  [1, 1400],
  [0.4, 2800],
] as const;

describe('the flaws of the invented plant', () => {
  it('R-401: near the limit, reserve 1.05, 1.4 years', () => {
    const flaw = assessBatch(
      { ...reactor, height: 7.6, length: 74, allowance: 1, lengthAllowance: 2 },
      BATCHES,
    );
    expect(flaw.verdict).toBe('near the limit');
    expect(flaw.reserveOnLoad).toBeCloseTo(1.05, 2);
    expect(flaw.life.years).toBeCloseTo(1.4, 1);
    expect(flaw.life.end).toBe('limit reached');
  });

  it('R-402: not acceptable, reserve 0.76, no life', () => {
    const flaw = assessBatch(
      { ...reactor, height: 12, length: 130, allowance: 1, lengthAllowance: 2 },
      BATCHES,
    );
    expect(flaw.verdict).toBe('not acceptable');
    expect(flaw.reserveOnLoad).toBeCloseTo(0.76, 2);
    expect(flaw.life.years).toBeNull();
  });

  it('C-201: stress corrosion at an as-welded seam, inside the diagram, some years of life', () => {
    const flaw = assessBatch(
      {
        ...MATERIAL['A516-70'],
        insideDiameter: 2200,
        thickness: 38,
        membrane: 115.8,
        residual: { state: 'as-welded' },
        height: 5.2,
        length: 78,
        stressCorrosion: 0.7,
      },
      [[1, 6]],
    );
    expect(flaw.verdict).toBe('acceptable');
    expect(flaw.life.years).toBeGreaterThan(2);
    expect(flaw.life.years).toBeLessThan(6);
  });

  it('A-406: embedded, breaks the surface after 3.1 years, 15 years in all', () => {
    const flaw = assessBatch(
      {
        ...MATERIAL['A537-1'],
        insideDiameter: 2400,
        thickness: 46,
        membrane: 65.2,
        residual: { state: 'entered', membraneMPa: given(69), bendingMPa: given(0) },
        kind: 'embedded',
        height: 6.5,
        length: 44,
        ligament: 3.75,
        allowance: 0.8,
        lengthAllowance: 1.6,
      },
      [[0.9, 52_000]],
    );
    expect(flaw.verdict).toBe('acceptable');
    expect(flaw.life.firstEventYears).toBeCloseTo(3.1, 1);
    expect(flaw.life.years).toBeGreaterThan(14);
    expect(flaw.life.years).toBeLessThan(17);
    expect(flaw.events[0]?.heightAfterMm).toBeGreaterThan(11);
  });

  it('V-502: not acceptable cold, acceptable from +5 °C', () => {
    const bullet: Variation = {
      insideDiameter: 3000,
      thickness: 26,
      membrane: 92.3,
      bending: 8,
      residual: { state: 'as-welded' },
      height: 4,
      length: 40,
    };
    expect(assessBatch({ ...bullet, ...MATERIAL['P355, cold'] }, [[0.6, 50]]).verdict).toBe(
      'not acceptable',
    );
    const warm = assessBatch({ ...bullet, ...MATERIAL['P355, warm'] }, [[0.6, 50]]);
    expect(warm.verdict).toBe('acceptable');
    expect(warm.life.end).toBe('horizon');
  });
});
