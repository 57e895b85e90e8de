import type { AssessmentInput } from './assessment-input';
import type { WallShape } from '../geometry/flaw-kind';
import { readGivenNumbers, readNumbers } from './read-numbers';

/** What one number of the input may be, and what a value far outside usually means. */
export interface Bound {
  readonly path: string;
  readonly name: string;
  readonly unit: string;
  readonly min: number;
  readonly max: number;
  readonly hint: string;
  /** The lower bound itself is not allowed. */
  readonly above: boolean;
}

/** A bound with the value found at its path. */
export interface BoundedValue extends Bound {
  readonly value: number;
}

const LENGTH = 'Give it in millimetres; a value in metres or inches is the usual mistake.';
const STRESS = 'Give it in MPa (N/mm²); a value in kPa, psi or ksi is the usual mistake.';
const PRESSURE = 'Give it in MPa; a value in bar is ten times too large.';
const MODULUS = 'Give it in MPa: steel has about 207 000 MPa, which is 207 GPa.';
const TOUGHNESS = 'Give it in MPa·√m; a value in MPa·√mm is 31.6 times larger.';
const RANGE = 'Give the range from least to greatest stress in MPa, not the amplitude.';
const LAW = 'Give the law for mm/cycle and MPa·√mm.';
const RATE = 'Give it in mm/year.';
const LIGAMENT = 'An embedded flaw needs the ligament to the face, in millimetres.';
const CELSIUS = 'Give it in degrees Celsius.';
const OWN_LAW = 'Give the law for mm/year with K in MPa·√m.';
const FACTOR = 'A partial factor is at least 1; 1 changes nothing.';
const TENSION = `Membrane compression is not a case for this method. ${STRESS}`;

type Row = readonly [
  path: string,
  name: string,
  unit: string,
  min: number,
  max: number,
  hint: string,
  above?: 'above',
];

// the ranges catch mistakes of unit, not of engineering
const ALWAYS: readonly Row[] = [
  ['wall.thicknessMm', 'Wall thickness', 'mm', 1, 1000, LENGTH],
  ['flaw.heightMm', 'Flaw height', 'mm', 0, 1000, LENGTH, 'above'],
  ['flaw.lengthMm', 'Flaw length', 'mm', 0, 1e5, LENGTH, 'above'],
  ['sizing.heightAllowanceMm', 'Height allowance', 'mm', 0, 50, LENGTH],
  ['sizing.lengthAllowanceMm', 'Length allowance', 'mm', 0, 500, LENGTH],
  ['stress.primaryMembraneMPa', 'Primary membrane stress', 'MPa', 0, 2000, TENSION],
  ['stress.primaryBendingMPa', 'Primary bending stress', 'MPa', -2000, 2000, STRESS],
  ['stress.crackFacePressureMPa', 'Pressure on the crack faces', 'MPa', 0, 200, PRESSURE],
  ['material.yieldMPa', 'Yield strength', 'MPa', 50, 2000, STRESS],
  ['material.tensileMPa', 'Tensile strength', 'MPa', 50, 3000, STRESS],
  ['material.youngsModulusMPa', 'Young’s modulus', 'MPa', 3e4, 4.5e5, MODULUS],
  ['material.poissonsRatio', 'Poisson’s ratio', '', 0, 0.5, 'Steel has about 0.3.'],
  ['material.toughnessMPaSqrtM', 'Fracture toughness', 'MPa·√m', 5, 1000, TOUGHNESS],
  ['growth.fatigue.blocks.*.membraneRangeMPa', 'Membrane range', 'MPa', 0, 4000, RANGE],
  ['growth.fatigue.blocks.*.bendingRangeMPa', 'Bending range', 'MPa', 0, 4000, RANGE],
  ['growth.fatigue.blocks.*.cyclesPerYear', 'Cycles', 'per year', 0, 1e9, 'Count one year.'],
  ['growth.fatigue.law.stages.*.coefficient', 'Growth coefficient', '', 0, 1, LAW, 'above'],
  ['growth.fatigue.law.stages.*.exponent', 'Growth exponent', '', 0.5, 15, LAW],
  ['growth.fatigue.law.thresholdMPaSqrtMm', 'Growth threshold', 'MPa·√mm', 0, 1000, LAW],
  ['growth.stressCorrosion.depthRateMmPerYear', 'Rate into the wall', 'mm/year', 0, 1000, RATE],
  ['growth.stressCorrosion.endRateMmPerYear', 'Rate at each end', 'mm/year', 0, 1000, RATE],
  ['horizonYears', 'Horizon', 'years', 0, 100, 'Give it in years, at most 100.', 'above'],
];

const WIDTH: Row = ['wall.widthMm', 'Plate width', 'mm', 1, 1e6, LENGTH];
const BORE: Row = ['wall.insideDiameterMm', 'Inside diameter', 'mm', 10, 1e5, LENGTH];
const HOLE: Row = ['wall.holeRadiusMm', 'Hole radius', 'mm', 1, 1e4, LENGTH];
const EMBEDDED: Row = ['flaw.ligamentMm', 'Ligament', 'mm', 0, 1000, LIGAMENT];
const ENTERED: readonly Row[] = [
  ['stress.residual.membraneMPa', 'Residual membrane stress', 'MPa', -2000, 2000, STRESS],
  ['stress.residual.bendingMPa', 'Residual bending stress', 'MPa', -2000, 2000, STRESS],
];
const PROOF: readonly Row[] = [
  ['stress.residual.membraneMPa', 'Membrane stress of the proof test', 'MPa', 0, 2000, STRESS],
  ['stress.residual.bendingMPa', 'Bending stress of the proof test', 'MPa', -2000, 2000, STRESS],
];

const OF_SHAPE: Readonly<Record<WallShape, readonly Row[]>> = {
  plate: [WIDTH],
  cylinder: [BORE],
  sphere: [BORE],
  'hole edge': [HOLE, WIDTH],
  'nozzle corner': [HOLE],
  'round bar': [],
};

/** Inputs that may be left out altogether. */
const OPTIONAL: readonly Row[] = [
  ['stress.primaryProfileMPa.value.*', 'Primary stress polynomial', 'MPa', -5000, 5000, STRESS],
  ['stress.peakProfileMPa.value.*', 'Stress across the corner', 'MPa', -5000, 5000, STRESS],
  ['stress.residual.profileMPa.value.*', 'Residual stress polynomial', 'MPa', -5000, 5000, STRESS],
  ['stress.weldToe.attachmentLengthMm', 'Length of the attachment', 'mm', 1, 1000, LENGTH],
  ['stress.offsetMm', 'Offset of the walls', 'mm', -100, 100, LENGTH],
  ['material.stressStrainCurve.value.*.strain', 'Strain', '', 0, 1, 'Give it as mm/mm, not in %.'],
  ['material.stressStrainCurve.value.*.stressMPa', 'Stress of the curve', 'MPa', 0, 5000, STRESS],
  ['growth.fatigue.blocks.*.stressRatio', 'Stress ratio', '', -20, 0.99, 'Least over greatest.'],
  ['growth.fatigue.temperatureC', 'Temperature of the cycles', '°C', -273, 1000, CELSIUS],
  ['growth.withTime.temperatureC', 'Metal temperature', '°C', -273, 1000, CELSIUS],
  ['growth.withTime.law.coefficient', 'Coefficient', '', 0, 1e6, OWN_LAW, 'above'],
  ['growth.withTime.law.exponent', 'Exponent', '', 0, 20, OWN_LAW],
  ['growth.withTime.law.thresholdMPaSqrtM', 'Threshold', 'MPa·√m', 0, 200, OWN_LAW],
  ['growth.withTime.law.plateauMmPerYear', 'Plateau', 'mm/year', 0, 1000, RATE, 'above'],
  ['growth.thinning.rateMmPerYear', 'Corrosion rate', 'mm/year', 0, 100, RATE],
  ['neighbours.*.heightMm', 'Height of the neighbour', 'mm', 0, 1000, LENGTH, 'above'],
  ['neighbours.*.lengthMm', 'Length of the neighbour', 'mm', 0, 1e5, LENGTH, 'above'],
  ['neighbours.*.ligamentMm', 'Ligament of the neighbour', 'mm', 0, 1000, LENGTH],
  ['neighbours.*.distanceMm', 'Distance of the neighbour', 'mm', -1e5, 1e5, LENGTH],
  ['neighbours.*.planeOffsetMm', 'Distance of the planes', 'mm', 0, 1e5, LENGTH],
  ['partialFactors.stress', 'Factor on stress', '', 1, 5, FACTOR],
  ['partialFactors.size', 'Factor on size', '', 1, 5, FACTOR],
  ['partialFactors.toughness', 'Factor on toughness', '', 1, 5, FACTOR],
  ['partialFactors.yield', 'Factor on yield strength', '', 1, 5, FACTOR],
];

/** Every number the input holds, or should hold, with its bounds. */
export function inputBounds(input: AssessmentInput): readonly BoundedValue[] {
  const { kind, ligamentMm } = input.flaw;
  const missing = kind === 'embedded' && ligamentMm === null;
  const rows = [
    ...ALWAYS,
    ...OF_SHAPE[input.wall.shape],
    ...(input.stress.residual.state === 'entered' ? ENTERED : []),
    ...(input.stress.residual.state === 'proof-tested' ? PROOF : []),
    ...(kind === 'embedded' && !missing ? [EMBEDDED] : []),
  ];
  const found = rows.flatMap((row) =>
    readNumbers(input, row[0]).map(({ path, value }) => ({ ...boundOf(row), path, value })),
  );
  const optional = OPTIONAL.flatMap((row) =>
    readGivenNumbers(input, row[0]).map(({ path, value }) => ({ ...boundOf(row), path, value })),
  );
  const ligament = missing ? [{ ...boundOf(EMBEDDED), value: Number.NaN }] : [];
  return [...found, ...optional, ...ligament];
}

const boundOf = ([path, name, unit, min, max, hint, above]: Row): Bound => ({
  path,
  name,
  unit,
  min,
  max,
  hint,
  above: above === 'above',
});
