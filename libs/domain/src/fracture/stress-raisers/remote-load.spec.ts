import fc from 'fast-check';
import { degrees, mpa } from '../../units/quantity';
import { firstPrincipal, secondPrincipal } from '../principal-stress';
import { remoteStress } from './remote-load';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('the stress far away', () => {
  it('has S and λS as its principal stresses, whatever the direction', () => {
    fc.assert(
      fc.property(between(1, 500), between(-1, 1), between(-360, 360), (stress, ratio, angle) => {
        const state = remoteStress({
          stress: mpa(stress),
          ratio,
          angle: degrees(angle),
          pressure: mpa(0),
        });
        expect(firstPrincipal(state)).toBeCloseTo(stress, 8);
        expect(secondPrincipal(state)).toBeCloseTo(stress * ratio, 8);
      }),
    );
  });

  it.each([
    [0, 100, 30],
    [90, 30, 100],
    [180, 100, 30],
  ])('at %d° is %d along x and %d along y', (angle, xx, yy) => {
    const state = remoteStress({
      stress: mpa(100),
      ratio: 0.3,
      angle: degrees(angle),
      pressure: mpa(9),
    });
    expect(state.xx).toBeCloseTo(xx, 10);
    expect(state.yy).toBeCloseTo(yy, 10);
    expect(state.xy).toBeCloseTo(0, 10);
  });
});
