import fc from 'fast-check';
import { degrees, mm, mpa } from '../../units/quantity';
import { noStress } from '../stress-state';
import { residueAt, tractionOf } from '../testing/equilibrium';
import { westergaardField } from '../tip-field/westergaard-field';
import { ellipseField } from './ellipse-field';
import { inglisEdgeStress, inglisFactor, notchFactor } from './inglis';
import { kirschField } from './kirsch-field';
import { remoteStress, type RemoteLoad } from './remote-load';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const load = (
  stress: number,
  {
    ratio = 0,
    angle = 0,
    pressure = 0,
  }: { ratio?: number; angle?: number; pressure?: number } = {},
): RemoteLoad => ({ stress: mpa(stress), ratio, angle: degrees(angle), pressure: mpa(pressure) });
const loads = fc
  .record({ ratio: between(-1, 1), angle: between(-180, 180), pressure: between(0, 50) })
  .map((more) => load(100, more));
const axis = between(0.2, 5);
const ellipse = (across: number, along: number) => ({ across: mm(across), along: mm(along) });

describe('the field around an elliptical hole', () => {
  it('is in equilibrium and compatible everywhere', () => {
    fc.assert(
      fc.property(loads, axis, axis, between(1.3, 5), between(0, 6.28), (far, a, b, k, eta) => {
        const [x, y] = [k * a * Math.cos(eta), k * b * Math.sin(eta)];
        const residue = residueAt(ellipseField(ellipse(a, b), far), x, y, 1e-3 * Math.min(a, b));
        const scale = 100 / Math.min(a, b);
        expect(Math.abs(residue.alongX) / scale).toBeLessThan(1e-4);
        expect(Math.abs(residue.alongY) / scale).toBeLessThan(1e-4);
        expect(Math.abs(residue.laplacian) / (scale / Math.min(a, b))).toBeLessThan(1e-1);
      }),
    );
  });

  it('carries only the pressure on the edge, and its edge stress is the closed form', () => {
    fc.assert(
      fc.property(loads, axis, axis, between(0, 360), (far, a, b, degreesEta) => {
        const eta = (degreesEta * Math.PI) / 180;
        const [x, y] = [a * Math.cos(eta), b * Math.sin(eta)];
        const state = ellipseField(ellipse(a, b), far)(x, y, noStress());
        const size = Math.hypot(x / a ** 2, y / b ** 2);
        const [nx, ny] = [x / a ** 2 / size, y / b ** 2 / size];
        const traction = tractionOf(state, nx, ny);
        expect(traction.x).toBeCloseTo(-far.pressure * nx, 6);
        expect(traction.y).toBeCloseTo(-far.pressure * ny, 6);
        const along = state.xx + state.yy + far.pressure;
        expect(along).toBeCloseTo(inglisEdgeStress(ellipse(a, b), far, degrees(degreesEta)), 6);
      }),
    );
  });

  it('returns to the stress far away', () => {
    fc.assert(
      fc.property(loads, axis, axis, between(0, 6.28), (far, a, b, theta) => {
        const field = ellipseField(ellipse(a, b), far);
        const state = field(1e6 * Math.cos(theta), 1e6 * Math.sin(theta), noStress());
        expect(state.xx).toBeCloseTo(remoteStress(far).xx, 5);
        expect(state.yy).toBeCloseTo(remoteStress(far).yy, 5);
        expect(state.xy).toBeCloseTo(remoteStress(far).xy, 5);
      }),
    );
  });

  it('has the circular hole as its limit', () => {
    fc.assert(
      fc.property(loads, between(1, 9), between(0, 6.28), (far, k, theta) => {
        const [x, y] = [2 * k * Math.cos(theta), 2 * k * Math.sin(theta)];
        const hole = kirschField(mm(2), far)(x, y, noStress());
        const near = ellipseField(ellipse(2, 2 * (1 + 1e-9)), far)(x, y, noStress());
        expect(near.xx).toBeCloseTo(hole.xx, 5);
        expect(near.yy).toBeCloseTo(hole.yy, 5);
        expect(near.xy).toBeCloseTo(hole.xy, 5);
      }),
    );
  });

  it('has the crack as its limit', () => {
    fc.assert(
      fc.property(between(-1, 1), between(-4, 4), between(0.2, 4), (k, x, y) => {
        const crack = westergaardField({ halfLength: mm(2), stress: mpa(100), ratio: k })(
          x,
          y,
          noStress(),
        );
        const thin = load(100, { ratio: k, angle: 90 });
        const flat = ellipseField(ellipse(2, 0), thin)(x, y, noStress());
        const nearly = ellipseField(ellipse(2, 1e-7), thin)(x, y, noStress());
        for (const part of ['xx', 'yy', 'xy'] as const) {
          expect(flat[part]).toBeCloseTo(crack[part], 8);
          expect(nearly[part]).toBeCloseTo(crack[part], 3);
        }
      }),
    );
  });

  it('turns with its axes', () => {
    fc.assert(
      fc.property(loads, axis, axis, between(1, 4), between(0, 6.28), (far, a, b, k, eta) => {
        const [x, y] = [k * a * Math.cos(eta), k * b * Math.sin(eta)];
        const one = ellipseField(ellipse(a, b), far)(x, y, noStress());
        const turned = { ...far, angle: degrees(far.angle + 90) };
        const other = ellipseField(ellipse(b, a), turned)(-y, x, noStress());
        expect(other.yy).toBeCloseTo(one.xx, 6);
        expect(other.xx).toBeCloseTo(one.yy, 6);
        expect(other.xy).toBeCloseTo(-one.xy, 6);
      }),
    );
  });
});

describe('peak factors of ellipse and notch', () => {
  it('are the edge stress at the end of the axis', () => {
    fc.assert(
      fc.property(axis, axis, between(-1, 1), (a, b, ratio) => {
        const edge = inglisEdgeStress(ellipse(a, b), load(1, { ratio, angle: 90 }), degrees(0));
        expect(edge).toBeCloseTo(inglisFactor(mm(a), mm(b), ratio), 9);
      }),
    );
  });

  it('are the same by depth and root radius', () => {
    fc.assert(
      fc.property(axis, axis, (a, b) => {
        expect(notchFactor(mm(a), mm((b * b) / a))).toBeCloseTo(inglisFactor(mm(a), mm(b), 0), 9);
      }),
    );
  });

  it('fall with width along the load, rise with depth across it', () => {
    expect(inglisFactor(mm(2), mm(3), 0)).toBeLessThan(inglisFactor(mm(2), mm(2), 0));
    expect(inglisFactor(mm(4), mm(3), 0)).toBeGreaterThan(inglisFactor(mm(3), mm(3), 0));
  });
});
