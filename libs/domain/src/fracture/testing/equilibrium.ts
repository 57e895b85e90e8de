import { noStress, type PlaneStress, type StressField } from '../stress-state';

/** What is left of equilibrium and of compatibility at a point, per unit of stress and length. */
export interface Residue {
  readonly alongX: number;
  readonly alongY: number;
  /** Laplacian of σxx + σyy, zero in an elastic plate without body force. */
  readonly laplacian: number;
}

/** Residues of a stress field by central differences of step h; none for an exact elastic field. */
export function residueAt(field: StressField, x: number, y: number, h: number): Residue {
  const at = (i: number, j: number): PlaneStress => field(x + i * h, y + j * h, noStress());
  const slope = (part: keyof PlaneStress, i: 0 | 1, j: 0 | 1) =>
    // fourth order
    (8 * (at(i, j)[part] - at(-i, -j)[part]) -
      (at(2 * i, 2 * j)[part] - at(-2 * i, -2 * j)[part])) /
    (12 * h);
  const sum = (i: number, j: number) => at(i, j).xx + at(i, j).yy;
  const around = sum(1, 0) + sum(-1, 0) + sum(0, 1) + sum(0, -1);
  return {
    alongX: slope('xx', 1, 0) + slope('xy', 0, 1),
    alongY: slope('xy', 1, 0) + slope('yy', 0, 1),
    laplacian: (around - 4 * sum(0, 0)) / (h * h),
  };
}

/** Traction on a face with the outward normal of the hole (nx, ny). */
export const tractionOf = ({ xx, yy, xy }: PlaneStress, nx: number, ny: number) => ({
  x: xx * nx + xy * ny,
  y: xy * nx + yy * ny,
});
