import fc from 'fast-check';
import { crackOf, influenceOf, kOf } from '../../verification/crack-of';
import { FINITE_ELEMENT_ROWS } from '../../verification/data/finite-element-rows';
import { degrees, mpa } from '../../units/quantity';
import { lameHoopStress, thickHoopStress } from '../../geometry/pressure-stress';
import { CATALOGUE } from '../catalogue';
import { curvatureShare } from './curvature-factor';
import { AXIAL_INSIDE, AXIAL_OUTSIDE, CIRCUMFERENTIAL_INSIDE } from './curvature-table';
import { CYLINDER_AXIAL_INSIDE_K, CYLINDER_AXIAL_OUTSIDE_K } from './cylinder-surface-k';
import { newmanRaju1980 } from './newman-raju-1980';
import { freeStripFactor } from './free-strip-factor';
import { PLATE_SURFACE_K } from './plate-surface-k';
import { insideLimits } from '../../geometry/limit';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const CYLINDERS = [
  'axial inside',
  'axial outside',
  'circumferential inside',
  'circumferential outside',
] as const;
const TABLES = [AXIAL_INSIDE, AXIAL_OUTSIDE, CIRCUMFERENTIAL_INSIDE];

describe('surface flaws in a cylinder', () => {
  it.each(CYLINDERS)('%s: becomes the plate as the wall gets thin', (key) => {
    fc.assert(
      fc.property(between(0.05, 0.8), between(0.2, 1.9), between(0, 90), (depth, aspect, angle) => {
        const crack = { a: 1, c: 1 / aspect, t: 1 / depth };
        const plate = influenceOf(PLATE_SURFACE_K, crack, angle);
        const cylinder = influenceOf(
          CATALOGUE[`${key} surface`].stressIntensity[0],
          { ...crack, Ri: 1e7 / depth },
          angle,
        );
        expect(cylinder.membrane / plate.membrane).toBeCloseTo(1, 5);
        expect(cylinder.bending).toBeCloseTo(plate.bending, 4);
      }),
    );
  });

  it('reproduces the rows of the curvature effect', () => {
    const at = (crack: { a: number; c: number }, angle: number) =>
      curvatureShare(AXIAL_OUTSIDE.uniform, crackOf({ ...crack, t: 10, Ri: 100 }), degrees(angle));
    expect(at({ a: 8, c: 40 }, 90)).toBeCloseTo(0.3246, 12);
    expect(at({ a: 8, c: 40 }, 10)).toBeCloseTo(0.0739, 12);
    expect(at({ a: 2, c: 10 }, 60)).toBeCloseTo(0.0116, 12);
    expect(at({ a: 8, c: 8 }, 30)).toBeCloseTo(0.0431, 12);
  });

  it('has no curvature effect without depth, and a continuous one over angle and shape', () => {
    for (const table of TABLES) {
      const share = (a: number, c: number, angle: number) =>
        curvatureShare(table.uniform, crackOf({ a, c, t: 10, Ri: 100 }), degrees(angle));
      expect(share(1e-9, 1e-8, 90)).toBeCloseTo(0, 8);
      for (const angle of [10, 30, 60])
        expect(share(6, 20, angle + 1e-7)).toBeCloseTo(share(6, 20, angle - 1e-7), 6);
      expect(share(4, 20 + 1e-7, 90)).toBeCloseTo(share(4, 20 - 1e-7, 90), 6);
      expect(share(4, 4 + 1e-7, 90)).toBeCloseTo(share(4, 4 - 1e-7, 90), 6);
    }
  });

  it('never claims more relief than was computed at Ri/t = 10', () => {
    fc.assert(
      fc.property(between(0.02, 0.8), between(0.02, 2), between(5, 100), (depth, aspect, wall) => {
        const crack = crackOf({ a: 1, c: 1 / aspect, t: 1 / depth, Ri: wall / depth });
        expect(
          curvatureShare(CIRCUMFERENTIAL_INSIDE.uniform, crack, degrees(90)),
        ).toBeGreaterThanOrEqual(-0.0871);
        expect(curvatureShare(AXIAL_INSIDE.uniform, crack, degrees(90))).toBeGreaterThanOrEqual(
          -0.02,
        );
      }),
    );
  });

  it('gives bending within 8 % of the tension value of the finite elements', () => {
    for (const [solution, aspect, depth, angle, membrane, bending] of FINITE_ELEMENT_ROWS) {
      if (solution === 'plate surface' || solution === 'plate embedded' || angle < 30) continue;
      const crack = { a: 1, c: 1 / aspect, t: 1 / depth, Ri: 10 / depth };
      const [own] = CATALOGUE[`${solution} surface`].stressIntensity;
      const { bending: found } = influenceOf(own, crack, angle);
      expect(Math.abs(found / Math.sqrt(Math.PI) - bending)).toBeLessThan(0.08 * membrane);
    }
  });

  it('agrees with Newman and Raju 1980 under pressure within 10 %', () => {
    // membrane and bending by Lamé plus the pressure on the faces, against one closed equation
    for (const [a, c, Ri] of [
      [5, 12.5, 100],
      [5, 25, 100],
      [8, 20, 100],
      [2, 10, 200],
    ] as const) {
      const crack = { a, c, t: 10, Ri };
      const { membrane, bending } = thickHoopStress(
        mpa(10),
        crackOf(crack).insideRadius,
        crackOf(crack).thickness,
      );
      const own = kOf(CYLINDER_AXIAL_INSIDE_K, crack, 90, membrane + 10, bending);
      expect(own / newmanRaju1980(mpa(10), crackOf(crack), degrees(90))).toBeGreaterThan(0.94);
      expect(own / newmanRaju1980(mpa(10), crackOf(crack), degrees(90))).toBeLessThan(1.1);
      expect(
        lameHoopStress(mpa(10), crackOf(crack).insideRadius, (Ri + 10) as never, Ri as never),
      ).toBeGreaterThan(membrane);
    }
  });

  it('never exceeds the free strip by curvature, however long the flaw', () => {
    fc.assert(
      fc.property(
        between(0.05, 0.75),
        between(0.005, 0.2),
        between(5, 60),
        (depth, aspect, wall) => {
          const crack = { a: 1, c: 1 / aspect, t: 1 / depth, Ri: wall / depth };
          const { membrane } = influenceOf(CYLINDER_AXIAL_OUTSIDE_K, crack, 90);
          const plate = influenceOf(PLATE_SURFACE_K, crack, 90).membrane;
          expect(membrane).toBeLessThanOrEqual(
            Math.max(plate, freeStripFactor(depth) * Math.sqrt(Math.PI)) * (1 + 1e-12),
          );
        },
      ),
    );
  });

  it('accepts a shallow, very long outside flaw: curvature can do little there', () => {
    const limits = CYLINDER_AXIAL_OUTSIDE_K.limits;
    expect(insideLimits(limits, crackOf({ a: 2, c: 200, t: 10, Ri: 100 }))).toBe(true);
  });

  it('stays within what long axial cracks allow for a long outside flaw', () => {
    // G0 of the long axial outside crack at Ri/t = 10: no finite flaw of that depth can exceed it by much
    for (const [depth, long] of [
      [0.2, 1.34729],
      [0.4, 1.97027],
    ] as const) {
      const { membrane } = influenceOf(
        CYLINDER_AXIAL_OUTSIDE_K,
        { a: 1, c: 10, t: 1 / depth, Ri: 10 / depth },
        90,
      );
      expect(membrane / Math.sqrt(Math.PI)).toBeLessThan(1.03 * long);
    }
  });
});
