/**
 * Length of a flaw on the plane normal to the largest principal stress: L cos θ.
 * @param length length of the flaw as found [mm]
 * @param angle between the flaw and that plane, θ [°]
 * @returns projected length [mm]
 * @validity −90° ≤ θ ≤ 90°; other modes than opening are left out, so a flaw far from the plane needs a specialist
 * @source BS 7910 and API 579-1, flaws at an angle (from memory)
 * @example projectedLength(20, 30) // 17.3205080757
 */
export const projectedLength = (length: number, angle: number): number =>
  length * Math.abs(Math.cos((angle * Math.PI) / 180));

/**
 * Direction of the largest principal stress against the x axis: ½ atan2(2τ, σx − σy).
 * @param sx stress along x [MPa]
 * @param sy stress along y [MPa]
 * @param txy shear stress [MPa]
 * @returns angle, between −90 and 90 [°]
 * @validity any plane stress; where the two principal stresses are equal every direction is one, and 0 is given
 * @source Mohr's circle
 * @example principalDirection(0, 0, 50) // 45
 */
export const principalDirection = (sx: number, sy: number, txy: number): number =>
  (Math.atan2(2 * txy, sx - sy) / 2) * (180 / Math.PI);
