/**
 * Complete elliptic integral of the second kind E(m) = ∫₀^{π/2} √(1 − m sin²θ) dθ, by the arithmetic-geometric
 * mean (Abramowitz and Stegun 17.6), to the last digits for 0 ≤ m ≤ 1.
 */
export function completeEllipticE(m: number): number {
  if (m >= 1) return 1;
  let [mean, geometric] = [1, Math.sqrt(1 - m)];
  let [sum, power] = [m / 2, 0.5];
  while (mean - geometric > 1e-15 * mean) {
    const half = (mean - geometric) / 2;
    power *= 2;
    sum += power * half * half;
    [mean, geometric] = [(mean + geometric) / 2, Math.sqrt(mean * geometric)];
  }
  return (Math.PI / (2 * mean)) * (1 - sum);
}
