import fc from 'fast-check';
import { mm, mpa } from '../units/quantity';
import {
  axialStress,
  lameHoopStress,
  requiredCylinderWall,
  requiredSphereWall,
  sphereStress,
  thickHoopStress,
  thinHoopStress,
} from './pressure-stress';

describe('stress from pressure', () => {
  it('gives p R/t in a thin cylinder and half of it along the axis', () => {
    expect(thinHoopStress(mpa(2.6), mm(1300), mm(28))).toBeCloseTo(120.714, 3);
    expect(axialStress(mpa(2.6), mm(1300), mm(28))).toBeCloseTo(120.714 / 2, -1);
  });

  it('leaves the pressure itself as radial stress: hoop stresses at bore and outside differ by p', () => {
    const [inside, outside] = [100, 110].map((r) =>
      lameHoopStress(mpa(10), mm(100), mm(110), mm(r)),
    );
    expect((inside ?? 0) - (outside ?? 0)).toBeCloseTo(10, 10);
  });

  it('keeps the membrane at p Ri/t for any wall, as equilibrium asks', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.02, max: 2, noNaN: true }), (wall) => {
        const t = 100 * wall;
        const n = 400;
        let sum = 0;
        for (let i = 0; i < n; i++)
          sum += lameHoopStress(mpa(1), mm(100), mm(100 + t), mm(100 + ((i + 0.5) * t) / n));
        expect(sum / n / thickHoopStress(mpa(1), mm(100), mm(t)).membrane).toBeCloseTo(1, 4);
      }),
    );
  });

  it('has hardly any bending in a thin wall and p/2 of it towards the limit', () => {
    const { bending } = thickHoopStress(mpa(10), mm(10_000), mm(10));
    expect(bending).toBeCloseTo(5, 1);
    expect(bending / thickHoopStress(mpa(10), mm(10_000), mm(10)).membrane).toBeLessThan(1e-3);
  });

  it('puts the bore in tension by bending', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.02, max: 1, noNaN: true }), (wall) => {
        expect(thickHoopStress(mpa(10), mm(100), mm(100 * wall)).bending).toBeGreaterThan(0);
      }),
    );
  });

  it('gives the sphere the stress of the axial section', () => {
    expect(sphereStress(mpa(1.8), mm(8000), mm(45))).toBeCloseTo(159.55, 1);
  });

  it('asks for walls that return the allowable stress', () => {
    const t = requiredCylinderWall(mpa(2.6), mm(1300), mpa(138));
    expect(thinHoopStress(mpa(2.6), mm(1300), t) + 0.6 * 2.6).toBeCloseTo(138, 9);
    expect(requiredSphereWall(mpa(1.8), mm(8000), mpa(163))).toBeCloseTo(44.2, 1);
  });
});
