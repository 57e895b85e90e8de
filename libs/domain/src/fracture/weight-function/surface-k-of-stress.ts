import type { Crack } from '../../geometry/crack';
import { refused, type Refusal, type Refused } from '../../geometry/refusal';
import type { Degrees, MPaSqrtMm } from '../../units/quantity';
import { brokenLimits } from '../stress-intensity/broken-limits';
import type { Influence, StressIntensitySolution } from '../stress-intensity/solution';
import { deepestCoefficient, faceCoefficient } from './universal-factors';
import { faceKOfStress, tipKOfStress, type WallStressAt } from './weighted-stress';

/** K of any stress at the two ends of a surface crack; a straight front has a deepest point only. */
export interface KOfStress {
  readonly status: 'known';
  readonly deepest: MPaSqrtMm;
  readonly face: MPaSqrtMm | null;
}

const DEGREES = [0, 1, 2, 3] as const;

/**
 * K of any stress over the depth of a surface crack, by the universal weight function with the uniform and linear
 * coefficients of a solution. A closed crack has K = 0. Refused outside the limits of the solution and for a stress
 * that is not a number somewhere.
 */
export function surfaceKOfStress(
  solution: StressIntensitySolution,
  crack: Crack,
  stress: WallStressAt,
): KOfStress | Refused {
  const outside = refusalsOf(solution, crack);
  if (outside.length > 0) return refused(...outside);
  const [deep0, deep1] = factorsAt(solution, crack, 90);
  const deepest = tipKOfStress(
    stress,
    crack.a,
    DEGREES.map((i) => deepestCoefficient(i, deep0, deep1)),
  );
  const face = solution.front === 'ellipse' ? atFace(solution, crack, stress) : null;
  if (!Number.isFinite(deepest) || !Number.isFinite(face ?? 0)) return refused(NO_STRESS);
  return { status: 'known', deepest: opened(deepest), face: face === null ? null : opened(face) };
}

function atFace(solution: StressIntensitySolution, crack: Crack, stress: WallStressAt): number {
  const [g0, g1] = factorsAt(solution, crack, 0);
  return faceKOfStress(
    stress,
    crack.a,
    DEGREES.map((i) => faceCoefficient(i, g0, g1)),
  );
}

const opened = (k: number): MPaSqrtMm => Math.max(k, 0) as MPaSqrtMm;

/** G0 and G1 of a solution at an angle. */
function factorsAt(
  { influence }: StressIntensitySolution,
  crack: Crack,
  angle: number,
): readonly [g0: number, g1: number] {
  const into: Influence = { membrane: 0, bending: 0, reversedBending: 0 };
  influence(crack, angle as Degrees, into);
  const root = Math.sqrt(Math.PI * crack.a);
  return [
    into.membrane / root,
    (into.membrane - into.bending) / (root * 2 * (crack.a / crack.thickness)),
  ];
}

const NO_STRESS: Refusal = {
  input: 'stress',
  limit: 'a number at every depth of the crack',
  value: null,
  message: 'The stress is not a number somewhere over the depth of the crack.',
  instead: 'Give the stress over the whole depth.',
};

/** The front a weight function is known for, and the limits of the solution. */
function refusalsOf(solution: StressIntensitySolution, crack: Crack): readonly Refusal[] {
  if (solution.front === 'through' || crack.ligament > 0) return [NO_SURFACE];
  if (!(crack.a > 0 && crack.thickness > 0)) return [NO_SIZE(crack.a)];
  return brokenLimits(solution.limits, crack);
}

const NO_SURFACE: Refusal = {
  input: 'flaw.kind',
  limit: 'a flaw that opens to one face',
  value: null,
  message: 'The weight function is known for surface flaws only.',
  instead: 'Linearise the stress, or bound the flaw by a surface flaw.',
};

const NO_SIZE = (a: number): Refusal => ({
  input: 'flaw.heightMm',
  limit: 'above 0 mm',
  value: Number.isFinite(a) ? a : String(a),
  message: `The depth is ${String(a)} mm; it must be above 0.`,
  instead: 'Give the depth of the flaw.',
});
