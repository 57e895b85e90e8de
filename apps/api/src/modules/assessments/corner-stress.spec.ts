import { cornerStress } from './corner-stress';

const WALL = { holeRadiusMm: 100, thicknessMm: 28 };

describe('stress at the corner of a nozzle', () => {
  it('starts from two and a half times the hoop stress of a cylinder under pressure', () => {
    const found = cornerStress(100, 50, WALL);
    expect(found?.peakFactor).toBe(2.5);
    const atCorner = (found?.membraneMPa ?? 0) + (found?.bendingMPa ?? 0);
    expect(atCorner).toBeGreaterThan(240);
    expect(atCorner).toBeLessThan(250);
  });

  it('falls from the corner into the wall as at the hole', () => {
    const found = cornerStress(100, 50, WALL);
    const at = (x: number) =>
      (found?.membraneMPa ?? 0) + (found?.bendingMPa ?? 0) * (1 - (2 * x) / WALL.thicknessMm);
    const kirsch = (x: number) => {
      const q = (100 / (100 + x)) ** 2;
      return 50 * (2 + q + 3 * q * q) - 25 * (3 * q * q - q);
    };
    for (const x of [0, 7, 14]) expect(at(x) / kirsch(x)).toBeCloseTo(1, 1);
    expect(at(14)).toBeLessThan(at(0));
  });

  it('has two times the stress of a sphere', () => {
    expect(cornerStress(100, 100, WALL)?.peakFactor).toBe(2);
  });

  it('is not claimed without tension', () => {
    expect(cornerStress(0, 50, WALL)).toBeNull();
    expect(cornerStress(-20, 50, WALL)).toBeNull();
  });
});
