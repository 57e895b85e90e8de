import {
  FULL_CIRCUMFERENCE_INSIDE,
  FULL_CIRCUMFERENCE_OUTSIDE,
  LONG_AXIAL_INSIDE,
  LONG_AXIAL_OUTSIDE,
  type LongCrackRow,
} from '../../verification/data/long-crack-rows';
import { heldStripFactor, shellRestraint } from './held-strip';
import { ringRestraint } from './long-crack';

/** Columns uⁱ αʲ of the fit, then what it must meet: the coefficient over that of the held strip, less one. */
function equationOf(row: LongCrackRow, restraint: (wall: number) => number): readonly number[] {
  const [wall, depth, g0] = row;
  const u = 1 / (wall + 2);
  const columns = [1, 2, 3].flatMap((i) => [1, 2, 3, 4].map((j) => u ** i * depth ** j));
  return [...columns, g0 / heldStripFactor(0, depth, restraint(wall)) - 1];
}

const dot = (a: readonly number[], b: readonly number[]): number =>
  a.reduce((sum, value, i) => sum + value * (b[i] ?? 0), 0);

const column = (rows: readonly (readonly number[])[], k: number) => rows.map((row) => row[k] ?? 0);

/** Least squares by Gram and Schmidt: what the fit of the rows gives at one more set of columns. */
function predicted(rows: readonly (readonly number[])[], at: readonly number[]): number {
  const basis: (readonly number[])[] = [];
  const values: number[] = [];
  let answer = 0;
  let rest = column(rows, 12);
  for (let k = 0; k < 12; k++) {
    let own = column(rows, k);
    let here = at[k] ?? 0;
    for (const [m, earlier] of basis.entries()) {
      const share = dot(own, earlier);
      own = own.map((value, i) => value - share * (earlier[i] ?? 0));
      here -= share * (values[m] ?? 0);
    }
    const length = Math.sqrt(dot(own, own));
    const unit = own.map((value) => value / length);
    const share = dot(rest, unit);
    rest = rest.map((value, i) => value - share * (unit[i] ?? 0));
    answer += (share * here) / length;
    basis.push(unit);
    values.push(here / length);
  }
  return answer;
}

const CASES = [
  ['axial inside', LONG_AXIAL_INSIDE, ringRestraint],
  ['axial outside', LONG_AXIAL_OUTSIDE, ringRestraint],
  ['circumference inside', FULL_CIRCUMFERENCE_INSIDE, shellRestraint],
  ['circumference outside', FULL_CIRCUMFERENCE_OUTSIDE, shellRestraint],
] as const;

describe.each(CASES)('the form of the fit, %s', (_, rows, restraint) => {
  const equations = rows.map((row) => equationOf(row, restraint));

  it('meets a result left out of it within 0.5 %, but for the thickest wall', () => {
    for (const [k, left] of equations.entries()) {
      if (rows[k]?.[0] === 1) continue;
      const others = equations.filter((__, i) => i !== k);
      expect(Math.abs(predicted(others, left) - (left[12] ?? 0))).toBeLessThan(0.005);
    }
  });

  it.each([5, 10, 20, 100])('meets a whole radius left out of it within 0.5 %: Ri/t %d', (wall) => {
    const others = equations.filter((__, i) => rows[i]?.[0] !== wall);
    for (const [k, left] of equations.entries()) {
      if (rows[k]?.[0] !== wall) continue;
      expect(Math.abs(predicted(others, left) - (left[12] ?? 0))).toBeLessThan(0.005);
    }
  });
});
