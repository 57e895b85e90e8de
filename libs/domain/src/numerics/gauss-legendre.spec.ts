import { legendreRule } from './gauss-legendre';

const integral = (n: number, f: (x: number) => number) =>
  legendreRule(n).reduce((sum, { node, weight }) => sum + weight * f(node), 0);

describe('the Gauss–Legendre rule', () => {
  it('has the nodes and weights of the textbook', () => {
    const [first, , last] = legendreRule(3);
    expect(first?.node).toBeCloseTo(Math.sqrt(0.6), 14);
    expect(last?.weight).toBeCloseTo(5 / 9, 14);
  });

  it.each([2, 5, 16, 40])('of %d points is exact to degree 2n − 1 and not beyond', (n) => {
    expect(integral(n, (x) => x ** (2 * n - 2))).toBeCloseTo(2 / (2 * n - 1), 13);
    expect(integral(n, (x) => x ** (2 * n - 1))).toBeCloseTo(0, 13);
    expect(integral(n, () => 1)).toBeCloseTo(2, 13);
  });

  it('converges on a smooth function', () => {
    expect(integral(40, (x) => 1 / (1.1 + x))).toBeCloseTo(Math.log(21), 12);
  });
});
