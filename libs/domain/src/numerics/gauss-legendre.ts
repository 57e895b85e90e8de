/** One point of a quadrature rule on −1…1. */
export interface RulePoint {
  readonly node: number;
  readonly weight: number;
}

/**
 * Gauss–Legendre rule on −1…1, exact for polynomials up to degree 2n − 1. The nodes are the roots of the
 * nth Legendre polynomial, found by Newton from the cosine estimate.
 */
export function legendreRule(n: number): readonly RulePoint[] {
  return Array.from({ length: n }, (_, i) => {
    let node = Math.cos((Math.PI * (i + 0.75)) / (n + 0.5));
    let slope = 1;
    for (let step = 0; step < 20; step++) {
      const [value, derivative] = legendre(n, node);
      slope = derivative;
      const change = value / derivative;
      node -= change;
      if (Math.abs(change) < 1e-16) break;
    }
    return { node, weight: 2 / ((1 - node * node) * slope * slope) };
  });
}

/** Legendre polynomial of degree n and its derivative at x, |x| < 1. */
function legendre(n: number, x: number): readonly [value: number, derivative: number] {
  let [before, value] = [1, x];
  for (let k = 2; k <= n; k++)
    [before, value] = [value, ((2 * k - 1) * x * value - (k - 1) * before) / k];
  return [value, (n * (x * value - before)) / (x * x - 1)];
}
