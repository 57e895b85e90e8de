import { lrMax, optionOne, type DiagramMaterial } from './option-one';

/** One point of the drawn line. */
export interface LinePoint {
  readonly lr: number;
  readonly kr: number;
}

/**
 * The Option 1 line as points from Lr = 0 to the cut-off and down to the axis, for drawing. Where the line
 * jumps (a yield plateau) both ends of the jump are there.
 */
export function optionOneLine(material: DiagramMaterial, intervals = 60): readonly LinePoint[] {
  const end = lrMax(material);
  const curve = Array.from({ length: intervals + 1 }, (_, i) => {
    const lr = (end * i) / intervals;
    return { lr, kr: optionOne(lr, material) };
  });
  const beforeJump = material.yieldPlateau ? [{ lr: 1, kr: 1 / Math.sqrt(1.5) }] : [];
  const last = curve[intervals] as LinePoint;
  return [...curve.slice(0, -1), ...beforeJump, last, { lr: end, kr: 0 }];
}
