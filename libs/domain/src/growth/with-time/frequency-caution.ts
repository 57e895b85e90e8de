/** Frequencies at which the marine laws were measured [Hz]; BS 7910 after King 1998 (secondary source). */
export const MARINE_TESTS_HZ = [0.1, 1] as const;

/** What must be said when cycles in a corrosive medium are slower or faster than those of the tests. */
export function frequencyCaution(frequencyHz: number): string | null {
  const [slowest, fastest] = MARINE_TESTS_HZ;
  if (frequencyHz < slowest)
    return `Cycles slower than ${slowest} Hz give the medium more time in each than the tests behind the law: growth may be faster.`;
  return frequencyHz > fastest
    ? `Cycles faster than ${fastest} Hz corrode less in each than the tests behind the law: growth is on the safe side.`
    : null;
}
