import { findRoot } from '../../numerics/find-root';

/** A pipe with a circumferential flaw of even depth over an angle, under tension and bending. */
export interface FlawedPipe {
  /** Half of the angle the flaw spans, θ [rad]. */
  readonly halfAngle: number;
  /** Depth over wall; 1 through the wall [-]. */
  readonly depth: number;
}

/**
 * Bending stress of the pipe at net-section collapse under a given tension, as elastic bending at the mean
 * radius: β = ½(π − (a/t) θ − π Pm/σf), Pb′ = (2σf/π)(2 sin β − (a/t) sin θ); where θ + β > π the flaw reaches
 * into compression: β = π(1 − a/t − Pm/σf)/(2 − a/t), Pb′ = (2σf/π)(2 − a/t) sin β.
 * @param pipe half angle and relative depth of the flaw [rad, -]
 * @param membrane tension, Pm [MPa]
 * @param flow flow stress, σf [MPa]
 * @returns bending stress at collapse, Pb′; below 0 once tension alone collapses the pipe [MPa]
 * @validity thin wall; the second branch takes the flaw as closed in compression
 * @source ASME XI Appendix C form (from memory)
 * @example pipeCollapseBending({ halfAngle: 0.785398163397, depth: 0.5 }, 30, 300) // 290.8389691
 */
export function pipeCollapseBending(
  { halfAngle, depth }: FlawedPipe,
  membrane: number,
  flow: number,
): number {
  const tension = membrane / flow;
  const beta = (Math.PI - depth * halfAngle - Math.PI * tension) / 2;
  if (halfAngle + beta <= Math.PI) {
    return ((2 * flow) / Math.PI) * (2 * Math.sin(beta) - depth * Math.sin(halfAngle));
  }
  const closed = (Math.PI * (1 - depth - tension)) / (2 - depth);
  return ((2 * flow) / Math.PI) * (2 - depth) * Math.sin(closed);
}

/**
 * Reference stress of the pipe under tension and bending together: the flow stress at which they make it
 * collapse.
 * @param pipe half angle and relative depth of the flaw [rad, -]
 * @param membrane tension, Pm [MPa]
 * @param bending bending stress of the pipe at the mean radius, Pb [MPa]
 * @returns reference stress, σref; Infinity once nothing is left [MPa]
 * @validity thin wall; Pm ≥ 0, Pb taken without its sign
 * @source ASME XI Appendix C form (from memory), solved for the flow stress
 * @example pipeCollapseReference({ halfAngle: 0, depth: 0 }, 0, 381.9718634205) // 300
 */
export function pipeCollapseReference(pipe: FlawedPipe, membrane: number, bending: number): number {
  const pb = Math.abs(bending);
  if (membrane === 0 && pb === 0) return 0;
  const missing = (flow: number) => pipeCollapseBending(pipe, membrane, flow) - pb;
  const least = Math.max(membrane, (pb * Math.PI) / 4);
  // a flaw that leaves a thousandth of the strength has left nothing
  const most = 1000 * (membrane + pb);
  if (missing(least) >= 0) return least;
  const root = findRoot(missing, least, most, { tolerance: 1e-10 * most });
  return root.status === 'found' ? root.x : Number.POSITIVE_INFINITY;
}
