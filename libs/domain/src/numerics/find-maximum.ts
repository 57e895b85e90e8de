/** Where a function is greatest between two bounds, and its value there. */
export interface Maximum {
  readonly x: number;
  readonly value: number;
}

const GOLDEN = (Math.sqrt(5) - 1) / 2;

/**
 * Greatest value of f between low and high by golden section (Kiefer 1953): f must have one hill there. The
 * place is found to about the root of the rounding error, the value to the rounding error.
 */
export function findMaximum(f: (x: number) => number, low: number, high: number): Maximum {
  let [a, b] = [low, high];
  let [left, right] = [b - GOLDEN * (b - a), a + GOLDEN * (b - a)];
  let [fLeft, fRight] = [f(left), f(right)];
  // 80 steps shrink any interval below what the numbers can hold
  for (let i = 0; i < 80; i++) {
    if (fLeft >= fRight) {
      [b, right, fRight] = [right, left, fLeft];
      left = b - GOLDEN * (b - a);
      fLeft = f(left);
    } else {
      [a, left, fLeft] = [left, right, fRight];
      right = a + GOLDEN * (b - a);
      fRight = f(right);
    }
  }
  const candidates = [low, (a + b) / 2, high].map((x) => ({ x, value: f(x) }));
  return candidates.reduce((best, each) => (each.value > best.value ? each : best));
}
