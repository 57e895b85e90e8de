import type { Refusal } from '@ligament/domain/geometry/refusal';

/** Refusals sorted by where the form shows them. */
export interface ShownRefusals {
  /** By the name of the field or the path of the cell. */
  readonly atFields: ReadonlyMap<string, string>;
  /** Fields that are still empty; nothing is wrong with them yet. */
  readonly missing: ReadonlySet<string>;
  /** What belongs to no field of the form. */
  readonly others: readonly Refusal[];
}

const NOTHING_ENTERED = 'NaN';

export function refusalsInForm(
  refusals: readonly Refusal[],
  fields: ReadonlySet<string>,
): ShownRefusals {
  const shown = (input: string) => fields.has(input) || /\.\d+\./.test(input);
  const empty = refusals.filter(({ value }) => value === NOTHING_ENTERED);
  const wrong = refusals.filter(({ value }) => value !== NOTHING_ENTERED);
  return {
    missing: new Set(empty.map(({ input }) => input)),
    atFields: new Map(
      wrong
        .filter(({ input }) => shown(input))
        .map(({ input, message, instead }) => [input, `${message} ${instead}`]),
    ),
    others: wrong.filter(({ input }) => !shown(input)),
  };
}
