import fc from 'fast-check';
import type { Crack } from '../../geometry/crack';
import { degrees, mm } from '../../units/quantity';
import { endsLanes, LEAST_K, plateSurfaceEnds } from './plate-surface-ends';
import { plateSurfaceInfluence } from './plate-surface-k';
import { combine, type Influence } from './solution';

interface Case {
  readonly a: number;
  readonly aspect: number;
  readonly depth: number;
  readonly width: number;
  readonly membrane: number;
  readonly bending: number;
}

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const CASES: fc.Arbitrary<Case> = fc.record({
  a: between(0.1, 40),
  aspect: between(0.02, 2),
  depth: between(0.01, 0.8),
  // 2c/W, 0 for a wide plate
  width: fc.oneof(fc.constant(0), between(1e-3, 0.5)),
  membrane: between(1, 400),
  bending: between(-50, 300),
});

function readable({ a, aspect, depth, width, membrane, bending }: Case): [number, number] {
  const c = a / aspect;
  const crack: Crack = {
    a: mm(a),
    c: mm(c),
    ligament: mm(0),
    thickness: mm(a / depth),
    width: mm(width === 0 ? Infinity : (2 * c) / width),
    insideRadius: mm(Infinity),
    holeRadius: mm(0),
  };
  const into: Influence = { membrane: 0, bending: 0, reversedBending: 0 };
  const at = (angle: number) => {
    plateSurfaceInfluence(crack, degrees(angle), into);
    return combine(into, membrane, bending);
  };
  return [at(90), at(0)];
}

function fast(cases: readonly Case[]): [number, number][] {
  const lanes = endsLanes(cases.length);
  cases.forEach(({ a, aspect, depth, width, membrane, bending }, i) => {
    lanes.thickness[i] = a / depth;
    lanes.lnThickness[i] = Math.log(a / depth);
    lanes.inverseWidth[i] = (width * aspect) / (2 * a);
    lanes.membrane[i] = membrane;
    lanes.bending[i] = bending;
    lanes.lnDepth[i] = Math.log(a);
    lanes.lnAspect[i] = Math.log(aspect);
    lanes.deep[i] = aspect > 1 ? 1 : 0;
  });
  plateSurfaceEnds(lanes, 0, cases.length);
  return cases.map((_, i) => [Math.exp(lanes.lnKDeepest[i] ?? 0), Math.exp(lanes.lnKEnd[i] ?? 0)]);
}

const apart = (x: number, y: number) => Math.abs(x - Math.max(y, LEAST_K)) / Math.max(y, 1);

describe('K at both ends without a power function', () => {
  it('is that of the readable equations to 1 in 10¹²', () => {
    fc.assert(
      fc.property(CASES, (one) => {
        const [[deepest, end] = [0, 0]] = fast([one]);
        const [readDeepest, readEnd] = readable(one);
        expect(apart(deepest, readDeepest)).toBeLessThan(1e-12);
        expect(apart(end, readEnd)).toBeLessThan(1e-12);
      }),
      { numRuns: 2000 },
    );
  });

  it('gives every crack the same bits alone as among others', () => {
    fc.assert(
      fc.property(fc.array(CASES, { minLength: 2, maxLength: 40 }), (cases) => {
        const together = fast(cases);
        cases.forEach((one, i) => expect(fast([one])[0]).toEqual(together[i]));
      }),
      { numRuns: 50 },
    );
  });

  it('works on a stretch of the lists only', () => {
    const lanes = endsLanes(3);
    lanes.thickness.fill(20);
    lanes.lnThickness.fill(Math.log(20));
    lanes.membrane.fill(100);
    lanes.lnDepth.fill(Math.log(4));
    lanes.lnAspect.fill(Math.log(0.5));
    plateSurfaceEnds(lanes, 1, 2);
    expect(lanes.lnKDeepest[0]).toBe(0);
    expect(lanes.lnKDeepest[1]).toBeGreaterThan(0);
    expect(lanes.lnKEnd[2]).toBe(0);
  });

  it('takes a closed crack for one with the least K', () => {
    const closed = { a: 15, aspect: 1, depth: 0.79, width: 0, membrane: 0, bending: 100 };
    const [[deepest] = [0]] = fast([closed]);
    expect(deepest).toBeCloseTo(LEAST_K, 12);
  });
});
