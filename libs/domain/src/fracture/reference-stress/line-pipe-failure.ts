/**
 * Bulging factor of a long axial defect in a line pipe: √(1 + 0.6275 z − 0.003375 z²) with z = L²/(D t) to
 * z = 50, then 0.032 z + 3.3.
 * @param z length parameter, L²/(D t) [-]
 * @returns bulging factor M [-]
 * @validity z ≥ 0; the two branches meet within 0.15 %
 * @source modified B31G (from memory)
 * @example linePipeBulging(1) // 1.274411629
 */
export const linePipeBulging = (z: number): number =>
  z <= 50 ? Math.sqrt(1 + (0.6275 - 0.003375 * z) * z) : 0.032 * z + 3.3;

/**
 * Hoop stress at which an axial defect in a line pipe fails: σf (1 − A/A0)/(1 − (A/A0)/M).
 * @param flow flow stress, σf [MPa]
 * @param areaShare area of the defect over length times wall, A/A0 [-]
 * @param bulging bulging factor, M [-]
 * @returns hoop stress at failure [MPa]
 * @validity 0 ≤ A/A0 < 1, M ≥ 1; ductile metal, blunt or tough enough
 * @source NG-18 equation, modified B31G (from memory)
 * @example linePipeFailure(400, 0.3, 1) // 400
 */
export const linePipeFailure = (flow: number, areaShare: number, bulging: number): number =>
  (flow * (1 - areaShare)) / (1 - areaShare / bulging);
