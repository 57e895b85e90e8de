import type { Limit } from '../../geometry/limit';

/** a/c between 0.2 and 2, the shapes the equations for corners and holes were fitted for. */
export const fittedAspect = (source: string): Limit => ({
  name: 'a/c',
  text: '0.2 ≤ a/c ≤ 2',
  min: 0.2,
  max: 2,
  measure: ({ a, c }) => a / c,
  source,
  input: 'flaw.lengthMm',
  instead:
    'Check that height and length are not swapped; assess a long flaw as extended, a steep one as a/c = 2.',
});

/** Depth over the part of the wall that holds the flaw, to 0.8. */
export const fittedDepth = (
  name: string,
  ratio: string,
  source: string,
  share: 1 | 0.5,
): Limit => ({
  name,
  text: `${ratio} ≤ 0.8`,
  min: 0,
  max: 0.8,
  measure: ({ a, thickness }) => a / (share * thickness),
  source: `${source}: range of the fitted results`,
  input: 'flaw.heightMm',
  instead: 'Treat the flaw as through-wall, or ask a specialist for a numerical analysis.',
});

/** Hole radius against the part of the thickness that holds the flaw. */
export const holeRadiusLimit = (source: string, share: 1 | 0.5): Limit => {
  const ratio = share === 1 ? 'r/t' : '2r/t';
  return {
    name: ratio,
    text: `0.5 ≤ ${ratio} ≤ 2`,
    min: 0.5,
    max: 2,
    measure: ({ holeRadius, thickness }) => holeRadius / (share * thickness),
    source: `${source} (range from memory)`,
    input: 'wall.holeRadiusMm',
    instead: 'Assess as a crack of this length through the wall at the hole.',
  };
};

/** Hole and crack against half the width. */
export const holeWidthLimit = (source: string): Limit => ({
  name: '2(r + c)/W',
  text: '2(r + c)/W ≤ 0.5',
  min: 0,
  max: 0.5,
  measure: ({ holeRadius, c, width }) => (2 * (holeRadius + c)) / width,
  source,
  input: 'flaw.lengthMm',
  instead: 'The ligaments beside the hole are narrow: ask a specialist.',
});
