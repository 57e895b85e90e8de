import { completeEllipticE } from './complete-elliptic';
import { legendreRule } from './gauss-legendre';

const quadrature = (m: number) =>
  legendreRule(60).reduce((sum, { node, weight }) => {
    const angle = (Math.PI / 4) * (node + 1);
    return sum + (Math.PI / 4) * weight * Math.sqrt(1 - m * Math.sin(angle) ** 2);
  }, 0);

describe('the complete elliptic integral of the second kind', () => {
  it('is a quarter of the circle and of the flattened ellipse at its ends', () => {
    expect(completeEllipticE(0)).toBeCloseTo(Math.PI / 2, 15);
    expect(completeEllipticE(1)).toBe(1);
    expect(completeEllipticE(1 - 1e-12)).toBeCloseTo(1, 10);
  });

  it('has the textbook value at m = 0.5', () => {
    expect(completeEllipticE(0.5)).toBeCloseTo(1.3506438810476755, 14);
  });

  it.each([0.1, 0.36, 0.75, 0.96])('agrees with quadrature at m = %d', (m) => {
    expect(completeEllipticE(m)).toBeCloseTo(quadrature(m), 12);
  });
});
