import { stripCoefficient } from './strip-coefficient';

/** What both handbook forms share: √((2/πα) tan(πα/2))/cos(πα/2). */
const common = (alpha: number) => {
  const half = (Math.PI * alpha) / 2;
  return half > 0 ? Math.sqrt(Math.tan(half) / half) / Math.cos(half) : 1;
};

/**
 * Edge crack of a half plane under uniform tension: K = 1.12152 σ √(πa).
 * @returns factor F [-]
 * @validity body wide and long against the crack
 * @source Koiter; Wigglesworth; exact
 * @example halfPlaneEdgeFactor() // 1.1215222552
 */
export const halfPlaneEdgeFactor = (): number => 1.1215222552;

/**
 * Edge crack in a strip free to bend, uniform tension: F in K = F σ √(πa).
 * @param alpha crack length over width, α = a/W [-]
 * @returns factor F [-]
 * @validity any α < 1; stated 0.5 %, found within 0.7 %
 * @source Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook
 * @example edgeTensionTada(0.1) // 1.1957
 */
export const edgeTensionTada = (alpha: number): number =>
  common(alpha) * (0.752 + 2.02 * alpha + 0.37 * (1 - Math.sin((Math.PI * alpha) / 2)) ** 3);

/**
 * Edge crack in a strip free to bend, uniform tension, as a polynomial.
 * @param alpha crack length over width, α = a/W [-]
 * @returns factor F [-]
 * @validity α ≤ 0.6, 0.5 %; 6 % low at 0.7
 * @source Gross, Srawley and Brown 1964; Brown and Srawley 1966
 * @example edgeTensionPolynomial(0.5) // 2.829125
 */
export const edgeTensionPolynomial = (alpha: number): number =>
  1.122 + alpha * (-0.231 + alpha * (10.55 + alpha * (-21.71 + alpha * 30.382)));

/**
 * Edge crack in a strip under pure bending, as a polynomial; σ the outer-fibre stress of the whole width.
 * @param alpha crack length over width, α = a/W [-]
 * @returns factor F [-]
 * @validity α ≤ 0.6, 0.4 %
 * @source Brown and Srawley 1966
 * @example edgeBendingPolynomial(0.5) // 1.4945
 */
export const edgeBendingPolynomial = (alpha: number): number =>
  1.122 + alpha * (-1.4 + alpha * (7.33 + alpha * (-13.08 + alpha * 14)));

/**
 * Edge crack in a strip under pure bending; σ the outer-fibre stress of the whole width.
 * @param alpha crack length over width, α = a/W [-]
 * @returns factor F [-]
 * @validity any α < 1; stated 0.5 %, found 2.3 % low at 0.3
 * @source Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook
 * @example edgeBendingTada(0.5) // 1.47523191
 */
export const edgeBendingTada = (alpha: number): number =>
  common(alpha) * (0.923 + 0.199 * (1 - Math.sin((Math.PI * alpha) / 2)) ** 4);

/**
 * Edge crack in a strip under pure bending, from the coefficients of uniform and linear stress: G0 − 2α G1.
 * @param alpha crack length over width, α = a/W [-]
 * @returns factor F, σ the outer-fibre stress of the whole width [-]
 * @validity α ≤ 0.9; held at 0.9 beyond
 * @source own fit of finite-element results, within 0.5 %
 * @example edgeBendingFactor(0.4) // 1.26079464
 */
export const edgeBendingFactor = (alpha: number): number => {
  const depth = Math.min(alpha, 0.9);
  return stripCoefficient(0, depth) - 2 * depth * stripCoefficient(1, depth);
};
