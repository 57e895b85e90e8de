import { reserveOnLoad } from './reserve-on-load';
import type { DiagramLine, LinePoint } from './diagram-line';

/** A point of the diagram with the factor along its ray to the line; below 1 outside. */
export interface RatedPoint<P extends LinePoint> {
  readonly point: P;
  /** Null where the point is the origin: no factor reaches the line. */
  readonly factor: number | null;
}

/** Factor on both ratios that brings a point to the line or to the cut-off; null at the origin. */
export function rayFactor({ lr, kr }: LinePoint, line: DiagramLine): number | null {
  if (lr <= 0 && kr <= 0) return null;
  const margin = (factor: number) =>
    Math.min(line.height(factor * lr) - factor * kr, line.lrMax - factor * lr);
  // the line starts at 1 and never rises above it
  const largest = Math.min(lr > 0 ? line.lrMax / lr : Infinity, kr > 0 ? 1 / kr : Infinity);
  return reserveOnLoad(margin, largest);
}

/** The point nearest to the line along its ray, the first of equals; null without points. */
export function governingPoint<P extends LinePoint>(
  points: readonly P[],
  line: DiagramLine,
): RatedPoint<P> | null {
  return points
    .map((point) => ({ point, factor: rayFactor(point, line) }))
    .reduce<RatedPoint<P> | null>(
      (least, rated) =>
        least === null || (rated.factor ?? Infinity) < (least.factor ?? Infinity) ? rated : least,
      null,
    );
}
