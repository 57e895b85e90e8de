/** Cut-off of the Level 2 curve by kind of material. */
export interface LevelTwoCutOff {
  readonly key: string;
  readonly title: string;
  readonly lrMax: number;
  readonly source: string;
}

const NOTES = 'API 579-1 Part 9, notes to the diagram (from memory)';

/** Cut-offs of the Level 2 curve. */
export const LEVEL_TWO_CUT_OFFS = {
  unknown: {
    key: 'unknown',
    title: 'Yield plateau, or hardening unknown',
    lrMax: 1,
    source: NOTES,
  },
  carbonManganese: {
    key: 'carbon-manganese',
    title: 'Carbon–manganese steel',
    lrMax: 1.25,
    source: NOTES,
  },
  austenitic: { key: 'austenitic', title: 'Austenitic steel', lrMax: 1.8, source: NOTES },
} as const satisfies Readonly<Record<string, LevelTwoCutOff>>;

/**
 * Level 2 curve: (1 − 0.14 Lr²)[0.3 + 0.7 exp(−0.65 Lr⁶)]; never below 0.
 * @param lr load ratio, Lr [-]
 * @returns height of the line, f [-]
 * @validity 0 ≤ Lr < Lr,max
 * @source API 579-1 Part 9 Level 2, R6 revision 3, BS 7910:2005 Level 2A (from memory)
 * @example levelTwoHeight(0.8) // 0.8105591366
 */
export const levelTwoHeight = (lr: number): number =>
  Math.max(1 - 0.14 * lr * lr, 0) * (0.3 + 0.7 * Math.exp(-0.65 * lr ** 6));
