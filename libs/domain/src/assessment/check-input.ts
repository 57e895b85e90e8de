import type { AssessmentInput } from './assessment-input';
import type { Refusal } from './assessment-outcome';
import { inputBounds, type Bound } from './input-bounds';
import { number } from './number-text';

/** Every input that is impossible or cannot be meant, with its limit; empty when the input can be assessed. */
export function checkInput(input: AssessmentInput): readonly Refusal[] {
  const single = inputBounds(input).filter(outOfBounds).map(refuseBound);
  // sizes that are no numbers cannot be compared with each other
  return single.length > 0 ? single : relations(input);
}

const outOfBounds = ({ value, min, max, minAllowed }: Bound): boolean =>
  !(value <= max && (minAllowed ? value >= min : value > min));

function refuseBound({ path, name, unit, value, min, max, minAllowed, hint }: Bound): Refusal {
  const finite = Number.isFinite(value);
  const low = minAllowed ? `at least ${number(min)}` : `above ${number(min)}`;
  const limit = `${low} and at most ${number(max)} ${unit}`.trim();
  const got = finite ? `is ${number(value)} ${unit}`.trim() : 'is not a number';
  return {
    input: path,
    limit,
    value: finite ? value : String(value),
    message: `${name} ${got}; it must be ${limit}.`,
    instead: hint,
  };
}

interface Relation {
  readonly broken: boolean;
  readonly refusal: Refusal;
}

const relation = (
  broken: boolean,
  input: string,
  limit: string,
  value: number,
  message: string,
  instead: string,
): Relation => ({
  broken,
  refusal: { input, limit, value, message, instead },
});

function relations({ wall, flaw, sizing, stress, material, growth }: AssessmentInput): Refusal[] {
  const t = wall.thicknessMm.value;
  const height = flaw.heightMm.value + sizing.heightAllowanceMm.value;
  const ligament = flaw.kind === 'embedded' ? (flaw.ligamentMm?.value ?? 0) : 0;
  const [measured, length] = [flaw.heightMm.value, flaw.lengthMm.value];
  const width = wall.shape === 'plate' ? (wall.widthMm?.value ?? Infinity) : Infinity;
  const [yields, tensile] = [material.yieldMPa.value, material.tensileMPa.value];
  const primary = stress.primaryMembraneMPa.value + Math.abs(stress.primaryBendingMPa.value);
  const checks = [
    relation(
      height >= t,
      'flaw.heightMm',
      'height with allowance below the wall thickness',
      height,
      `Height with allowance is ${number(height)} mm in a wall of ${number(t)} mm: nothing of the wall would be left.`,
      'Check height and thickness; a flaw through the wall is a leak and is not accepted here.',
    ),
    relation(
      height < t && ligament + measured > t,
      'flaw.ligamentMm',
      'ligament and height within the wall thickness',
      ligament,
      `Ligament ${number(ligament)} mm and height ${number(measured)} mm do not fit into a wall of ${number(t)} mm.`,
      'Check to which face the ligament was measured.',
    ),
    relation(
      length < (flaw.kind === 'surface' ? measured : measured / 2),
      'flaw.lengthMm',
      'length not below height',
      length,
      `Length ${number(length)} mm is below what a height of ${number(measured)} mm allows (a/c at most 2).`,
      'Check that height and length are not swapped.',
    ),
    relation(
      length >= width,
      'flaw.lengthMm',
      'length below the plate width',
      length,
      `Length ${number(length)} mm reaches the width of the plate, ${number(width)} mm.`,
      'Check length and width; a flaw across the whole width needs another solution.',
    ),
    relation(
      tensile < yields,
      'material.tensileMPa',
      'tensile strength not below yield strength',
      tensile,
      `Tensile strength ${number(tensile)} MPa is below the yield strength ${number(yields)} MPa.`,
      'Check that the two are not swapped.',
    ),
    relation(
      !(primary > 0),
      'stress.primaryMembraneMPa',
      'some primary stress above 0 MPa',
      primary,
      'There is no primary stress, so no reserve on load exists.',
      'Give the stress of the governing load.',
    ),
    relation(
      growth.fatigue !== null && growth.fatigue.law.stages.length === 0,
      'growth.fatigue.law.stages',
      'at least one stage',
      0,
      'The growth law has no stage.',
      'Choose a law of the site’s library.',
    ),
    ...stageOrder(growth),
  ];
  return checks.filter(({ broken }) => broken).map(({ refusal }) => refusal);
}

function stageOrder({ fatigue }: AssessmentInput['growth']): Relation[] {
  const stages = fatigue?.law.stages ?? [];
  return stages.slice(1).map((stage, i) => {
    const same = stage.exponent === stages[i]?.exponent;
    return relation(
      same,
      `growth.fatigue.law.stages.${i + 1}.exponent`,
      'stages of different exponent',
      stage.exponent,
      'Two stages of the growth law have the same exponent: they never meet.',
      'Give them as one stage.',
    );
  });
}
