import fc from 'fast-check';
import { degrees, mm, mpa } from '../../units/quantity';
import { noStress } from '../stress-state';
import { residueAt, tractionOf } from '../testing/equilibrium';
import { holeEdgeStress } from './hole-edge';
import { kirschField, kirschPolar } from './kirsch-field';
import { remoteStress, type RemoteLoad } from './remote-load';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const loads = fc
  .record({
    stress: between(-200, 200),
    ratio: between(-1, 1),
    angle: between(-180, 180),
    pressure: between(0, 50),
  })
  .map(({ stress, ratio, angle, pressure }): RemoteLoad => ({
    stress: mpa(stress),
    ratio,
    angle: degrees(angle),
    pressure: mpa(pressure),
  }));
const places = fc.record({ r: between(1, 12), theta: between(0, 2 * Math.PI) });

describe('the field around a circular hole', () => {
  it('is in equilibrium and compatible everywhere', () => {
    fc.assert(
      fc.property(loads, between(1.1, 6), between(0, 6.28), (load, r, theta) => {
        const field = kirschField(mm(1), load);
        const residue = residueAt(field, r * Math.cos(theta), r * Math.sin(theta), 1e-3);
        expect(Math.abs(residue.alongX)).toBeLessThan(1e-5);
        expect(Math.abs(residue.alongY)).toBeLessThan(1e-5);
        expect(Math.abs(residue.laplacian)).toBeLessThan(2e-1);
      }),
    );
  });

  it('carries only the pressure on the edge', () => {
    fc.assert(
      fc.property(loads, between(0, 6.28), (load, theta) => {
        const [nx, ny] = [Math.cos(theta), Math.sin(theta)];
        const state = kirschField(mm(3), load)(3 * nx, 3 * ny, noStress());
        const traction = tractionOf(state, nx, ny);
        expect(traction.x).toBeCloseTo(-load.pressure * nx, 9);
        expect(traction.y).toBeCloseTo(-load.pressure * ny, 9);
      }),
    );
  });

  it('returns to the stress far away', () => {
    fc.assert(
      fc.property(loads, between(0, 6.28), (load, theta) => {
        const field = kirschField(mm(1), load);
        const state = field(1e6 * Math.cos(theta), 1e6 * Math.sin(theta), noStress());
        const far = remoteStress(load);
        expect(state.xx).toBeCloseTo(far.xx, 7);
        expect(state.yy).toBeCloseTo(far.yy, 7);
        expect(state.xy).toBeCloseTo(far.xy, 7);
      }),
    );
  });

  it('is the same in polar components', () => {
    fc.assert(
      fc.property(loads, places, (load, { r, theta }) => {
        const [c, s] = [Math.cos(theta), Math.sin(theta)];
        const { xx, yy, xy } = kirschField(mm(1), load)(r * c, r * s, noStress());
        const polar = kirschPolar(mm(1), load, mm(r), degrees((theta * 180) / Math.PI));
        expect(polar.radial).toBeCloseTo(xx * c * c + yy * s * s + 2 * xy * s * c, 8);
        expect(polar.tangential).toBeCloseTo(xx * s * s + yy * c * c - 2 * xy * s * c, 8);
        expect(polar.shear).toBeCloseTo((yy - xx) * s * c + xy * (c * c - s * s), 8);
      }),
    );
  });

  it('has the edge stress of the closed form', () => {
    fc.assert(
      fc.property(loads, between(-360, 360), (load, theta) => {
        const { tangential } = kirschPolar(mm(5), load, mm(5), degrees(theta));
        expect(tangential).toBeCloseTo(holeEdgeStress(load, degrees(theta)), 8);
      }),
    );
  });

  it('superposes and does not know the size of the hole', () => {
    fc.assert(
      fc.property(loads, places, between(0.1, 50), (load, { r, theta }, size) => {
        const [x, y] = [r * Math.cos(theta), r * Math.sin(theta)];
        const one = kirschField(mm(1), load)(x, y, noStress());
        const double: RemoteLoad = {
          ...load,
          stress: mpa(2 * load.stress),
          pressure: mpa(2 * load.pressure),
        };
        const large = kirschField(mm(size), double)(size * x, size * y, noStress());
        expect(large.xx).toBeCloseTo(2 * one.xx, 7);
        expect(large.xy).toBeCloseTo(2 * one.xy, 7);
      }),
    );
  });
});
