import fc from 'fast-check';
import { misalignedJoint, type MisalignedJoint } from './misaligned-joint';
import {
  angularMisalignment,
  axialMisalignment,
  misalignmentBending,
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

  it('adds bending for every kind at the joint', () => {
    expect(misalignmentBending(100, [])).toBe(0);
    expect(misalignmentBending(200, [1.3, 1.1])).toBeCloseTo(80, 12);
  });
});

describe('a misaligned joint as entered', () => {
  it('answers both magnifications and the bending stress', () => {
    const answer = misalignedJoint(JOINT);
    expect(answer).toEqual({
      status: 'found',
      axial: expect.closeTo(1.3, 12),
      angular: expect.closeTo(1.259075642459307, 12),
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
