/** One sized point of a flaw: along the wall, and through it [mm]. */
export interface SizedPoint {
  readonly alongMm: number;
  readonly depthMm: number;
}

/** The rectangle around the sized points, parallel to the wall. */
export interface BoundingRectangle {
  readonly lengthMm: number;
  readonly heightMm: number;
  /** Distance of its nearer long side to the face the depths count from. */
  readonly toFaceMm: number;
}

/**
 * The rectangle that holds every sized point: length and height are its sides, for a flaw of any outline.
 * @param points sized points along the wall and through it [mm]
 * @returns length, height and distance to the face; null without a point, or where one is no number [mm]
 * @validity depths counted from one face
 * @source definition, BS 7910 and API 579-1 (from memory)
 * @example boundingRectangle([{ alongMm: 0, depthMm: 3 }, { alongMm: 9, depthMm: 8 }]).heightMm // 5
 */
export function boundingRectangle(points: readonly SizedPoint[]): BoundingRectangle | null {
  const along = points.map(({ alongMm }) => alongMm);
  const depth = points.map(({ depthMm }) => depthMm);
  if (points.length === 0 || ![...along, ...depth].every(Number.isFinite)) return null;
  const top = Math.min(...depth);
  return {
    lengthMm: Math.max(...along) - Math.min(...along),
    heightMm: Math.max(...depth) - top,
    toFaceMm: top,
  };
}

/**
 * Area of the ellipse that bounds a flaw: half of one for a surface flaw.
 * @param kind surface or embedded [-]
 * @param a depth, or half height when embedded [mm]
 * @param c half length [mm]
 * @returns area [mm²]
 * @validity a, c > 0
 * @source definition
 * @example boundingArea('surface', 5, 15) // 117.8097245096
 */
export const boundingArea = (kind: 'surface' | 'embedded', a: number, c: number): number =>
  (kind === 'surface' ? 0.5 : 1) * Math.PI * a * c;
