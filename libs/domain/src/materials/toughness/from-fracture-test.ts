/**
 * Toughness from a critical J: Kmat = √(J E/(1 − ν²)).
 * @param j critical J, 1 N/mm = 1 kJ/m² [N/mm]
 * @param youngsModulus Young's modulus at the temperature, E [MPa]
 * @param poissonsRatio Poisson's ratio, ν [-]
 * @returns fracture toughness [MPa·√mm]
 * @validity plane strain; J inside the capacity of the specimen
 * @source BS 7910:2013 7.1.4 (from memory); Rice 1968
 * @example kFromJ(100, 207000, 0.3) // 4769.4080
 */
export const kFromJ = (j: number, youngsModulus: number, poissonsRatio: number): number =>
  Math.sqrt((j * youngsModulus) / (1 - poissonsRatio * poissonsRatio));

/** σY/σU between which the factor on CTOD holds (BS 7910:2013 7.1.4.6, from memory). */
export const CTOD_STRENGTH_RATIO = { min: 0.3, max: 0.98 } as const;

/**
 * Factor on crack-tip opening displacement, m = 1.517 (σY/σU)^−0.3188.
 * @param yieldStrength yield strength at the temperature, σY [MPa]
 * @param tensileStrength tensile strength at the temperature, σU [MPa]
 * @returns factor m [-]
 * @validity 0.3 < σY/σU < 0.98
 * @source BS 7910:2013 7.1.4.6 (from memory; form seen in a secondary source)
 * @example ctodFactor(350, 500) // 1.699684546
 */
export const ctodFactor = (yieldStrength: number, tensileStrength: number): number =>
  1.517 * (yieldStrength / tensileStrength) ** -0.3188;

/** Elastic constants and strengths a CTOD is converted with. */
export interface CtodMaterial {
  readonly yieldMPa: number;
  readonly tensileMPa: number;
  readonly youngsModulusMPa: number;
  readonly poissonsRatio: number;
}

/**
 * Toughness from a critical crack-tip opening displacement: Kmat = √(m σY δ E/(1 − ν²)).
 * @param ctod critical crack-tip opening displacement, δ [mm]
 * @param material strengths and elastic constants at the temperature [MPa]
 * @returns fracture toughness [MPa·√mm]
 * @validity 0.3 < σY/σU < 0.98
 * @source BS 7910:2013 7.1.4.6 (from memory; form seen in a secondary source)
 * @example kFromCtod(0.2, { yieldMPa: 350, tensileMPa: 500, youngsModulusMPa: 207000, poissonsRatio: 0.3 }) // 5202.3271
 */
export const kFromCtod = (
  ctod: number,
  { yieldMPa, tensileMPa, youngsModulusMPa, poissonsRatio }: CtodMaterial,
): number =>
  kFromJ(ctodFactor(yieldMPa, tensileMPa) * yieldMPa * ctod, youngsModulusMPa, poissonsRatio);

/**
 * Least crack length and ligament of a specimen for a plane-strain KIc: 2.5 (K/σY)².
 * @param k measured KQ [MPa·√mm]
 * @param yieldStrength yield strength at the test temperature, σY [MPa]
 * @returns least size [mm]
 * @validity Pmax/PQ ≤ 1.10
 * @source ASTM E399 (from memory)
 * @example planeStrainSize(5000, 500) // 250
 */
export const planeStrainSize = (k: number, yieldStrength: number): number =>
  2.5 * (k / yieldStrength) ** 2;

/**
 * Largest KJc a specimen can measure, √(E b0 σY/(30 (1 − ν²))); a larger value is taken as censored here.
 * @param youngsModulus Young's modulus, E [MPa]
 * @param ligament initial ligament, b0 [mm]
 * @param yieldStrength yield strength at the test temperature, σY [MPa]
 * @param poissonsRatio Poisson's ratio, ν [-]
 * @returns capacity, KJc(limit) [MPa·√mm]
 * @validity cleavage of ferritic steel
 * @source ASTM E1921 (from memory), with M = 30
 * @example capacityLimit(207000, 25, 450, 0.3) // 9235.9189
 */
export const capacityLimit = (
  youngsModulus: number,
  ligament: number,
  yieldStrength: number,
  poissonsRatio: number,
): number =>
  Math.sqrt(
    (youngsModulus * ligament * yieldStrength) / (30 * (1 - poissonsRatio * poissonsRatio)),
  );
