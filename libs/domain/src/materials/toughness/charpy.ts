/**
 * Lower bound of toughness in the transition from Charpy energy: (12 √Cv − 20)(25/B)^¼ + 20.
 * @param energy Charpy V energy at the temperature, Cv [J]
 * @param thickness wall thickness, B [mm]
 * @returns lower bound of toughness [MPa·√m]
 * @validity ferritic steel; transition, not the upper shelf; 12 √Cv > 20
 * @source BS 7910:2013 Annex J.2.1 (from memory; form seen in a secondary source)
 * @example charpyTransitionMPaSqrtM(27, 25) // 62.353829
 */
export const charpyTransitionMPaSqrtM = (energy: number, thickness: number): number =>
  (12 * Math.sqrt(energy) - 20) * (25 / thickness) ** 0.25 + 20;

/**
 * Cap on toughness from Charpy energy, the upper shelf: 0.54 Cv + 55.
 * @param energy Charpy V energy at the temperature, Cv [J]
 * @returns upper-shelf estimate of toughness [MPa·√m]
 * @validity ferritic steel
 * @source BS 7910:2013 Annex J.2.2 (from memory; form seen in a secondary source)
 * @example charpyShelfMPaSqrtM(100) // 109
 */
export const charpyShelfMPaSqrtM = (energy: number): number => 0.54 * energy + 55;

/**
 * Lower bound of toughness from Charpy energy: the transition form, never above the shelf.
 * @param energy Charpy V energy at the temperature, Cv [J]
 * @param thickness wall thickness, B [mm]
 * @returns lower bound of toughness [MPa·√m]
 * @validity ferritic steel; 12 √Cv > 20
 * @source BS 7910:2013 Annex J.2 (from memory; form seen in a secondary source)
 * @example charpyLowerBoundMPaSqrtM(200, 25) // 163
 */
export const charpyLowerBoundMPaSqrtM = (energy: number, thickness: number): number =>
  Math.min(charpyTransitionMPaSqrtM(energy, thickness), charpyShelfMPaSqrtM(energy));

/**
 * Upper-shelf toughness of Barsom, Rolfe and Novak: (K/σY)² = 0.64 (Cv/σY − 0.01).
 * @param energy upper-shelf Charpy V energy, Cv [J]
 * @param yieldStrength yield strength at the temperature, σY [MPa]
 * @returns upper-shelf toughness [MPa·√m]
 * @validity upper shelf only; Cv/σY > 0.01
 * @source Barsom and Rolfe, Fracture and Fatigue Control in Structures (from memory)
 * @example upperShelfMPaSqrtM(100, 450) // 165.8432995
 */
export const upperShelfMPaSqrtM = (energy: number, yieldStrength: number): number =>
  yieldStrength * Math.sqrt(0.64 * (energy / yieldStrength - 0.01));

/**
 * Upper-shelf toughness at 0.2 mm of tearing: K = √(E J/(1 − ν²)), J = 0.53 Cv^1.28 0.2^(0.133 Cv^0.256).
 * @param energy upper-shelf Charpy V energy, Cv [J]
 * @param youngsModulus Young's modulus, E [MPa]
 * @param poissonsRatio Poisson's ratio, ν [-]
 * @returns lower bound of upper-shelf toughness [MPa·√m]
 * @validity upper shelf only; ferritic steel
 * @source SINTAP (1999), FITNET (from memory)
 * @example shelfAtTearingMPaSqrtM(100, 207000, 0.3) // 147.7
 */
export function shelfAtTearingMPaSqrtM(
  energy: number,
  youngsModulus: number,
  poissonsRatio: number,
): number {
  const j = 0.53 * energy ** 1.28 * 0.2 ** (0.133 * energy ** 0.256);
  // kJ/m² with MPa: a thousandth makes it MPa²·m
  return Math.sqrt((youngsModulus * j) / (1000 * (1 - poissonsRatio * poissonsRatio)));
}

/**
 * Toughness in the transition by Sailors and Corten: 14.6 √Cv; a mean, not a bound.
 * @param energy Charpy V energy at the temperature, Cv [J]
 * @returns toughness [MPa·√m]
 * @validity transition; 7 J ≤ Cv ≤ 70 J
 * @source Sailors and Corten, ASTM STP 514 (1972) (from memory)
 * @example sailorsCortenMPaSqrtM(25) // 73
 */
export const sailorsCortenMPaSqrtM = (energy: number): number => 14.6 * Math.sqrt(energy);

/**
 * Lower bound of toughness by Roberts and Newton: 8.47 Cv^0.63.
 * @param energy Charpy V energy at the temperature, Cv [J]
 * @returns lower bound of toughness [MPa·√m]
 * @validity transition and lower shelf
 * @source Roberts and Newton, Welding Research Council Bulletin 265 (1981) (from memory)
 * @example robertsNewtonMPaSqrtM(27) // 67.55
 */
export const robertsNewtonMPaSqrtM = (energy: number): number => 8.47 * energy ** 0.63;
