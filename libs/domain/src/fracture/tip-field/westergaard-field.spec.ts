import fc from 'fast-check';
import { degrees, mm, mpa, mpaSqrtMm } from '../../units/quantity';
import { noStress } from '../stress-state';
import { residueAt } from '../testing/equilibrium';
import { nearTipField, nearTipOpening, nearTipStress } from './near-tip-field';
import { nearTipReach, nearTipShare, nearTipShareAhead } from './near-tip-ratio';
import {
  crackOpening,
  pulledCrackK,
  pulledCrackT,
  westergaardField,
  type PulledCrack,
} from './westergaard-field';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const crack = (ratio = 0.5, halfLength = 2, stress = 100): PulledCrack => ({
  halfLength: mm(halfLength),
  stress: mpa(stress),
  ratio,
});
const near = ({ ratio, halfLength, stress }: PulledCrack) =>
  nearTipField({
    opening: pulledCrackK(crack(ratio, halfLength, stress)),
    sliding: mpaSqrtMm(0),
    along: pulledCrackT(crack(ratio, halfLength, stress)),
  });

describe('the exact field of a crack', () => {
  it('is in equilibrium and compatible away from the crack', () => {
    fc.assert(
      fc.property(between(-2, 2), between(-6, 6), between(0.3, 5), (ratio, x, y) => {
        const residue = residueAt(westergaardField(crack(ratio)), x, y, 2e-3);
        expect(Math.abs(residue.alongX)).toBeLessThan(1e-3);
        expect(Math.abs(residue.alongY)).toBeLessThan(1e-3);
        expect(Math.abs(residue.laplacian)).toBeLessThan(1);
      }),
    );
  });

  it('leaves both faces free of traction', () => {
    fc.assert(
      fc.property(between(-0.99, 0.99), between(-2, 2), fc.constantFrom(0, -0), (x, ratio, y) => {
        const { yy, xy } = westergaardField(crack(ratio))(2 * x, y, noStress());
        expect(yy).toBeCloseTo(0, 9);
        expect(xy).toBeCloseTo(0, 9);
      }),
    );
  });

  it('has on the faces the stress along them that closes it: (k − 1) S', () => {
    expect(westergaardField(crack(0.3))(1, 0, noStress()).xx).toBeCloseTo(-70, 9);
  });

  it('returns to the stress far away', () => {
    fc.assert(
      fc.property(between(-2, 2), between(0, 6.28), (ratio, theta) => {
        const [x, y] = [1e6 * Math.cos(theta), 1e6 * Math.sin(theta)];
        const state = westergaardField(crack(ratio))(x, y, noStress());
        expect(state.xx).toBeCloseTo(100 * ratio, 6);
        expect(state.yy).toBeCloseTo(100, 6);
        expect(state.xy).toBeCloseTo(0, 6);
      }),
    );
  });

  it('is symmetric about both axes', () => {
    fc.assert(
      fc.property(between(-6, 6), between(0.01, 5), (x, y) => {
        const at = (i: number, j: number) => westergaardField(crack())(i, j, noStress());
        const one = at(x, y);
        for (const [other, sign] of [
          [at(-x, y), -1],
          [at(x, -y), -1],
          [at(-x, -y), 1],
        ] as const) {
          expect(other.xx).toBeCloseTo(one.xx, 9);
          expect(other.yy).toBeCloseTo(one.yy, 9);
          expect(sign * other.xy).toBeCloseTo(one.xy, 9);
        }
      }),
    );
  });

  it('becomes the near-tip field with its T-stress at the tip', () => {
    fc.assert(
      fc.property(between(-1, 1), between(-3, 3), (ratio, theta) => {
        const r = 1e-6;
        const [x, y] = [r * Math.cos(theta), r * Math.sin(theta)];
        const exact = westergaardField(crack(ratio))(2 + x, y, noStress());
        const local = near(crack(ratio))(x, y, noStress());
        const size = pulledCrackK(crack()) / Math.sqrt(2 * Math.PI * r);
        for (const part of ['xx', 'yy', 'xy'] as const)
          expect(Math.abs(exact[part] - local[part]) / size).toBeLessThan(1e-5);
      }),
    );
  });

  it('does not feel the stress along the crack in K, only in T', () => {
    expect(pulledCrackK(crack(1))).toBe(pulledCrackK(crack(-1)));
    expect(pulledCrackT(crack(1))).toBe(0);
    expect(pulledCrackT(crack(-1))).toBe(-200);
  });

  it('opens as an ellipse, and near the tip as the near-tip field', () => {
    const [E, r] = [mpa(200_000), 1e-5];
    const local = nearTipOpening(pulledCrackK(crack()), mm(r), E);
    expect(crackOpening(crack(), 2 - r, E) / local).toBeCloseTo(1, 5);
    expect(crackOpening(crack(), 2, E)).toBe(0);
    expect(crackOpening(crack(), 0, E)).toBeCloseTo((4 * 100 * 2) / 200_000, 12);
  });
});

describe('the near-tip field', () => {
  const modes = fc.record({ one: between(0, 2000), two: between(-2000, 2000), t: between(-9, 9) });

  it('is in equilibrium and compatible', () => {
    fc.assert(
      fc.property(modes, between(0.5, 5), between(-3, 3), ({ one, two, t }, r, theta) => {
        const field = nearTipField({
          opening: mpaSqrtMm(one),
          sliding: mpaSqrtMm(two),
          along: mpa(t),
        });
        const residue = residueAt(field, r * Math.cos(theta), r * Math.sin(theta), 1e-3);
        // the crack itself lies along −x: differences must not reach across it
        fc.pre(!(Math.cos(theta) < 0 && Math.abs(r * Math.sin(theta)) < 0.01));
        expect(Math.abs(residue.alongX)).toBeLessThan(1e-3);
        expect(Math.abs(residue.alongY)).toBeLessThan(1e-3);
        expect(Math.abs(residue.laplacian)).toBeLessThan(10);
      }),
    );
  });

  it('leaves the faces free of traction in both modes', () => {
    for (const theta of [180, -180]) {
      const load = { opening: mpaSqrtMm(500), sliding: mpaSqrtMm(300), along: mpa(20) };
      const { yy, xy } = nearTipStress(load, mm(0.5), degrees(theta));
      expect(yy).toBeCloseTo(0, 8);
      expect(xy).toBeCloseTo(0, 8);
    }
  });

  it('keeps its digits close to the line ahead and to the faces', () => {
    const load = { opening: mpaSqrtMm(0), sliding: mpaSqrtMm(1), along: mpa(0) };
    const slope = -2 / Math.sqrt(2 * Math.PI);
    const tiny = 1e-9;
    const state = nearTipField(load)(1, tiny, noStress());
    // σxx of sliding starts as −KII/√(2πr) (θ/2)(2 + 1)
    expect(state.xx / ((slope * 3 * tiny) / 4)).toBeCloseTo(1, 9);
    const face = nearTipField({ ...load, opening: mpaSqrtMm(1) })(-1, tiny, noStress());
    expect(Math.abs(face.yy)).toBeLessThan(1e-8);
  });

  it('scales with K and with the root of the distance', () => {
    const at = (k: number, r: number) =>
      nearTipStress(
        { opening: mpaSqrtMm(k), sliding: mpaSqrtMm(0), along: mpa(0) },
        mm(r),
        degrees(40),
      ).yy;
    expect(at(300, 1)).toBeCloseTo(3 * at(100, 1), 10);
    expect(at(100, 4)).toBeCloseTo(at(100, 1) / 2, 10);
  });
});

describe('near-tip against exact stress', () => {
  it('is the closed form on the line ahead', () => {
    fc.assert(
      fc.property(between(1e-4, 10), between(-1, 1), (rho, ratio) => {
        expect(nearTipShare(crack(ratio))(2 * rho, 0)).toBeCloseTo(nearTipShareAhead(rho), 9);
      }),
    );
  });

  it.each([
    [0.05, 1.037],
    [0.1, 1.073],
  ])('at r/a = %d is short by a factor of %d', (rho, excess) => {
    expect(1 / nearTipShareAhead(rho)).toBeCloseTo(excess, 3);
  });

  it('reaches as far as the error it may have', () => {
    fc.assert(
      fc.property(between(1e-6, 2), (excess) => {
        const rho = nearTipReach(mm(1), excess);
        expect(1 / nearTipShareAhead(rho)).toBeCloseTo(1 + excess, 9);
      }),
    );
    expect(nearTipReach(mm(1), 0)).toBe(0);
  });

  it('falls from one, ahead of the tip', () => {
    fc.assert(
      fc.property(between(0, 5), between(0.01, 1), (rho, more) => {
        expect(nearTipShareAhead(rho + more)).toBeLessThan(nearTipShareAhead(rho));
      }),
    );
  });
});
