import fc from 'fast-check';
import { firstPrincipal, secondPrincipal, throughThickness, vonMises } from './principal-stress';

const part = fc.double({ min: -500, max: 500, noNaN: true });
const states = fc.record({ xx: part, yy: part, xy: part });

describe('principal and equivalent stress', () => {
  it('keep the invariants of the state', () => {
    fc.assert(
      fc.property(states, (state) => {
        const [first, second] = [firstPrincipal(state), secondPrincipal(state)];
        expect(first).toBeGreaterThanOrEqual(second);
        expect(first + second).toBeCloseTo(state.xx + state.yy, 9);
        expect(first * second).toBeCloseTo(state.xx * state.yy - state.xy ** 2, 6);
      }),
    );
  });

  it('agree with the principal form of von Mises', () => {
    fc.assert(
      fc.property(states, (state) => {
        const [a, b] = [firstPrincipal(state), secondPrincipal(state)];
        expect(vonMises(state, 'plane stress', 0.3)).toBeCloseTo(
          Math.sqrt(a * a - a * b + b * b),
          8,
        );
      }),
    );
  });

  it('give √3 of a pure shear', () => {
    expect(vonMises({ xx: 0, yy: 0, xy: 100 }, 'plane strain', 0.3)).toBeCloseTo(173.205, 3);
  });

  it('relieve equal tension in plane strain, all of it when nothing can be compressed', () => {
    const equal = { xx: 100, yy: 100, xy: 0 };
    expect(vonMises(equal, 'plane strain', 0.5)).toBe(0);
    expect(vonMises(equal, 'plane stress', 0.5)).toBe(100);
    expect(throughThickness(equal, 'plane stress', 0.3)).toBe(0);
  });
});
