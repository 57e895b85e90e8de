import { refused, type Refusal, type Refused } from '../../geometry/refusal';
import { monotoneCubic, type MonotoneCurve } from '../../numerics/monotone-cubic';
import { brokenCurveLimits, type CurveInput, type TruePoint } from './curve-limits';
import {
  trueStrain,
  trueStress,
  type CurveStep,
  type StressStrainCurve,
} from './stress-strain-curve';

/** A stress–strain curve from points, or why the points do not make one. */
export type MeasuredCurve =
  { readonly status: 'found'; readonly curve: StressStrainCurve } | Refused;

/**
 * Curve through measured points, engineering or true. The secant ratio E ε/σ is interpolated between them in
 * the double-logarithmic plot by a monotone cubic: an elastic part and a power law are then exact. Two true
 * points at one stress make a step. Nothing is extrapolated.
 */
export function measuredCurve(input: CurveInput): MeasuredCurve {
  const points = truePoints(input);
  const refusals: readonly Refusal[] = brokenCurveLimits(input, points);
  if (refusals.length > 0) return refused(...refusals);
  const nodes = points.map((point) => ({ ...point, ratio: ratioOf(input, point) }));
  const rising = nodes.map((node, i) => ({
    ...node,
    // scatter in the elastic part must not make the secant rise again
    ratio: nodes.slice(0, i + 1).reduce((most, { ratio }) => Math.max(most, ratio), 1),
  }));
  return { status: 'found', curve: curveThrough(rising) };
}

/** Points in true stress and strain, the origin left out. */
function truePoints({ points, values }: CurveInput): readonly TruePoint[] {
  return points
    .filter(({ strain, stressMPa }) => !(strain === 0 && stressMPa === 0))
    .map(({ strain, stressMPa }) =>
      values === 'true'
        ? { strain, stress: stressMPa }
        : { strain: trueStrain(strain), stress: trueStress(stressMPa, strain) },
    );
}

const ratioOf = ({ youngsModulusMPa }: CurveInput, { strain, stress }: TruePoint): number =>
  (youngsModulusMPa * strain) / stress;

interface Node extends TruePoint {
  readonly ratio: number;
}

function curveThrough(nodes: readonly Node[]): StressStrainCurve {
  const runs = runsOf(nodes);
  const curves = runs.map((run) => ({ from: run[0]?.stress ?? 0, curve: inLogarithms(run) }));
  const [first] = nodes;
  const last = nodes[nodes.length - 1];
  const secantRatio = (stress: number): number => {
    // elastic at no load, and joined to the first point
    if (!first || stress <= first.stress) {
      const share = first && stress > 0 ? stress / first.stress : 0;
      return (first?.ratio ?? 1) ** (share * share);
    }
    let run = curves.length - 1;
    while (run > 0 && (curves[run]?.from ?? 0) > stress) run--;
    return Math.exp(curves[run]?.curve.at(Math.log(stress)) ?? 0);
  };
  return {
    title: `measured stress–strain curve of ${nodes.length} points`,
    source: 'tensile test',
    secantRatio,
    lastStressMPa: last?.stress ?? 0,
    steps: stepsOf(runs),
  };
}

/** Runs of points of strictly increasing stress; a new one starts where strain grew at one stress. */
function runsOf(nodes: readonly Node[]): readonly (readonly Node[])[] {
  const starts = nodes.flatMap((node, i) => (node.stress === nodes[i - 1]?.stress ? [i] : []));
  return [0, ...starts].map((start, i) => nodes.slice(start, starts[i]));
}

function stepsOf(runs: readonly (readonly Node[])[]): readonly CurveStep[] {
  return runs.slice(1).flatMap((run, i) => {
    const [before, after] = [runs[i]?.at(-1), run[0]];
    return before && after
      ? [{ stressMPa: after.stress, before: before.ratio, after: after.ratio }]
      : [];
  });
}

function inLogarithms(run: readonly Node[]): Pick<MonotoneCurve, 'at'> {
  const ratios = run.map(({ ratio }) => Math.log(ratio));
  const [only = 0] = ratios;
  return run.length > 1
    ? monotoneCubic(
        run.map(({ stress }) => Math.log(stress)),
        ratios,
      )
    : { at: () => only };
}
