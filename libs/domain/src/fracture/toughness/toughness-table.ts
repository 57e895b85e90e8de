import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import { monotoneCubic } from '../../numerics/monotone-cubic';
import type { Given } from '../../units/provenance';
import { foundFromMPaSqrtM, type ToughnessResult } from './toughness-result';
import { rule } from './toughness-rules';

/** Toughness at one temperature. */
export interface TablePoint {
  readonly temperatureC: number;
  readonly kMPaSqrtM: number;
}

/** Toughness against temperature, with where the table comes from. */
export type ToughnessTable = Given<readonly TablePoint[]>;

/** Toughness between the points of a table; beyond its ends it is refused, not extrapolated. */
export function toughnessFromTable(table: ToughnessTable, temperatureC: number): ToughnessResult {
  const points = [...table.value].sort((a, b) => a.temperatureC - b.temperatureC);
  const broken = brokenTable(points, temperatureC);
  if (broken) return broken;
  const temperatures = points.map((point) => point.temperatureC);
  const [first = Number.NaN] = temperatures;
  const last = temperatures.at(-1) ?? Number.NaN;
  if (temperatureC < first || temperatureC > last) return beyond(temperatureC, first, last);
  const toughnesses = points.map(({ kMPaSqrtM }) => kMPaSqrtM);
  const [only = Number.NaN] = toughnesses;
  const value =
    points.length > 1 ? monotoneCubic(temperatures, toughnesses).at(temperatureC) : only;
  return foundFromMPaSqrtM(value, {
    method: 'Toughness against temperature',
    formula: 'monotone cubic through the points of the table',
    source: `${table.note || 'table as entered'}; interpolation of Fritsch and Butland (1984)`,
    inputs: [`T = ${temperatureC} °C`, `${points.length} points from ${first} to ${last} °C`],
    given: [table],
    temperatureC,
  });
}

function brokenTable(points: readonly TablePoint[], temperatureC: number): Refused | null {
  const refusals = outOfBounds([
    rule('temperature', 'temperatureC', temperatureC),
    ...points.flatMap((point, i) => [
      rule('temperature', `table.${i}.temperatureC`, point.temperatureC),
      rule('toughness', `table.${i}.kMPaSqrtM`, point.kMPaSqrtM),
    ]),
  ]);
  if (refusals.length > 0) return refused(...refusals);
  const twice = points.find((point, i) => point.temperatureC === points[i - 1]?.temperatureC);
  if (points.length > 0 && !twice) return null;
  return refused({
    input: 'table',
    limit: 'at least one point, every temperature once',
    value: twice ? twice.temperatureC : points.length,
    message: twice
      ? `${twice.temperatureC} °C is in the table more than once.`
      : 'The table has no point.',
    instead: 'Give one toughness for every temperature.',
  });
}

const beyond = (temperatureC: number, first: number, last: number): Refused =>
  refused({
    input: 'temperatureC',
    limit: `from ${first} to ${last} °C`,
    value: temperatureC,
    message: `${temperatureC} °C is outside the table, which goes from ${first} to ${last} °C.`,
    instead: 'Test at the temperature, or use a lower bound that holds there.',
  });
