import fc from 'fast-check';
import { assessFlaw } from './assess-flaw';
import type { AssessedFlaw, AssessmentOutcome, Verdict } from './assessment-outcome';
import { sampleInput, type Variation } from './testing/sample-input';

const RUNS = { numRuns: 60 };
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** Sound flaws over the range a plant sees. */
const sound: fc.Arbitrary<Variation> = fc.record({
  thickness: between(8, 80),
  height: between(1, 6),
  length: between(12, 90),
  allowance: between(0, 1.5),
  membrane: between(20, 180),
  toughness: between(40, 200),
  yields: between(220, 450),
  tensile: between(451, 700),
  cycles: fc.integer({ min: 10, max: 100_000 }),
  insideDiameter: fc.option(between(900, 4000), { nil: null }),
  face: fc.constantFrom('inside' as const, 'outside' as const),
  orientation: fc.constantFrom('axial' as const, 'circumferential' as const),
});

const anyNumber = fc.oneof(
  fc.double(),
  fc.constantFrom(0, -1, 1e-12, 1e12, Number.NaN, Infinity, -Infinity),
  between(0, 100),
);
/** Anything at all, also what no plant has. */
const wild: fc.Arbitrary<Variation> = fc.record({
  thickness: anyNumber,
  width: fc.option(anyNumber, { nil: null }),
  insideDiameter: fc.option(anyNumber, { nil: null }),
  kind: fc.constantFrom('surface' as const, 'embedded' as const),
  height: anyNumber,
  length: anyNumber,
  ligament: fc.option(anyNumber, { nil: null }),
  allowance: anyNumber,
  membrane: anyNumber,
  bending: anyNumber,
  facePressure: fc.option(anyNumber, { nil: null }),
  yields: anyNumber,
  tensile: anyNumber,
  modulus: anyNumber,
  toughness: anyNumber,
  plateau: fc.boolean(),
  range: anyNumber,
  cycles: anyNumber,
  threshold: anyNumber,
  stressCorrosion: fc.option(anyNumber, { nil: null }),
  horizon: anyNumber,
});

/** Edge of the admissible: every number in its own range, combinations at random. */
const edge: fc.Arbitrary<Variation> = fc.record({
  thickness: between(1, 300),
  width: fc.option(between(1, 5000), { nil: null }),
  insideDiameter: fc.option(between(10, 6000), { nil: null }),
  kind: fc.constantFrom('surface' as const, 'embedded' as const),
  face: fc.constantFrom('inside' as const, 'outside' as const),
  orientation: fc.constantFrom('axial' as const, 'circumferential' as const),
  height: between(0.01, 60),
  length: between(0.01, 600),
  ligament: between(0, 60),
  allowance: between(0, 3),
  membrane: between(0, 600),
  bending: between(-300, 300),
  facePressure: fc.option(between(0, 30), { nil: null }),
  residual: fc.constantFrom(
    { state: 'none' as const },
    { state: 'as-welded' as const },
    { state: 'heat-treated' as const, flawToWeld: 'transverse' as const },
  ),
  yields: between(50, 1000),
  tensile: between(50, 1500),
  toughness: between(5, 1000),
  plateau: fc.boolean(),
  range: between(0, 600),
  bendingRange: between(0, 300),
  cycles: fc.integer({ min: 0, max: 1_000_000 }),
  threshold: between(0, 200),
  stressCorrosion: fc.option(between(0, 5), { nil: null }),
  horizon: between(0.1, 60),
});

const RANK: Record<Verdict, number> = { acceptable: 2, 'near the limit': 1, 'not acceptable': 0 };
const yearsOf = ({ life }: AssessedFlaw) => life.years ?? 0;

function everyNumberIsFinite(outcome: AssessmentOutcome): void {
  JSON.stringify(outcome, (key: string, value: unknown) => {
    if (typeof value === 'number' && !Number.isFinite(value)) throw new Error(`${key} is ${value}`);
    return value;
  });
}

/** Assesses a pair; skips the pair when either is outside a solution. */
function pair(
  first: Variation,
  second: Variation,
  check: (a: AssessedFlaw, b: AssessedFlaw) => void,
) {
  const [a, b] = [assessFlaw(sampleInput(first)), assessFlaw(sampleInput(second))];
  fc.pre(a.status === 'assessed' && b.status === 'assessed');
  if (a.status === 'assessed' && b.status === 'assessed') check(a, b);
}

const neverBetter = (good: AssessedFlaw, worse: AssessedFlaw) => {
  expect(worse.reserveOnLoad).toBeLessThanOrEqual(good.reserveOnLoad * (1 + 1e-9));
  expect(RANK[worse.verdict]).toBeLessThanOrEqual(RANK[good.verdict]);
  expect(yearsOf(worse)).toBeLessThanOrEqual(yearsOf(good) + 0.011);
};

describe('laws that hold for every flaw', () => {
  it('never lets a number that is none out, whatever comes in', () => {
    fc.assert(
      fc.property(wild, (v) => everyNumberIsFinite(assessFlaw(sampleInput(v)))),
      { numRuns: 300 },
    );
  });

  it('never lets one out for admissible inputs in any combination', () => {
    fc.assert(
      fc.property(edge, (v) => everyNumberIsFinite(assessFlaw(sampleInput(v)))),
      { numRuns: 300 },
    );
  });

  it('answers twice the same', () => {
    fc.assert(
      fc.property(sound, (v) => {
        expect(assessFlaw(sampleInput(v))).toEqual(assessFlaw(sampleInput(v)));
      }),
      { numRuns: 20 },
    );
  });

  it('never lengthens the life nor betters the verdict for a deeper flaw', () => {
    fc.assert(
      fc.property(sound, between(0.01, 2), (v, more) =>
        pair(v, { ...v, height: (v.height ?? 0) + more }, neverBetter),
      ),
      RUNS,
    );
  });

  it('never lengthens the life nor betters the verdict for a higher stress', () => {
    fc.assert(
      fc.property(sound, between(1.01, 1.5), (v, times) =>
        pair(v, { ...v, membrane: (v.membrane ?? 0) * times }, neverBetter),
      ),
      RUNS,
    );
  });

  it('never lengthens the life nor betters the verdict for a lower toughness', () => {
    fc.assert(
      fc.property(sound, between(0.4, 0.99), (v, times) =>
        pair(v, { ...v, toughness: (v.toughness ?? 0) * times }, neverBetter),
      ),
      RUNS,
    );
  });

  it('never lengthens the life for more cycles', () => {
    fc.assert(
      fc.property(sound, fc.integer({ min: 2, max: 5 }), (v, times) =>
        pair(v, { ...v, cycles: (v.cycles ?? 0) * times }, neverBetter),
      ),
      RUNS,
    );
  });

  it('changes little when an input changes little', () => {
    const nudge = 1e-7;
    fc.assert(
      fc.property(
        sound,
        fc.constantFrom('height', 'length', 'membrane', 'toughness', 'thickness'),
        (v, what) =>
          pair(v, { ...v, [what]: (v[what as 'height'] ?? 0) * (1 + nudge) }, (before, after) => {
            expect(after.reserveOnLoad / before.reserveOnLoad).toBeCloseTo(1, 4);
            expect(after.kr / before.kr).toBeCloseTo(1, 4);
            expect(
              Math.abs((after.limitingHeightMm ?? 0) - (before.limitingHeightMm ?? 0)),
            ).toBeLessThan(1e-3);
          }),
      ),
      RUNS,
    );
  });

  it('becomes the plate’s K in a large cylinder', () => {
    fc.assert(
      fc.property(sound, (v) =>
        pair(
          { ...v, insideDiameter: 99_000, thickness: 20 },
          { ...v, insideDiameter: null, thickness: 20 },
          (pipe, plate) => {
            expect(pipe.kPrimaryMPaSqrtM / plate.kPrimaryMPaSqrtM).toBeCloseTo(1, 1.8);
          },
        ),
      ),
      RUNS,
    );
  });

  it('never gives an acceptable flaw no life, nor an unacceptable one a life', () => {
    fc.assert(
      fc.property(edge, (v) => {
        const outcome = assessFlaw(sampleInput(v));
        fc.pre(outcome.status === 'assessed');
        if (outcome.status !== 'assessed') return;
        expect(outcome.life.years === null).toBe(outcome.verdict === 'not acceptable');
      }),
      { numRuns: 200 },
    );
  });
});
