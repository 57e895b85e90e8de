import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';

/** Name and unit of every input, by its path; places of a list stand as `*`. */
const NAMES: Readonly<Record<string, readonly [name: string, unit: string]>> = {
  'wall.shape': ['Wall taken as', ''],
  'wall.thicknessMm': ['Wall thickness', 'mm'],
  'wall.insideDiameterMm': ['Inside diameter', 'mm'],
  'wall.widthMm': ['Plate width', 'mm'],
  'wall.holeRadiusMm': ['Radius of the hole', 'mm'],
  'wall.flawedSides': ['Flawed', ''],
  'flaw.kind': ['Kind of flaw', ''],
  'flaw.face': ['Face', ''],
  'flaw.orientation': ['Orientation', ''],
  'flaw.heightMm': ['Through-wall extent, measured', 'mm'],
  'flaw.lengthMm': ['Length, measured', 'mm'],
  'flaw.ligamentMm': ['Ligament to the face', 'mm'],
  'sizing.heightAllowanceMm': ['Height allowance', 'mm'],
  'sizing.lengthAllowanceMm': ['Length allowance', 'mm'],
  'stress.primaryMembraneMPa': ['Primary membrane stress', 'MPa'],
  'stress.primaryBendingMPa': ['Primary bending stress', 'MPa'],
  'stress.residual.state': ['Residual stress taken as', ''],
  'stress.residual.membraneMPa': ['Residual membrane stress', 'MPa'],
  'stress.residual.bendingMPa': ['Residual bending stress', 'MPa'],
  'stress.residual.profileMPa': ['Residual stress polynomial', 'MPa'],
  'stress.peakProfileMPa': ['Stress across the corner', 'MPa'],
  'stress.primaryProfileMPa': ['Primary stress polynomial', 'MPa'],
  'stress.weldToe.attachmentLengthMm': ['Length of the attachment along the stress', 'mm'],
  'stress.offsetMm': ['Offset of the walls', 'mm'],
  'stress.residual.flawToWeld': ['Flaw against the weld', ''],
  'stress.crackFacePressureMPa': ['Pressure on the crack faces', 'MPa'],
  'material.yieldMPa': ['Yield strength', 'MPa'],
  'material.tensileMPa': ['Tensile strength', 'MPa'],
  'material.youngsModulusMPa': ['Young’s modulus', 'MPa'],
  'material.poissonsRatio': ['Poisson’s ratio', ''],
  'material.toughnessMPaSqrtM': ['Fracture toughness', 'MPa√m'],
  'material.yieldPlateau': ['Yield plateau', ''],
  'growth.fatigue.law.title': ['Growth law', ''],
  'growth.fatigue.law.key': ['Growth law, key', ''],
  'growth.fatigue.law.source': ['Growth law, source', ''],
  'growth.fatigue.law.thresholdMPaSqrtMm': ['Threshold', 'MPa√mm'],
  'growth.fatigue.law.stages.*.coefficient': ['Growth coefficient', ''],
  'growth.fatigue.law.stages.*.exponent': ['Growth exponent', ''],
  'growth.fatigue.blocks.*.membraneRangeMPa': ['Membrane range', 'MPa'],
  'growth.fatigue.blocks.*.bendingRangeMPa': ['Bending range', 'MPa'],
  'growth.fatigue.blocks.*.cyclesPerYear': ['Cycles', 'per year'],
  'growth.fatigue.blocks.*.note': ['Block', ''],
  'growth.stressCorrosion.depthRateMmPerYear': ['Growth rate into the wall', 'mm/year'],
  'growth.stressCorrosion.endRateMmPerYear': ['Growth rate at each end', 'mm/year'],
  horizonYears: ['Growth followed for', 'years'],
};

export interface InputName {
  readonly name: string;
  readonly unit: string;
}

/** An input in the trade's words, from its path in the record, e.g. `growth.fatigue.blocks.0.cyclesPerYear`. */
export function inputName(path: string): InputName {
  const places = [...path.matchAll(/\.(\d+)(?=\.|$)/g)].map(([, place]) => Number(place) + 1);
  const [name, unit] = NAMES[path.replaceAll(/\.\d+(?=\.|$)/g, '.*')] ?? [path, ''];
  return { name: places.length > 0 ? `${name}, ${places.join(', ')}` : name, unit };
}

/** Inputs that are not known, by how weak they are, in words for the caution beside a verdict. */
export interface WeakInputs {
  readonly assumed: readonly string[];
  readonly defaults: readonly string[];
}

export function weakInputs(input: AssessmentInput, paths: readonly string[]): WeakInputs {
  const isDefault = (path: string) => provenanceAt(input, path) === 'standard default';
  const names = (of: readonly string[]) => of.map((path) => withinSentence(inputName(path).name));
  return {
    assumed: names(paths.filter((path) => !isDefault(path))),
    defaults: names(paths.filter(isDefault)),
  };
}

/** A name inside a sentence: its first letter is small unless it belongs to a person. */
export const withinSentence = (name: string): string =>
  /^(Young|Poisson)/.test(name) ? name : name.charAt(0).toLowerCase() + name.slice(1);

function provenanceAt(input: AssessmentInput, path: string): unknown {
  const member = path
    .split('.')
    .reduce<unknown>((data, name) => (isRecord(data) ? data[name] : undefined), input);
  return isRecord(member) ? member['provenance'] : undefined;
}

const isRecord = (data: unknown): data is Readonly<Record<string, unknown>> =>
  typeof data === 'object' && data !== null;
