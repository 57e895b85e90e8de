import fc from 'fast-check';
import { degrees, mm, mpa } from '../../units/quantity';
import { fitThroughWall } from './fit-through-wall';
import { holeDecayLength, holeGradient, holeLigamentStress, holePeakFactor } from './hole-edge';
import { holeLigament } from './hole-ligament';
import type { HoleInput } from './hole-rules';
import { holeStressAt } from './hole-stress';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const hole = (more: Partial<HoleInput> = {}): HoleInput => ({
  radiusMm: 20,
  stressMPa: 80,
  ratio: 0.5,
  pressureMPa: 0,
  ...more,
});
const load = (ratio: number) => ({
  stress: mpa(1),
  ratio,
  angle: degrees(0),
  pressure: mpa(0),
});

describe('the edge of a hole', () => {
  it.each([
    [0, 3],
    [0.5, 2.5],
    [1, 2],
    [-1, 4],
  ])('at biaxial ratio %d has %d times the stress', (ratio, factor) => {
    expect(holePeakFactor(ratio)).toBe(factor);
    expect(holeLigamentStress(mm(7), load(ratio), mm(0))).toBeCloseTo(factor, 12);
  });

  it('has its excess down to the share at the decay length', () => {
    fc.assert(
      fc.property(between(-1, 1), between(0.01, 1), between(1, 100), (ratio, share, radius) => {
        const x = holeDecayLength(mm(radius), ratio, share);
        const left = holeLigamentStress(mm(radius), load(ratio), x) - 1;
        expect(left).toBeCloseTo(share * (2 - ratio), 9);
      }),
    );
  });

  it('decays over its own radius: twice the hole, twice the length', () => {
    expect(holeDecayLength(mm(40), 0.5, 0.1)).toBeCloseTo(2 * holeDecayLength(mm(20), 0.5, 0.1), 9);
    expect(holeGradient(mm(40), 0.5)).toBeCloseTo(holeGradient(mm(20), 0.5) / 2, 12);
  });

  it('falls all the way to the stress far away', () => {
    fc.assert(
      fc.property(between(-1, 1), between(0, 50), between(0.1, 10), (ratio, x, more) => {
        const at = (d: number) => holeLigamentStress(mm(10), load(ratio), mm(d));
        expect(at(x + more)).toBeLessThan(at(x));
        expect(at(x)).toBeGreaterThan(1);
      }),
    );
  });
});

describe('the fit of a stress along a line', () => {
  it('finds a polynomial of the fourth degree again', () => {
    const coefficient = between(-100, 100);
    fc.assert(
      fc.property(fc.array(coefficient, { minLength: 5, maxLength: 5 }), (given) => {
        const at = (x: number) => given.reduce((sum, c, n) => sum + c * (x / 8) ** n, 0);
        const fit = fitThroughWall(at, 8);
        given.forEach((c, n) => expect(fit.coefficients[n]).toBeCloseTo(c, 8));
        expect(fit.largestDeviation).toBeLessThan(1e-9);
      }),
    );
  });

  it('keeps force and moment of a stress it cannot follow', () => {
    const fit = fitThroughWall((x) => Math.exp(-3 * x), 1);
    const [c0, c1, c2, c3, c4] = fit.coefficients;
    const force = (1 - Math.exp(-3)) / 3;
    const first = (1 - 4 * Math.exp(-3)) / 9;
    expect(fit.membrane).toBeCloseTo(force, 12);
    expect(c0 + c1 / 2 + c2 / 3 + c3 / 4 + c4 / 5).toBeCloseTo(force, 10);
    expect(c0 / 2 + c1 / 3 + c2 / 4 + c3 / 5 + c4 / 6).toBeCloseTo(first, 10);
    expect(fit.bending).toBeCloseTo(6 * (force / 2 - first), 10);
    expect(fit.largestDeviation).toBeGreaterThan(1e-5);
  });
});

describe('the ligament beside a hole', () => {
  it('gives what a flaw’s stress is entered as', () => {
    const found = holeLigament(hole(), 10);
    if (found.status === 'refused') throw new Error('refused');
    expect(found.peakMPa).toBeCloseTo(200, 10);
    expect(found.membrane).toBeGreaterThan(80);
    expect(found.bending).toBeGreaterThan(0);
    expect(found.coefficients[0]).toBeCloseTo(200, -1);
    expect(found.largestDeviation / found.peakMPa).toBeLessThan(0.001);
    expect(found.stressAt(10)).toBeCloseTo(
      found.coefficients.reduce((a, b) => a + b),
      0,
    );
  });

  it('fits better over a shorter line, and says how well', () => {
    const deviation = (length: number) => {
      const found = holeLigament(hole(), length);
      return found.status === 'found' ? found.largestDeviation : Number.NaN;
    };
    expect(deviation(5)).toBeLessThan(deviation(20));
    expect(deviation(20)).toBeLessThan(deviation(100));
  });

  it('adds the pressure in the hole', () => {
    const found = holeLigament(hole({ pressureMPa: 5 }), 10);
    expect(found.status === 'found' && found.peakMPa).toBeCloseTo(205, 10);
  });

  it.each([
    [hole({ radiusMm: 0 }), 10, 'hole.radiusMm'],
    [hole({ radiusMm: Number.NaN }), 10, 'hole.radiusMm'],
    [hole({ stressMPa: 80_000 }), 10, 'hole.stressMPa'],
    [hole({ ratio: 2 }), 10, 'hole.ratio'],
    [hole({ pressureMPa: -1 }), 10, 'hole.pressureMPa'],
    [hole(), 0, 'lengthMm'],
    [hole(), Infinity, 'lengthMm'],
    [hole(), 10_000, 'lengthMm'],
  ])('refuses what cannot be meant: %j, %d → %s', (input, length, path) => {
    const found = holeLigament(input, length);
    expect(found.status === 'refused' && found.refusals.map((each) => each.input)).toContain(path);
  });
});

describe('the stress at a point beside a hole', () => {
  it('is found from the edge outward', () => {
    const edge = holeStressAt(hole(), { distanceMm: 20, angleDegrees: 90 });
    expect(edge.status === 'found' && edge.tangential).toBeCloseTo(200, 9);
    expect(edge.status === 'found' && edge.vonMises).toBeCloseTo(200, 9);
    const far = holeStressAt(hole(), { distanceMm: 1e6, angleDegrees: 0 });
    expect(far.status === 'found' && far.plane.yy).toBeCloseTo(40, 5);
    expect(far.status === 'found' && far.firstPrincipal).toBeCloseTo(80, 5);
  });

  it.each([0, 19.99, Number.NaN, -30, 2e9])('is refused at %d mm from the centre', (distanceMm) => {
    const found = holeStressAt(hole(), { distanceMm, angleDegrees: 0 });
    expect(found.status === 'refused' && found.refusals[0]?.input).toBe('point.distanceMm');
  });

  it('is refused for a direction that is no angle', () => {
    const found = holeStressAt(hole(), { distanceMm: 30, angleDegrees: 4000 });
    expect(found.status === 'refused' && found.refusals[0]?.input).toBe('point.angleDegrees');
  });
});
