import { outOfBounds, type NumberRule, type Refusal } from '../../geometry/refusal';
import type { FatigueFlaw, FlawTable } from './flaw-table';
import { LONGEST, SHORTEST } from './room-left';

/** Depth, as a share of the wall, at which the way ends, and half length as a share of the width. */
export const MOST_DEPTH = 0.8;
export const MOST_HALF_LENGTH = 0.25;

const SIZE = { least: 0.02, most: 1e5 };
const STRESS = 1e5;
const RANGE = { least: 1, most: 1e6 };

/** What the numbers of a flaw must keep, each in words for a refusal. */
export function flawRefusals(flaw: FatigueFlaw): readonly Refusal[] {
  const { thicknessMm, widthMm, depthMm, halfLengthMm } = flaw;
  const plain = outOfBounds([
    size('thicknessMm', 'Wall thickness', thicknessMm),
    size('widthMm', 'Width of the plate', widthMm === Infinity ? SIZE.most : widthMm),
    size('depthMm', 'Depth of the flaw', depthMm),
    size('halfLengthMm', 'Half length of the flaw', halfLengthMm),
    stress('membraneRangeMPa', 'Range of membrane stress', flaw.membraneRangeMPa, 0),
    stress('bendingRangeMPa', 'Range of bending stress', flaw.bendingRangeMPa, -STRESS),
    {
      input: 'limitRangeMPaSqrtMm',
      name: 'Range of K at the toughness',
      unit: 'MPa·√mm',
      value: flaw.limitRangeMPaSqrtMm,
      min: RANGE.least,
      max: RANGE.most,
      instead: 'Give it in MPa·√mm; 1 MPa·√m is 31.62 MPa·√mm.',
    },
  ]);
  return plain.length > 0
    ? plain
    : outOfBounds([
        ratio('depthMm', 'a/t', depthMm / thicknessMm, 0, MOST_DEPTH),
        ratio('halfLengthMm', 'a/c', depthMm / halfLengthMm, LONGEST, SHORTEST),
        ratio('halfLengthMm', 'c/W', halfLengthMm / widthMm, 0, MOST_HALF_LENGTH),
      ]);
}

/** Whether a row of a table keeps the same bounds. */
export function rowStands(table: FlawTable, row: number): boolean {
  const t = table.thicknessMm[row] as number;
  const width = table.widthMm[row] as number;
  const a = table.depthMm[row] as number;
  const c = table.halfLengthMm[row] as number;
  const membrane = table.membraneRangeMPa[row] as number;
  const bending = table.bendingRangeMPa[row] as number;
  const limit = table.limitRangeMPaSqrtMm[row] as number;
  return (
    sized(t) &&
    (width === Infinity || sized(width)) &&
    sized(a) &&
    sized(c) &&
    membrane >= 0 &&
    membrane <= STRESS &&
    bending >= -STRESS &&
    bending <= STRESS &&
    limit >= RANGE.least &&
    limit <= RANGE.most &&
    a / t <= MOST_DEPTH &&
    a / c >= LONGEST &&
    a / c <= SHORTEST &&
    c / width <= MOST_HALF_LENGTH
  );
}

const sized = (x: number) => x >= SIZE.least && x <= SIZE.most;

const size = (input: string, name: string, value: number): NumberRule => ({
  input,
  name,
  unit: 'mm',
  value,
  min: SIZE.least,
  max: SIZE.most,
  instead: 'Give the size in mm.',
});

const stress = (input: string, name: string, value: number, min: number): NumberRule => ({
  input,
  name,
  unit: 'MPa',
  value,
  min,
  max: STRESS,
  instead: 'Give the stress in MPa.',
});

const ratio = (
  input: string,
  name: string,
  value: number,
  min: number,
  max: number,
): NumberRule => ({
  input,
  name,
  unit: '',
  value,
  min,
  max,
  instead: 'Use the full assessment, which chooses among several solutions.',
});
