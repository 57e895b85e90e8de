import type { AssessmentInput } from './assessment-input';
import type { Refusal } from './assessment-outcome';
import { solutionsFor } from '../fracture/select-solutions';
import { linearised } from '../fracture/stress-intensity/stress-terms';
import { hasHeight, hasLength, KINDS_OF_WALL } from '../geometry/flaw-kind';
import { checkGrowth } from './check-growth';
import { primaryTerms, situationOf } from './flaw-case';
import { number } from './number-text';

type Rule = (input: AssessmentInput) => Refusal | null;

/** What inputs say to each other: each is in its own range, together they are impossible. */
export const checkRelations = (input: AssessmentInput): readonly Refusal[] => [
  ...RULES.map((rule) => rule(input)).filter((refusal) => refusal !== null),
  ...checkGrowth(input),
];

const kindFitsWall: Rule = ({ wall, flaw }) => {
  const kinds = KINDS_OF_WALL[wall.shape];
  if (kinds.includes(flaw.kind)) return null;
  return {
    input: 'flaw.kind',
    limit: `${wall.shape}: ${kinds.join(', ')}`,
    value: flaw.kind,
    message: `No solution here covers a flaw of kind ${flaw.kind} in a ${wall.shape}.`,
    instead: 'Choose the idealised shape that encloses the flaw, or ask a specialist.',
  };
};

const chosenSolutionExists: Rule = (input) => {
  const entry = solutionsFor(situationOf(input));
  const asked = [
    ['stressIntensityChoice', entry?.stressIntensity],
    ['referenceStressChoice', entry?.referenceStress],
  ] as const;
  for (const [field, solutions] of asked) {
    const key = input[field]?.key;
    const keys = (solutions ?? []).map((each) => each.key);
    if (key === undefined || keys.includes(key)) continue;
    return {
      input: `${field}.key`,
      limit: keys.join(', '),
      value: key,
      message: `The catalogue has no solution called ${key} for this flaw and body.`,
      instead: 'Take the one that governs, or choose one of the list.',
    };
  }
  return null;
};

const peakAtNozzle: Rule = ({ stress, wall }) => {
  if (!stress.peakProfileMPa || wall.shape === 'nozzle corner') return null;
  return {
    input: 'stress.peakProfileMPa',
    limit: 'the corner of a nozzle',
    value: wall.shape,
    message: `A peak stress is given for a ${wall.shape}: its solutions hold the concentration already, or have none.`,
    instead: 'Give the stress through the wall as the primary stress.',
  };
};

const heightLeavesWall: Rule = ({ wall, flaw, sizing }) => {
  if (!hasHeight(flaw.kind)) return null;
  const t = wall.thicknessMm.value;
  const value = flaw.heightMm.value + sizing.heightAllowanceMm.value;
  if (value < t) return null;
  return {
    input: 'flaw.heightMm',
    limit: 'height with allowance below the wall thickness',
    value,
    message: `Height with allowance is ${number(value)} mm in a wall of ${number(t)} mm: nothing of the wall would be left.`,
    instead:
      'Check height and thickness; a flaw through the wall is a leak and is not accepted here.',
  };
};

const ligamentFits: Rule = ({ wall, flaw }) => {
  const value = flaw.kind === 'embedded' ? (flaw.ligamentMm?.value ?? 0) : 0;
  const [t, height] = [wall.thicknessMm.value, flaw.heightMm.value];
  if (value + height <= t || height >= t) return null;
  return {
    input: 'flaw.ligamentMm',
    limit: 'ligament and height within the wall thickness',
    value,
    message: `Ligament ${number(value)} mm and height ${number(height)} mm do not fit into a wall of ${number(t)} mm.`,
    instead: 'Check to which face the ligament was measured.',
  };
};

const lengthNotBelowHeight: Rule = ({ flaw }) => {
  if (!hasHeight(flaw.kind) || !hasLength(flaw.kind)) return null;
  const [height, value] = [flaw.heightMm.value, flaw.lengthMm.value];
  // both mean a/c ≤ 2: a surface flaw's height is a, an embedded one's is 2a
  const least = flaw.kind === 'surface' ? height : height / 2; // a corner flaw's length is c
  if (value >= least) return null;
  return {
    input: 'flaw.lengthMm',
    limit: `length at least ${number(least)} mm (a/c at most 2)`,
    value,
    message: `A flaw ${number(value)} mm long and ${number(height)} mm high is steeper than the solutions hold for.`,
    instead: 'Check that height and length are not swapped.',
  };
};

const lengthInsideWidth: Rule = ({ wall, flaw }) => {
  const flat = wall.shape === 'plate' || wall.shape === 'hole edge';
  const width = flat ? (wall.widthMm?.value ?? Infinity) : Infinity;
  const value = flaw.lengthMm.value;
  if (value < width) return null;
  return {
    input: 'flaw.lengthMm',
    limit: 'length below the plate width',
    value,
    message: `Length ${number(value)} mm reaches the width of the plate, ${number(width)} mm.`,
    instead: 'Check length and width; a flaw across the whole width needs another solution.',
  };
};

const tensileAboveYield: Rule = ({ material }) => {
  const [yields, value] = [material.yieldMPa.value, material.tensileMPa.value];
  if (value >= yields) return null;
  return {
    input: 'material.tensileMPa',
    limit: 'tensile strength not below yield strength',
    value,
    message: `Tensile strength ${number(value)} MPa is below the yield strength ${number(yields)} MPa.`,
    instead: 'Check that the two are not swapped.',
  };
};

const somePrimaryStress: Rule = ({ stress, wall }) => {
  const { membrane, bending } = linearised(primaryTerms(stress, wall.thicknessMm.value));
  const value = membrane + Math.abs(bending);
  if (value > 0 && membrane >= 0) return null;
  return {
    input: 'stress.primaryMembraneMPa',
    limit: 'some primary stress above 0 MPa',
    value,
    message: 'There is no primary stress, so no reserve on load exists.',
    instead: 'Give the stress of the governing load.',
  };
};

const neighboursCanBe: Rule = ({ neighbours, flaw, wall }) => {
  if (!neighbours?.length) return null;
  if (flaw.kind === 'surface' || flaw.kind === 'embedded') {
    const missing = neighbours.findIndex(
      ({ kind, ligamentMm }) => kind === 'embedded' && ligamentMm === null,
    );
    if (missing < 0 && wall.shape !== 'round bar') return null;
  }
  return {
    input: 'neighbours',
    limit: 'surface and embedded flaws of one wall, embedded ones with their ligament',
    value: flaw.kind,
    message:
      'The rules of interaction hold for surface and embedded flaws whose ligaments are known.',
    instead: 'Give the ligament of every embedded neighbour, or assess the enclosing flaw.',
  };
};

const RULES: readonly Rule[] = [
  kindFitsWall,
  neighboursCanBe,
  chosenSolutionExists,
  peakAtNozzle,
  heightLeavesWall,
  ligamentFits,
  lengthNotBelowHeight,
  lengthInsideWidth,
  tensileAboveYield,
  somePrimaryStress,
];
