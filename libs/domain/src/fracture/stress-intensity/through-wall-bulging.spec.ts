import fc from 'fast-check';
import { insideLimits } from '../../geometry/limit';
import { crackOf, influenceOf } from '../../verification/crack-of';
import { SURFACE_ROWS } from '../../verification/data/surface-rows';
import { bulgingFactor } from '../reference-stress/bulging-factor';
import {
  axialInsideZahoor,
  circumferentialBending,
  circumferentialPressure,
  circumferentialTension,
  zahoorWall,
} from './circumferential-factors';
import { angleShare, shellLength } from './curved-limits';
import {
  CYLINDER_AXIAL_THROUGH_WALL_K,
  CYLINDER_CIRCUMFERENTIAL_THROUGH_WALL_K,
  SPHERE_THROUGH_WALL_K,
} from './curved-through-wall-k';
import { NEWMAN_RAJU_1980_LIMITS } from './newman-raju-1980';
import { bulgingOfDepth, SPHERE_SURFACE_K } from './sphere-k';
import {
  axialThroughFactor,
  axialThroughFolias,
  axialThroughTada,
  axialThroughTwoTerms,
  sphereThroughFactor,
} from './through-wall-bulging';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const FACTORS = [
  axialThroughFactor,
  axialThroughFolias,
  axialThroughTada,
  axialThroughTwoTerms,
  sphereThroughFactor,
];

describe('bulging of a crack through a shell', () => {
  it('is none without a crack and grows with its length', () => {
    for (const factor of FACTORS) {
      expect(factor(0)).toBe(1);
      fc.assert(
        fc.property(between(0, 4.9), (x) => {
          expect(factor(x + 0.05)).toBeGreaterThan(factor(x));
        }),
      );
    }
  });

  it('is told alike by the published forms', () => {
    for (let x = 0.1; x <= 2; x += 0.1) {
      const zahoor = axialThroughFactor(x);
      for (const other of [axialThroughTada(x), axialThroughTwoTerms(x), bulgingFactor(1.818 * x)])
        expect(Math.abs(other / zahoor - 1)).toBeLessThan(0.12);
      expect(axialThroughFolias(x)).toBeGreaterThan(0.94 * zahoor);
    }
  });

  it('is stronger in a sphere than along a cylinder', () => {
    for (const x of [0.2, 0.5, 1, 2])
      expect(sphereThroughFactor(x)).toBeGreaterThan(axialThroughFolias(x));
  });

  it('never turns down beyond its range', () => {
    expect(axialThroughFactor(30)).toBe(axialThroughFactor(11));
    expect(axialThroughFactor(11)).toBeGreaterThan(axialThroughFactor(10));
    expect(axialThroughTwoTerms(40)).toBe(axialThroughTwoTerms(5));
  });
});

describe('circumferential cracks through a pipe', () => {
  it('meet at R/t = 10, and pressure within 1 % at γ = 2', () => {
    expect(zahoorWall(10)).toBe(1);
    expect(zahoorWall(10 + 1e-9)).toBeCloseTo(1, 8);
    expect(zahoorWall(1)).toBe(0);
    const at = (gamma: number) => circumferentialPressure(gamma / 4, 16);
    expect(Math.abs(at(2 + 1e-9) / at(2) - 1)).toBeLessThan(0.01);
  });

  it('take less from bending of the pipe than from tension of the same peak', () => {
    fc.assert(
      fc.property(between(0.001, 0.55), between(5, 20), (share, ratio) => {
        const tension = circumferentialTension(share, ratio);
        expect(tension).toBeGreaterThan(circumferentialBending(share, ratio));
        expect(circumferentialBending(share, ratio)).toBeGreaterThan(1);
      }),
    );
  });

  it('rise with the angle and the radius', () => {
    fc.assert(
      fc.property(between(0.01, 0.5), between(5, 19), (share, ratio) => {
        expect(circumferentialTension(share + 0.01, ratio)).toBeGreaterThan(
          circumferentialTension(share, ratio),
        );
        expect(circumferentialTension(share, ratio + 0.5)).toBeGreaterThan(
          circumferentialTension(share, ratio),
        );
      }),
    );
  });

  it('know their angle from the length at the mean radius', () => {
    const crack = crackOf({ a: 5, c: 10 * Math.PI, t: 10, Ri: 95 });
    expect(angleShare(crack)).toBeCloseTo(0.1, 12);
    expect(shellLength(crack)).toBeCloseTo((10 * Math.PI) / Math.sqrt(1000), 12);
    const { membrane } = influenceOf(
      CYLINDER_CIRCUMFERENTIAL_THROUGH_WALL_K,
      { a: 5, c: 10 * Math.PI, t: 10, Ri: 95 },
      0,
    );
    expect(membrane / Math.sqrt(10 * Math.PI * Math.PI)).toBeCloseTo(1.16963915951, 10);
  });
});

describe('limits of through-wall cracks in shells', () => {
  const within = (limits: typeof SPHERE_THROUGH_WALL_K.limits, c: number, Ri: number) =>
    insideLimits(limits, crackOf({ a: 5, c, t: 10, Ri }));

  it.each([
    ['axial, long', CYLINDER_AXIAL_THROUGH_WALL_K.limits, 157, 159, 95],
    [
      'circumferential, more than half around',
      CYLINDER_CIRCUMFERENTIAL_THROUGH_WALL_K.limits,
      172,
      173,
      95,
    ],
    ['sphere, long', SPHERE_THROUGH_WALL_K.limits, 94, 96, 95.0001],
  ])('%s', (_, limits, inside, outside, Ri) => {
    expect(within(limits, inside, Ri)).toBe(true);
    expect(within(limits, outside, Ri)).toBe(false);
  });

  it('walls too thick or too thin for the form', () => {
    expect(within(CYLINDER_CIRCUMFERENTIAL_THROUGH_WALL_K.limits, 20, 40)).toBe(false);
    expect(within(CYLINDER_CIRCUMFERENTIAL_THROUGH_WALL_K.limits, 20, 196)).toBe(false);
    expect(within(SPHERE_THROUGH_WALL_K.limits, 20, 90)).toBe(false);
  });

  it('bending counts as at the face in tension, whichever it is', () => {
    for (const solution of [CYLINDER_AXIAL_THROUGH_WALL_K, SPHERE_THROUGH_WALL_K]) {
      const { membrane, bending, reversedBending } = influenceOf(
        solution,
        { a: 5, c: 20, t: 10, Ri: 200 },
        0,
      );
      expect(bending).toBe(membrane);
      expect(reversedBending).toBe(membrane);
    }
  });

  it('of the pressurised axial flaw are data', () => {
    const at = (a: number, c: number, Ri: number) =>
      insideLimits(NEWMAN_RAJU_1980_LIMITS, crackOf({ a, c, t: 10, Ri }));
    expect(at(5, 12.5, 100)).toBe(true);
    expect(at(5, 4, 100)).toBe(false);
    expect(at(5, 26, 100)).toBe(false);
    expect(at(8.1, 12, 100)).toBe(false);
    expect(at(5, 12.5, 39)).toBe(false);
  });

  it('Zahoor’s axial flaw in the wall rises with depth, and less in a thin wall', () => {
    expect(axialInsideZahoor(0.6, 0.4, 10)).toBeGreaterThan(axialInsideZahoor(0.5, 0.4, 10));
    expect(axialInsideZahoor(0.5, 0.4, 20)).toBeLessThan(axialInsideZahoor(0.5, 0.4, 10));
  });
});

describe('a surface flaw in a sphere', () => {
  it('is raised by a rule that covers axial outside flaws of a cylinder with the cylinder’s factor', () => {
    const rowOf = (place: string, aspect: number, depth: number) =>
      SURFACE_ROWS.find(
        ([p, r, d, angle]) => p === place && r === aspect && d === depth && angle === 90,
      )?.[4] ?? Number.NaN;
    for (const [aspect, depth] of [
      [0.2, 0.2],
      [0.2, 0.8],
      [1, 0.2],
      [1, 0.8],
    ] as const) {
      const found = rowOf('axial outside', aspect, depth) / rowOf('plate surface', aspect, depth);
      const x = depth / aspect / Math.sqrt(10.5);
      expect(bulgingOfDepth(depth, axialThroughFolias(x))).toBeGreaterThan(0.995 * found);
    }
  });

  it('goes from the plate when shallow to the through crack’s bulging when deep', () => {
    expect(bulgingOfDepth(0, 1.7)).toBe(1);
    expect(bulgingOfDepth(1, 1.7)).toBe(1.7);
    expect(bulgingOfDepth(3, 1.7)).toBe(1.7);
  });

  it('is refused when it is long for its shell or the wall is thick', () => {
    const at = (c: number, Ri: number) =>
      insideLimits(SPHERE_SURFACE_K.limits, crackOf({ a: 5, c, t: 10, Ri }));
    expect(at(20, 100)).toBe(true);
    expect(at(40, 100)).toBe(false);
    expect(at(20, 49)).toBe(false);
  });
});
