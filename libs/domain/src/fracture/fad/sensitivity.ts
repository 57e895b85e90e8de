/** One input of a sensitivity study. */
export interface VariedInput {
  readonly name: string;
  readonly value: number;
  /** A change that is plausible either way, in the unit of the value. */
  readonly change: number;
}

/** What one input does to the reserve. */
export interface InputEffect {
  readonly name: string;
  /** Relative change of the reserve per relative change of the input; null where there is none to take. */
  readonly elasticity: number | null;
  /** Reserve with the input less, and more, its plausible change; null where no reserve exists. */
  readonly low: number | null;
  readonly high: number | null;
  /** Distance between the two, what the bars are sorted by; 0 where one is missing. */
  readonly swing: number;
}

/** Reserve for a set of values, one for each input in its order; null or not finite where none exists. */
export type ReserveOf = (values: readonly number[]) => number | null;

const SMALL_STEP = 1e-4;

/** Effect of every input on a reserve, the strongest first; inputs of equal effect keep their order. */
export function sensitivity(
  inputs: readonly VariedInput[],
  reserveOf: ReserveOf,
): readonly InputEffect[] {
  const values = inputs.map(({ value }) => value);
  const at = (index: number, value: number): number | null => {
    const reserve = reserveOf(values.map((old, i) => (i === index ? value : old)));
    return reserve !== null && Number.isFinite(reserve) ? reserve : null;
  };
  return inputs
    .map(({ name, value, change }, i) => {
      const low = at(i, value - Math.abs(change));
      const high = at(i, value + Math.abs(change));
      const swing = low !== null && high !== null ? Math.abs(high - low) : 0;
      return { name, elasticity: elasticityOf((x) => at(i, x), value), low, high, swing };
    })
    .sort((a, b) => b.swing - a.swing);
}

/** Central difference of the logarithms. */
function elasticityOf(reserveAt: (x: number) => number | null, value: number): number | null {
  const [low, high] = [value * (1 - SMALL_STEP), value * (1 + SMALL_STEP)];
  const [less, more] = [reserveAt(low), reserveAt(high)];
  if (value === 0 || less === null || more === null || !(less > 0 && more > 0)) return null;
  return Math.log(more / less) / Math.log(high / low);
}
