import type { Given } from '../units/provenance';
import type { AssessmentInput } from './assessment-input';

/** What one number of the input may be, and what a value far outside usually means. */
export interface Bound {
  readonly path: string;
  readonly name: string;
  readonly unit: string;
  readonly value: number;
  readonly min: number;
  readonly max: number;
  /** The lower bound itself is allowed. */
  readonly minAllowed: boolean;
  readonly hint: string;
}

const LENGTH_HINT = 'Give it in millimetres; a value in metres or inches is the usual mistake.';
const STRESS_HINT = 'Give it in MPa (N/mm²); a value in kPa, psi or ksi is the usual mistake.';

const bound = (
  path: string,
  name: string,
  given: Given | null | undefined,
  unit: string,
  range: readonly [min: number, max: number],
  hint: string,
  minAllowed = false,
): Bound[] => {
  if (given === null) return [];
  const value = given?.value ?? Number.NaN;
  return [{ path, name, unit, value, min: range[0], max: range[1], minAllowed, hint }];
};

/** Every number of the input with its bounds; the ranges catch mistakes of unit, not of engineering. */
export function inputBounds(input: AssessmentInput): readonly Bound[] {
  return [
    ...wallBounds(input),
    ...flawBounds(input),
    ...stressBounds(input),
    ...materialBounds(input),
    ...growthBounds(input),
  ];
}

function wallBounds({ wall }: AssessmentInput): Bound[] {
  const thickness = bound(
    'wall.thicknessMm',
    'Wall thickness',
    wall.thicknessMm,
    'mm',
    [1, 1000],
    LENGTH_HINT,
    true,
  );
  return wall.shape === 'plate'
    ? [
        ...thickness,
        ...bound('wall.widthMm', 'Plate width', wall.widthMm, 'mm', [0, 1e6], LENGTH_HINT),
      ]
    : [
        ...thickness,
        ...bound(
          'wall.insideDiameterMm',
          'Inside diameter',
          wall.insideDiameterMm,
          'mm',
          [10, 1e5],
          LENGTH_HINT,
          true,
        ),
      ];
}

function flawBounds({ flaw, sizing }: AssessmentInput): Bound[] {
  const ligament = flaw.kind === 'embedded' ? (flaw.ligamentMm ?? undefined) : null;
  return [
    ...bound('flaw.heightMm', 'Flaw height', flaw.heightMm, 'mm', [0, 1000], LENGTH_HINT),
    ...bound('flaw.lengthMm', 'Flaw length', flaw.lengthMm, 'mm', [0, 1e5], LENGTH_HINT),
    ...bound(
      'flaw.ligamentMm',
      'Ligament',
      ligament,
      'mm',
      [0, 1000],
      `An embedded flaw needs the ligament to the face. ${LENGTH_HINT}`,
      true,
    ),
    ...bound(
      'sizing.heightAllowanceMm',
      'Height allowance',
      sizing.heightAllowanceMm,
      'mm',
      [0, 50],
      LENGTH_HINT,
      true,
    ),
    ...bound(
      'sizing.lengthAllowanceMm',
      'Length allowance',
      sizing.lengthAllowanceMm,
      'mm',
      [0, 500],
      LENGTH_HINT,
      true,
    ),
  ];
}

function stressBounds({ stress }: AssessmentInput): Bound[] {
  const { residual } = stress;
  const entered = residual.state === 'entered' ? residual : null;
  return [
    ...bound(
      'stress.primaryMembraneMPa',
      'Primary membrane stress',
      stress.primaryMembraneMPa,
      'MPa',
      [0, 2000],
      `A flaw under membrane compression is not a case for this method. ${STRESS_HINT}`,
      true,
    ),
    ...bound(
      'stress.primaryBendingMPa',
      'Primary bending stress',
      stress.primaryBendingMPa,
      'MPa',
      [-2000, 2000],
      STRESS_HINT,
      true,
    ),
    ...bound(
      'stress.residual.membraneMPa',
      'Residual membrane stress',
      entered && entered.membraneMPa,
      'MPa',
      [-2000, 2000],
      STRESS_HINT,
      true,
    ),
    ...bound(
      'stress.residual.bendingMPa',
      'Residual bending stress',
      entered && entered.bendingMPa,
      'MPa',
      [-2000, 2000],
      STRESS_HINT,
      true,
    ),
    ...bound(
      'stress.crackFacePressureMPa',
      'Pressure on the crack faces',
      stress.crackFacePressureMPa,
      'MPa',
      [0, 200],
      'Give it in MPa; a value in bar is ten times too large.',
      true,
    ),
  ];
}

function materialBounds({ material }: AssessmentInput): Bound[] {
  return [
    ...bound(
      'material.yieldMPa',
      'Yield strength',
      material.yieldMPa,
      'MPa',
      [50, 2000],
      STRESS_HINT,
      true,
    ),
    ...bound(
      'material.tensileMPa',
      'Tensile strength',
      material.tensileMPa,
      'MPa',
      [50, 3000],
      STRESS_HINT,
      true,
    ),
    ...bound(
      'material.youngsModulusMPa',
      'Young’s modulus',
      material.youngsModulusMPa,
      'MPa',
      [30_000, 450_000],
      'Give it in MPa: steel has about 207 000 MPa, which is 207 GPa.',
      true,
    ),
    ...bound(
      'material.poissonsRatio',
      'Poisson’s ratio',
      material.poissonsRatio,
      '',
      [0, 0.5],
      'Steel has about 0.3.',
      true,
    ),
    ...bound(
      'material.toughnessMPaSqrtM',
      'Fracture toughness',
      material.toughnessMPaSqrtM,
      'MPa·√m',
      [5, 1000],
      'Give it in MPa·√m; a value in MPa·√mm is 31.6 times larger.',
      true,
    ),
  ];
}

function growthBounds({ growth, horizonYears }: AssessmentInput): Bound[] {
  const plain = (value: number): Given => ({ value, provenance: 'assumed', note: '' });
  const { fatigue, stressCorrosion } = growth;
  const blocks = (fatigue?.blocks ?? []).flatMap((block, i) => [
    ...bound(
      `growth.fatigue.blocks.${i}.membraneRangeMPa`,
      `Membrane range of block ${i + 1}`,
      plain(block.membraneRangeMPa),
      'MPa',
      [0, 4000],
      STRESS_HINT,
      true,
    ),
    ...bound(
      `growth.fatigue.blocks.${i}.bendingRangeMPa`,
      `Bending range of block ${i + 1}`,
      plain(block.bendingRangeMPa),
      'MPa',
      [0, 4000],
      STRESS_HINT,
      true,
    ),
    ...bound(
      `growth.fatigue.blocks.${i}.cyclesPerYear`,
      `Cycles per year of block ${i + 1}`,
      plain(block.cyclesPerYear),
      'cycles/year',
      [0, 1e9],
      'Give the number of cycles in one year of service.',
      true,
    ),
  ]);
  const stages = (fatigue?.law.stages ?? []).flatMap((stage, i) => [
    ...bound(
      `growth.fatigue.law.stages.${i}.coefficient`,
      `Growth coefficient of stage ${i + 1}`,
      plain(stage.coefficient),
      'mm/cycle',
      [0, 1],
      'Give the coefficient for mm/cycle and MPa·√mm.',
    ),
    ...bound(
      `growth.fatigue.law.stages.${i}.exponent`,
      `Growth exponent of stage ${i + 1}`,
      plain(stage.exponent),
      '',
      [0.5, 15],
      'Exponents of published laws lie between 1 and 9.',
      true,
    ),
  ]);
  const threshold = fatigue ? plain(fatigue.law.thresholdMPaSqrtMm) : null;
  return [
    ...blocks,
    ...stages,
    ...bound(
      'growth.fatigue.law.thresholdMPaSqrtMm',
      'Growth threshold',
      threshold,
      'MPa·√mm',
      [0, 1000],
      'Give it in MPa·√mm.',
      true,
    ),
    ...bound(
      'growth.stressCorrosion.depthRateMmPerYear',
      'Stress corrosion rate into the wall',
      stressCorrosion && stressCorrosion.depthRateMmPerYear,
      'mm/year',
      [0, 1000],
      'Give it in mm/year.',
      true,
    ),
    ...bound(
      'growth.stressCorrosion.endRateMmPerYear',
      'Stress corrosion rate at each end',
      stressCorrosion && stressCorrosion.endRateMmPerYear,
      'mm/year',
      [0, 1000],
      'Give it in mm/year.',
      true,
    ),
    ...bound(
      'horizonYears',
      'Horizon',
      plain(horizonYears),
      'years',
      [0, 100],
      'Give it in years, at most 100.',
    ),
  ];
}
