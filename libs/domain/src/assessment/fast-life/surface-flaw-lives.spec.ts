import fc from 'fast-check';
import { tableOf, type FatigueFlaw } from './flaw-table';
import { AUDIT, STANDARD } from './life-accuracy';
import { LIFE_STOPS, stopCode } from './life-stops';
import { surfaceFlawLife, type FatigueLife } from './surface-flaw-life';
import { surfaceFlawLives } from './surface-flaw-lives';
import { randomFlaws, TWO_STAGES } from './testing/random-flaws';
import { readableLife } from './testing/readable-life';

const SAMPLE: FatigueFlaw = {
  thicknessMm: 25,
  widthMm: Infinity,
  depthMm: 4,
  halfLengthMm: 12,
  membraneRangeMPa: 120,
  bendingRangeMPa: 20,
  limitRangeMPaSqrtMm: 2500,
};

function life(change: Partial<FatigueFlaw> = {}, law = TWO_STAGES): FatigueLife {
  const answer = surfaceFlawLife({ ...SAMPLE, ...change }, law);
  if (answer.status === 'refused') throw new Error(JSON.stringify(answer.refusals));
  return answer;
}

const worst = (lives: Float64Array, reference: Float64Array) =>
  lives.reduce((most, x, i) => Math.max(most, Math.abs(x / (reference[i] ?? 0) - 1)), 0);

describe('lives of ten thousand random flaws', () => {
  const flaws = randomFlaws(10_000);
  const table = tableOf(flaws);
  const standard = surfaceFlawLives(table, TWO_STAGES, STANDARD);
  const audit = surfaceFlawLives(table, TWO_STAGES, AUDIT);

  it('are within 0.1 % of those of the second look, and end for the same reason', () => {
    expect(worst(standard.cycles, audit.cycles)).toBeLessThan(1e-3);
    const others = standard.stop.filter((code, i) => code !== audit.stop[i]);
    // where two ends lie closer together than the error
    expect(others.length).toBeLessThan(5);
  });

  it('take 45 evaluations at most, but for those that hang at the threshold or change often', () => {
    const many = standard.evaluations.filter((n) => n > 45).length;
    expect(many / flaws.length).toBeLessThan(0.03);
    const mean = standard.evaluations.reduce((sum, n) => sum + n, 0) / flaws.length;
    expect(mean).toBeLessThan(33);
    expect(audit.evaluations.filter((n) => n > 200).length / flaws.length).toBeLessThan(0.005);
  });

  it('are the same to the last bit alone, together and again', () => {
    const again = surfaceFlawLives(table, TWO_STAGES, STANDARD);
    expect(again.cycles).toEqual(standard.cycles);
    flaws.slice(0, 2000).forEach((flaw, i) => {
      expect(surfaceFlawLife(flaw, TWO_STAGES)).toMatchObject({
        cycles: standard.cycles[i],
        depthMm: standard.depthMm[i],
        evaluations: standard.evaluations[i],
      });
    });
  });

  it('are within 0.001 % of yet finer steps in the second look', () => {
    const some = tableOf(flaws.slice(0, 1500));
    const finer = { ...AUDIT, aspect: 1e-10, cycles: 1e-9, event: 1e-8, longestStep: 0.1 };
    const reference = surfaceFlawLives(some, TWO_STAGES, { ...finer, mostEvaluations: 1e6 });
    expect(worst(audit.cycles.slice(0, 1500), reference.cycles)).toBeLessThan(1e-5);
  });
});

describe('the fast path and the readable one', () => {
  it('agree on a thousand flaws that cross everything on their way', () => {
    const flaws = randomFlaws(1000, 7);
    const lives = surfaceFlawLives(tableOf(flaws), TWO_STAGES);
    const errors = flaws.map((flaw, i) => {
      const readable = readableLife(flaw, TWO_STAGES, { tolerance: 1e-7, maxStep: 0.05 });
      return Math.abs((lives.cycles[i] ?? 0) / readable.cycles - 1);
    });
    expect(Math.max(...errors)).toBeLessThan(1e-3);
  });

  it('agree with one stage and no threshold', () => {
    const law = { stages: [{ coefficient: 5.21e-13, exponent: 3 }], thresholdMPaSqrtMm: 0 };
    for (const flaw of randomFlaws(50, 3)) {
      const fast = surfaceFlawLife(flaw, law, AUDIT);
      const readable = readableLife(flaw, law, { tolerance: 1e-9, maxStep: 0.02 });
      if (fast.status === 'refused') throw new Error('refused');
      expect(Math.abs(fast.cycles / readable.cycles - 1)).toBeLessThan(1e-5);
      expect(fast.stop).toBe(readable.stop);
    }
  });
});

describe('the life of one flaw', () => {
  const range = (min: number, max: number) => fc.double({ min, max, noNaN: true });

  it('is never longer with more stress, more depth or less toughness', () => {
    fc.assert(
      fc.property(range(80, 200), range(0, 80), range(1, 8), range(1, 1.3), (sm, sb, a, more) => {
        const flaw = { membraneRangeMPa: sm, bendingRangeMPa: sb, depthMm: a };
        const { cycles } = life(flaw);
        const least = cycles * (1 + 2e-3);
        expect(life({ ...flaw, membraneRangeMPa: sm * more }).cycles).toBeLessThanOrEqual(least);
        expect(life({ ...flaw, depthMm: a * more }).cycles).toBeLessThanOrEqual(least);
        expect(life({ ...flaw, limitRangeMPaSqrtMm: 2500 / more }).cycles).toBeLessThanOrEqual(
          least,
        );
      }),
    );
  });

  it('is in inverse proportion to the constant of the law', () => {
    const times = (factor: number) => ({
      ...TWO_STAGES,
      stages: TWO_STAGES.stages.map((stage) => ({
        ...stage,
        coefficient: factor * stage.coefficient,
      })),
    });
    expect(life({}, times(2)).cycles / life().cycles).toBeCloseTo(0.5, 10);
  });

  it('ends at a/t = 0.8, at half the width, at the toughness or at a/c = 2', () => {
    expect(life()).toMatchObject({ stop: 'depth' });
    expect(life().depthMm).toBeCloseTo(20, 9);
    expect(life({ widthMm: 60 })).toMatchObject({ stop: 'length' });
    expect(life({ widthMm: 60 }).halfLengthMm).toBeCloseTo(15, 9);
    expect(life({ limitRangeMPaSqrtMm: 700 }).stop).toBe('toughness');
  });

  it('is 0 when the toughness is already reached', () => {
    expect(life({ limitRangeMPaSqrtMm: 100 })).toMatchObject({ stop: 'toughness', cycles: 0 });
  });

  it('does not end where nothing grows, and says so', () => {
    expect(life({ membraneRangeMPa: 5, bendingRangeMPa: 0 }).stop).toBe('no growth');
    expect(life({ membraneRangeMPa: 0, bendingRangeMPa: 0 }).stop).toBe('no growth');
  });

  it('is unresolved when it may not be evaluated often enough', () => {
    const few = surfaceFlawLife(SAMPLE, TWO_STAGES, { ...STANDARD, mostEvaluations: 10 });
    expect(few).toMatchObject({ status: 'followed', stop: 'unresolved' });
  });

  it.each([
    ['thicknessMm', 0],
    ['thicknessMm', Number.NaN],
    ['widthMm', -1],
    ['depthMm', -4],
    ['depthMm', 21],
    ['depthMm', 0.004],
    ['halfLengthMm', 1],
    ['halfLengthMm', 4000],
    ['membraneRangeMPa', Infinity],
    ['bendingRangeMPa', Number.NaN],
    ['limitRangeMPaSqrtMm', 0],
  ] as const)('is refused by name for %s = %d', (field, value) => {
    const answer = surfaceFlawLife({ ...SAMPLE, [field]: value }, TWO_STAGES);
    if (answer.status !== 'refused') throw new Error('not refused');
    expect(answer.refusals.map(({ input }) => input)).toContain(field);
    const row = surfaceFlawLives(tableOf([SAMPLE, { ...SAMPLE, [field]: value }]), TWO_STAGES);
    expect(LIFE_STOPS[row.stop[1] ?? 0]).toBe('refused');
    expect(row.cycles[1]).toBe(0);
    expect(row.stop[0]).toBe(stopCode('depth'));
  });

  it('gives an empty table for an empty table', () => {
    expect(surfaceFlawLives(tableOf([]), TWO_STAGES).cycles).toHaveLength(0);
  });
});
