import fc from 'fast-check';
import { misalignedJoint, type MisalignedJoint } from './misaligned-joint';
import {
  angularMisalignment,
  axialMisalignment,
  misalignmentBending,
  ovalityMagnification,
  unequalMisalignment,
} from './misalignment';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const ANGLE = {
  peakMm: 2,
  thicknessMm: 20,
  halfLengthMm: 300,
  membraneMPa: 150,
  youngsModulusMPa: 207_000,
  ends: 'fixed',
} as const;
const JOINT: MisalignedJoint = {
  membraneMPa: 150,
  thicknessMm: 20,
  otherThicknessMm: null,
  offsetMm: 2,
  angle: { peakMm: 2, halfLengthMm: 300, ends: 'fixed' },
  ovality: null,
  youngsModulusMPa: 207_000,
};

describe('misalignment of a butt joint', () => {
  it('of equal walls is the limit of unequal ones', () => {
    fc.assert(
      fc.property(between(0, 10), between(5, 100), (offset, t) => {
        expect(unequalMisalignment(offset, t, t)).toBeCloseTo(axialMisalignment(offset, t), 10);
      }),
    );
  });

  it('by an angle is straightened by tension, and twice as large between pins without it', () => {
    const small = { ...ANGLE, membraneMPa: 0 };
    expect(angularMisalignment(small)).toBeCloseTo(1.3, 12);
    expect(angularMisalignment({ ...small, ends: 'pinned' })).toBeCloseTo(1.6, 12);
    expect(angularMisalignment(ANGLE)).toBeLessThan(1.3);
    expect(angularMisalignment({ ...ANGLE, ends: 'pinned' })).toBeLessThan(1.6);
    expect(angularMisalignment({ ...ANGLE, membraneMPa: -50 })).toBeCloseTo(1.3, 12);
  });

  it('by ovality is rounded by pressure, and turns its sign a quarter round the cylinder', () => {
    const oval = {
      differenceMm: 10,
      diameterMm: 1000,
      thicknessMm: 10,
      angleDeg: 0,
      pressureMPa: 0,
      youngsModulusMPa: 207_000,
      poissonsRatio: 0.3,
    };
    expect(ovalityMagnification({ ...oval, differenceMm: 0 })).toBe(1);
    expect(ovalityMagnification({ ...oval, angleDeg: 90 })).toBeCloseTo(-0.5, 12);
    expect(ovalityMagnification({ ...oval, angleDeg: 45 })).toBeCloseTo(1, 12);
    fc.assert(
      fc.property(between(0, 10), between(0.1, 5), (pressureMPa, more) => {
        const less = ovalityMagnification({ ...oval, pressureMPa: pressureMPa + more });
        expect(less).toBeLessThan(ovalityMagnification({ ...oval, pressureMPa }));
        expect(less).toBeGreaterThan(1);
      }),
    );
  });

  it('adds bending for every kind at the joint', () => {
    expect(misalignmentBending(100, [])).toBe(0);
    expect(misalignmentBending(200, [1.3, 1.1])).toBeCloseTo(80, 12);
  });
});

describe('a misaligned joint as entered', () => {
  const OVAL = {
    differenceMm: 5,
    diameterMm: 1000,
    angleDeg: 0,
    pressureMPa: 3,
    poissonsRatio: 0.3,
  };

  it('takes an oval cylinder into account', () => {
    const answer = misalignedJoint({ ...JOINT, offsetMm: 0, angle: null, ovality: OVAL });
    expect(answer).toMatchObject({ status: 'found', axial: 1, angular: 1 });
    if (answer.status === 'refused') return;
    expect(answer.ovality).toBeCloseTo(1 + 7.5 / 20 / (1 + (1.5 * 0.91 * 125_000) / 207_000), 12);
    expect(answer.bendingMPa).toBeCloseTo(150 * (answer.ovality - 1), 12);
  });

  it('refuses an impossible oval by name', () => {
    const ovality = { ...OVAL, differenceMm: 2000, poissonsRatio: 0.6 };
    expect(misalignedJoint({ ...JOINT, ovality })).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'ovality.differenceMm' }, { input: 'ovality.poissonsRatio' }],
    });
  });

  it('answers both magnifications and the bending stress', () => {
    const answer = misalignedJoint(JOINT);
    expect(answer).toEqual({
      status: 'found',
      axial: expect.closeTo(1.3, 12),
      angular: expect.closeTo(1.259075642459307, 12),
      ovality: 1,
      bendingMPa: expect.closeTo(150 * 0.559075642459307, 9),
    });
  });

  it('takes a thicker wall on the other side into account', () => {
    const answer = misalignedJoint({ ...JOINT, otherThicknessMm: 40, angle: null });
    expect(answer).toMatchObject({ status: 'found', angular: 1 });
    if (answer.status === 'found')
      expect(answer.axial).toBeCloseTo(unequalMisalignment(2, 20, 40), 12);
  });

  it.each<[string, Partial<MisalignedJoint>, string]>([
    ['no wall', { thicknessMm: 0 }, 'thicknessMm'],
    ['a wall in metres', { thicknessMm: 0.02 }, 'thicknessMm'],
    ['the walls swapped', { otherThicknessMm: 10 }, 'otherThicknessMm'],
    ['an offset beyond the wall', { offsetMm: 25 }, 'offsetMm'],
    ['a negative offset', { offsetMm: -1 }, 'offsetMm'],
    ['a modulus in GPa', { youngsModulusMPa: 207 }, 'youngsModulusMPa'],
    ['compression', { membraneMPa: -10 }, 'membraneMPa'],
    ['no number', { membraneMPa: Number.NaN }, 'membraneMPa'],
    ['no support', { angle: { peakMm: 2, halfLengthMm: 0, ends: 'pinned' } }, 'angle.halfLengthMm'],
  ])('refuses %s by name', (_, change, input) => {
    const answer = misalignedJoint({ ...JOINT, ...change });
    expect(answer.status).toBe('refused');
    if (answer.status === 'refused') expect(answer.refusals.map((r) => r.input)).toContain(input);
  });
});
