import type { Crack } from '../../geometry/crack';
import type { Limit } from '../../geometry/limit';

/** Radius at the middle of the wall [mm]. */
export const meanRadius = ({ insideRadius, thickness }: Crack): number =>
  insideRadius + thickness / 2;

/** c/√(Rt): how long a crack is for the shell it is in [-]. */
export const shellLength = (crack: Crack): number =>
  crack.c / Math.sqrt(meanRadius(crack) * crack.thickness);

/** Half angle of a crack around the wall, θ/π [-]. */
export const angleShare = (crack: Crack): number => crack.c / (Math.PI * meanRadius(crack));

/** Bounds on the mean radius over the thickness. */
export const meanRadiusLimit = (min: number, max: number, source: string): Limit => ({
  name: 'R/t',
  text:
    max < Infinity ? `${min} ≤ R/t ≤ ${max}, R the mean radius` : `R/t ≥ ${min}, R the mean radius`,
  min,
  max,
  measure: (crack) => meanRadius(crack) / crack.thickness,
  source,
  input: 'wall.insideDiameterMm',
  instead: 'Ask a specialist for a shell analysis of this flaw.',
});

/** Bound on the length of a crack in a shell. */
export const shellLengthLimit = (max: number, source: string): Limit => ({
  name: 'c/√(Rt)',
  text: `c/√(Rt) ≤ ${max}`,
  min: 0,
  max,
  measure: shellLength,
  source,
  input: 'flaw.lengthMm',
  instead: 'Ask a specialist for a shell analysis of this long flaw.',
});

/** Bound on the inside radius over the thickness of a flaw that is taken as in a plate. */
export const PLATE_LIKE_WALL: Limit = {
  name: 'Ri/t',
  text: 'Ri/t ≥ 5',
  min: 5,
  max: Infinity,
  measure: ({ insideRadius, thickness }) => insideRadius / thickness,
  source: 'common practice',
  input: 'wall.insideDiameterMm',
  instead: 'Ask a specialist for a thick-wall solution.',
};
