/** Standard deviations of one-sided levels of a normal distribution. */
export const ONE_SIDED = { '90 %': 1.2816, '95 %': 1.645, '99 %': 2.3263 } as const;
export type OneSidedLevel = keyof typeof ONE_SIDED;

/**
 * A measured size with its sizing error: a + bias + k s. It is added once, here or as a factor or as a random
 * variable.
 * @param measured size as measured [mm]
 * @param bias what the technique sizes too small on average [mm]
 * @param deviation standard deviation of the technique [mm]
 * @param level one-sided level that is wanted [-]
 * @returns size to be assessed [mm]
 * @validity deviation ≥ 0, normal sizing error
 * @source common practice; 1.645 is the 95 % fractile of a normal distribution
 * @example sizedUp(5, 0, 0.8, '95 %') // 6.316
 */
export const sizedUp = (
  measured: number,
  bias: number,
  deviation: number,
  level: OneSidedLevel = '95 %',
): number => measured + bias + ONE_SIDED[level] * deviation;
