import fc from 'fast-check';
import { largestAcceptable, leastAcceptable, type AcceptanceQuestion } from './acceptance-search';
import { limitingLocus, type LocusQuestion } from './limiting-locus';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

// a flaw acceptable while a (1 + c/50) stays below a limit: every depth is known
const question = (over: Partial<LocusQuestion> = {}): LocusQuestion => ({
  margin: (a, c) => 12 - a * (1 + c / 50),
  validity: (a, c) => 2 - a / c,
  thicknessMm: 20,
  shortestHalfLengthMm: 1,
  longestHalfLengthMm: 200,
  ...over,
});

function points(over: Partial<LocusQuestion> = {}) {
  const locus = limitingLocus(question(over));
  if (locus.status === 'refused') throw new Error(locus.refusals[0]?.message);
  return locus.points;
}

describe('the limiting locus', () => {
  it('gives at each length the depth that reaches the line first, or the limit before it', () => {
    for (const { halfLengthMm: c, depthMm, endedBy } of points()) {
      const line = 12 / (1 + c / 50);
      expect(depthMm).toBeCloseTo(Math.min(line, 2 * c, 16), 6);
      expect(endedBy).toBe(2 * c < line ? 'validity' : 'line');
    }
  });

  it('has the corner where the reason changes as a point of its own', () => {
    const all = points({ lengths: 3 });
    expect(all).toHaveLength(5);
    const corner = all.findIndex(({ endedBy }) => endedBy === 'line');
    const [before, after] = [all[corner - 1], all[corner]];
    expect((after?.halfLengthMm ?? 0) / (before?.halfLengthMm ?? 1)).toBeCloseTo(1, 5);
    expect((after?.depthMm ?? 0) / (before?.depthMm ?? 1)).toBeCloseTo(1, 5);
  });

  it('ends at the share of the wall when nothing else does', () => {
    const all = points({ margin: () => 1, validity: () => 1 });
    expect(new Set(all.map(({ endedBy }) => endedBy))).toEqual(new Set(['depth share']));
    for (const { depthMm } of all) expect(depthMm).toBeCloseTo(16, 9);
    expect(points({ margin: () => 1, validity: () => 1, deepestShare: 0.5 })[0]?.depthMm).toBe(10);
  });

  it('says where even a shallow flaw is outside', () => {
    const all = points({ margin: (_, c) => 50 - c, validity: () => 1 });
    const last = all[all.length - 1];
    expect(last).toMatchObject({ depthMm: null, endedBy: 'none acceptable' });
    expect(points({ validity: () => -1 })[0]).toMatchObject({ depthMm: null, endedBy: 'validity' });
  });

  it('takes the first crossing when a deeper flaw would be inside again', () => {
    const all = points({ margin: (a) => Math.cos(a / 2), validity: () => 1 });
    for (const { depthMm } of all) expect(depthMm).toBeCloseTo(Math.PI, 6);
  });

  it('is continuous: neighbouring lengths have neighbouring depths', () => {
    fc.assert(
      fc.property(between(5, 30), between(20, 200), (limit, bend) => {
        const all = points({ margin: (a, c) => limit - a * (1 + c / bend), lengths: 60 });
        all.slice(1).forEach(({ halfLengthMm, depthMm }, i) => {
          const before = all[i];
          const step = Math.abs((depthMm ?? 0) - (before?.depthMm ?? 0));
          expect(step).toBeLessThan(3 * (halfLengthMm - (before?.halfLengthMm ?? 0)) + 1e-6);
        });
      }),
      { numRuns: 20 },
    );
  });

  it.each([
    ['thicknessMm', { thicknessMm: 0 }],
    ['thicknessMm', { thicknessMm: Number.NaN }],
    ['longestHalfLengthMm', { longestHalfLengthMm: 0.5 }],
    ['shortestHalfLengthMm', { shortestHalfLengthMm: -1 }],
    ['deepestShare', { deepestShare: 80 }],
    ['lengths', { lengths: 1 }],
    ['margin', { margin: () => Number.NaN }],
    ['margin', { validity: () => Number.NaN }],
  ])('is refused by name: %s', (input, over) => {
    const locus = limitingLocus(question(over));
    expect(locus.status === 'refused' && locus.refusals[0]?.input).toBe(input);
  });
});

describe('the search for the boundary of acceptance', () => {
  const load = (margin: (value: number) => number): AcceptanceQuestion => ({
    input: 'pressureMPa',
    name: 'pressure',
    unit: 'MPa',
    least: 0,
    most: 10,
    margin,
  });

  it('finds the largest load and the least toughness', () => {
    fc.assert(
      fc.property(between(0.01, 9.99), (at) => {
        const largest = largestAcceptable(load((x) => at - x));
        const least = leastAcceptable(load((x) => x - at));
        expect(largest.status === 'found' && largest.value).toBeCloseTo(at, 8);
        expect(least.status === 'found' && least.value).toBeCloseTo(at, 8);
      }),
    );
  });

  it('takes the safe side of several crossings', () => {
    const wave = (x: number) => Math.cos(x);
    const largest = largestAcceptable(load(wave));
    const least = leastAcceptable({ ...load(wave), most: 6 });
    expect(largest.status === 'found' && largest.value).toBeCloseTo(Math.PI / 2, 8);
    expect(least.status === 'found' && least.value).toBeCloseTo(1.5 * Math.PI, 8);
  });

  it('says when there is no boundary in the range', () => {
    expect(largestAcceptable(load(() => 1))).toMatchObject({
      status: 'acceptable throughout',
      value: 10,
    });
    expect(leastAcceptable(load(() => 1))).toMatchObject({
      status: 'acceptable throughout',
      value: 0,
    });
    const never = largestAcceptable(load(() => -1));
    expect(never).toMatchObject({ status: 'never acceptable' });
    expect('because' in never && never.because).toMatch(/smallest pressure looked at, 0 MPa/);
    expect(leastAcceptable(load(() => -1)).status).toBe('never acceptable');
  });

  it('refuses a range that is none and a margin that is no number', () => {
    expect(largestAcceptable({ ...load(() => 1), most: -1 }).status).toBe('refused');
    expect(leastAcceptable({ ...load(() => 1), least: Number.NaN }).status).toBe('refused');
    expect(largestAcceptable(load(() => Number.NaN)).status).toBe('refused');
  });
});
