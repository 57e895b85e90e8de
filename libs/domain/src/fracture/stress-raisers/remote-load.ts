import type { Degrees, MPa } from '../../units/quantity';
import type { PlaneStress } from '../stress-state';

/** What loads a hole: stress far away in two perpendicular directions, and pressure on its edge. */
export interface RemoteLoad {
  /** Stress far from the hole, S [MPa]. */
  readonly stress: MPa;
  /** Stress across it as a share of it, λ: 0 uniaxial, ½ a cylinder under pressure, 1 a sphere [-]. */
  readonly ratio: number;
  /** Direction of S, from the x axis [°]. */
  readonly angle: Degrees;
  /** Pressure on the edge of the hole [MPa]. */
  readonly pressure: MPa;
}

/**
 * The stress far away in the axes of the plane.
 * @param load stress S, ratio λ and direction; the pressure is not part of it [MPa]
 * @returns stress state far from the hole [MPa]
 * @validity any
 * @source rotation of a tensor
 * @example remoteStress({ stress: mpa(100), ratio: 0.5, angle: degrees(90), pressure: mpa(0) }).yy // 100
 */
export function remoteStress({ stress, ratio, angle }: RemoteLoad): PlaneStress {
  const mean = (stress * (1 + ratio)) / 2;
  const half = (stress * (1 - ratio)) / 2;
  const twice = (angle * Math.PI) / 90;
  return {
    xx: mean + half * Math.cos(twice),
    yy: mean - half * Math.cos(twice),
    xy: half * Math.sin(twice),
  };
}
