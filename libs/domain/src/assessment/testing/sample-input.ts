import type { Given } from '../../units/provenance';
import type { AssessmentInput, ResidualStressInput } from '../assessment-input';

export const given = (value: number, provenance: Given['provenance'] = 'measured'): Given => ({
  value,
  provenance,
  note: 'test',
});

/** What a test wants to vary; everything else is the sample's. */
export interface Variation {
  readonly thickness?: number;
  readonly width?: number | null;
  readonly insideDiameter?: number | null;
  readonly kind?: 'surface' | 'embedded';
  readonly face?: 'inside' | 'outside';
  readonly orientation?: 'axial' | 'circumferential';
  readonly height?: number;
  readonly length?: number;
  readonly ligament?: number | null;
  readonly allowance?: number;
  readonly lengthAllowance?: number;
  readonly membrane?: number;
  readonly bending?: number;
  readonly residual?: ResidualStressInput;
  readonly facePressure?: number | null;
  readonly yields?: number;
  readonly tensile?: number;
  readonly modulus?: number;
  readonly toughness?: number;
  readonly plateau?: boolean;
  readonly range?: number;
  readonly bendingRange?: number;
  readonly cycles?: number;
  readonly threshold?: number;
  readonly stressCorrosion?: number | null;
  readonly horizon?: number;
}

/** A surface flaw in a 25 mm wall, comfortably inside, growing by fatigue; vary what the test is about. */
export function sampleInput(v: Variation = {}): AssessmentInput {
  return {
    wall: wallOf(v),
    flaw: {
      kind: v.kind ?? 'surface',
      face: v.face ?? 'inside',
      orientation: v.orientation ?? 'axial',
      heightMm: given(v.height ?? 4),
      lengthMm: given(v.length ?? 24),
      ligamentMm: v.ligament === undefined || v.ligament === null ? null : given(v.ligament),
    },
    sizing: {
      heightAllowanceMm: given(v.allowance ?? 1),
      lengthAllowanceMm: given(v.lengthAllowance ?? 2),
    },
    stress: {
      primaryMembraneMPa: given(v.membrane ?? 120),
      primaryBendingMPa: given(v.bending ?? 0),
      residual: v.residual ?? { state: 'none' },
      crackFacePressureMPa: v.facePressure ? given(v.facePressure) : null,
    },
    material: {
      yieldMPa: given(v.yields ?? 350),
      tensileMPa: given(v.tensile ?? 500),
      youngsModulusMPa: given(v.modulus ?? 207_000),
      poissonsRatio: given(0.3),
      toughnessMPaSqrtM: given(v.toughness ?? 80),
      yieldPlateau: v.plateau ?? false,
    },
    growth: growthOf(v),
    horizonYears: v.horizon ?? 40,
  };
}

const wallOf = (v: Variation): AssessmentInput['wall'] =>
  v.insideDiameter
    ? {
        shape: 'cylinder',
        thicknessMm: given(v.thickness ?? 25),
        insideDiameterMm: given(v.insideDiameter),
      }
    : {
        shape: 'plate',
        thicknessMm: given(v.thickness ?? 25),
        widthMm: v.width ? given(v.width) : null,
      };

function growthOf(v: Variation): AssessmentInput['growth'] {
  const law = {
    key: 'steel-air-simplified',
    title: 'Steel, air, simplified',
    source: 'BS 7910 simplified law (from memory)',
    stages: [{ coefficient: 5.21e-13, exponent: 3 }],
    thresholdMPaSqrtMm: v.threshold ?? 63,
  };
  const block = {
    membraneRangeMPa: v.range ?? v.membrane ?? 120,
    bendingRangeMPa: v.bendingRange ?? Math.max(v.bending ?? 0, 0),
    cyclesPerYear: v.cycles ?? 10_000,
    note: 'start and stop',
  };
  return {
    fatigue: v.cycles === 0 ? null : { law, blocks: [block] },
    stressCorrosion: v.stressCorrosion
      ? { depthRateMmPerYear: given(v.stressCorrosion), endRateMmPerYear: given(v.stressCorrosion) }
      : null,
  };
}
