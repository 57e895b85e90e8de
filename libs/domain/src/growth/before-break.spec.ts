import fc from 'fast-check';
import { detectableToCritical, type WindowQuestion } from './detectable-to-critical';
import { LEAK_STATEMENTS, leakBeforeBreak, type LeakQuestion } from './leak-before-break';

// da/dt = 0.1 a and dc/dt = 0.05 c: every time is a logarithm
const question = (over: Partial<WindowQuestion> = {}): WindowQuestion => ({
  start: { a: 1, c: 10 },
  rates: (a, c, into) => {
    into.a = 0.1 * a;
    into.c = 0.05 * c;
  },
  untilDetectable: (a) => 3 - a,
  critical: [{ key: 'depth', margin: (a) => 12 - a }],
  ...over,
});
const window = (over?: Partial<WindowQuestion>, horizonYears = 100) =>
  detectableToCritical(question(over), { horizonYears, tolerance: 1e-8 });

describe('the time from detectable to critical', () => {
  it('is that of the growth between the two sizes', () => {
    const answer = window();
    if (answer.status !== 'window') throw new Error(answer.status);
    expect(answer.yearsToDetectable).toBeCloseTo(10 * Math.log(3), 6);
    expect(answer.yearsToCritical).toBeCloseTo(10 * Math.log(4), 6);
    expect(answer.detectable.c).toBeCloseTo(10 * Math.sqrt(3), 6);
    expect(answer.critical.years).toBeCloseTo(10 * Math.log(12), 6);
    expect(answer.limit).toBe('depth');
  });

  it('starts now when the flaw can be found already', () => {
    const answer = window({ untilDetectable: () => 0 });
    expect(answer).toMatchObject({ status: 'window', yearsToDetectable: 0 });
    expect(answer.status === 'window' && answer.yearsToCritical).toBeCloseTo(10 * Math.log(12), 6);
  });

  it('does not exist when the flaw is critical first, or now', () => {
    const late = window({ untilDetectable: (a) => 20 - a });
    expect(late).toMatchObject({ status: 'critical before detectable', limit: 'depth' });
    expect(late.status === 'critical before detectable' && late.years).toBeCloseTo(
      10 * Math.log(12),
      6,
    );
    expect(window({ start: { a: 12, c: 10 } })).toEqual({
      status: 'critical before detectable',
      years: 0,
      limit: 'depth',
    });
  });

  it('counts rates and limits that change with time from the same day', () => {
    const answer = window({
      rates: (a, c, into, years) => {
        into.a = 0.02 * (1 + years) * a;
        into.c = 0.01 * (1 + years) * c;
      },
      start: { a: 1, c: 10 },
      critical: [{ key: 'year 20', margin: (_a, _c, years) => 20 - years }],
    });
    if (answer.status !== 'window') throw new Error(answer.status);
    expect(answer.yearsToDetectable).toBeCloseTo(Math.sqrt(1 + 100 * Math.log(3)) - 1, 4);
    expect(answer.yearsToDetectable + answer.yearsToCritical).toBeCloseTo(20, 4);
  });

  it('is open when the horizon comes first', () => {
    expect(window({}, 5)).toEqual({ status: 'not detectable within the horizon' });
    expect(window({}, 15)).toMatchObject({ status: 'not critical within the horizon' });
    const still = {
      rates: (_: number, __: number, into: { a: number; c: number }) => {
        into.a = 0;
        into.c = 0;
      },
    };
    expect(window(still).status).toBe('not detectable within the horizon');
  });

  it('is shorter for a technique that finds only larger flaws', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1.1, max: 10, noNaN: true }),
        fc.double({ min: 0.1, max: 1.5, noNaN: true }),
        (size, more) => {
          const years = (at: number) => {
            const answer = window({ untilDetectable: (a) => at - a });
            return answer.status === 'window' ? answer.yearsToCritical : Number.NaN;
          };
          expect(years(size + more)).toBeLessThan(years(size));
        },
      ),
      { numRuns: 25 },
    );
  });
});

const all = Object.fromEntries(LEAK_STATEMENTS.map(({ key }) => [key, true]));
const leak = (over: Partial<LeakQuestion> = {}) => {
  const answer = leakBeforeBreak({
    depthMm: 6,
    halfLengthMm: 20,
    thicknessMm: 10,
    criticalHalfLengthMm: 80,
    leakingHalfLengthMm: 30,
    factorOnLength: 2,
    statements: all,
    ...over,
  });
  if (answer.status === 'refused') throw new Error(answer.refusals[0]?.message);
  return answer;
};

describe('leak before break', () => {
  it('is shown only when every condition is met, and says under which', () => {
    const answer = leak();
    expect(answer.answer).toBe('shown');
    expect(answer.breakthroughHalfLengthMm).toBe(24);
    expect(answer.conditions.every(({ met }) => met === true)).toBe(true);
    expect(answer.words).toBe('Shown under 7 conditions, each met; it holds only while they do.');
  });

  it.each([
    ['breakthrough shorter than critical', { halfLengthMm: 37 }],
    ['leak noticed before critical', { leakingHalfLengthMm: 41 }],
    ['leak noticed before critical', { leakingHalfLengthMm: null }],
    ['no sudden load', { statements: { ...all, 'no sudden load': false } }],
  ])('is not shown without: %s', (key, over) => {
    const answer = leak(over);
    expect(answer.answer).toBe('not shown');
    expect(answer.conditions.filter(({ met }) => met !== true).map((c) => c.key)).toEqual([key]);
    expect(answer.words).toMatch(`Not shown: ${key}`);
  });

  it('is not shown when nobody stated the conditions', () => {
    const answer = leak({ statements: {} });
    expect(answer.answer).toBe('not shown');
    expect(answer.words.match(/not stated/g)).toHaveLength(LEAK_STATEMENTS.length);
  });

  it('is not shown at exactly the critical length', () => {
    expect(leak({ criticalHalfLengthMm: 24, factorOnLength: 1 }).answer).toBe('not shown');
  });

  it.each([
    ['depthMm', { depthMm: 11 }],
    ['depthMm', { depthMm: 0 }],
    ['halfLengthMm', { halfLengthMm: Number.NaN }],
    ['criticalHalfLengthMm', { criticalHalfLengthMm: Infinity }],
    ['leakingHalfLengthMm', { leakingHalfLengthMm: -1 }],
    ['factorOnLength', { factorOnLength: 0.5 }],
  ])('is refused by name: %s', (input, over) => {
    const answer = leakBeforeBreak({
      depthMm: 6,
      halfLengthMm: 20,
      thicknessMm: 10,
      criticalHalfLengthMm: 80,
      leakingHalfLengthMm: 30,
      factorOnLength: 2,
      statements: all,
      ...over,
    });
    expect(answer.status === 'refused' && answer.refusals[0]?.input).toBe(input);
  });
});
