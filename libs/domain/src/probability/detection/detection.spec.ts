import fc from 'fast-check';
import { demonstratedDetection, trialsToDemonstrate } from './demonstration';
import {
  DETECTION_FORMS,
  detectedAtLeastOnce,
  detectionProbability,
  sizeDetectedWith,
} from './detection-curve';
import { fitDetection } from './fit-detection';
import { randomGenerator } from '../sampling/random-generator';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const forms = fc.constantFrom(...DETECTION_FORMS);

describe('the probability of detection', () => {
  it('never falls with size', () => {
    fc.assert(
      fc.property(
        forms,
        between(0.5, 20),
        between(0.1, 2),
        between(0, 50),
        between(0, 20),
        (form, a50Mm, spread, size, more) => {
          const curve = { form, a50Mm, spread };
          expect(detectionProbability(curve, size + more)).toBeGreaterThanOrEqual(
            detectionProbability(curve, size),
          );
        },
      ),
    );
  });

  it('is undone by the size found with it', () => {
    fc.assert(
      fc.property(
        forms,
        between(0.5, 20),
        between(0.1, 2),
        between(0.01, 0.99),
        (form, a, s, p) => {
          const curve = { form, a50Mm: a, spread: s };
          expect(detectionProbability(curve, sizeDetectedWith(curve, p))).toBeCloseTo(p, 9);
        },
      ),
    );
  });

  it('is a half at a50 and nothing without a flaw', () => {
    for (const form of DETECTION_FORMS) {
      const curve = { form, a50Mm: 3, spread: 0.5 };
      expect(detectionProbability(curve, 3)).toBeCloseTo(0.5, 12);
      expect([detectionProbability(curve, 0), detectionProbability(curve, -1)]).toEqual([0, 0]);
    }
  });

  it('grows with every further inspection', () => {
    expect(detectedAtLeastOnce([])).toBe(0);
    fc.assert(
      fc.property(fc.array(between(0, 1), { minLength: 1, maxLength: 6 }), (all) => {
        expect(detectedAtLeastOnce(all)).toBeGreaterThanOrEqual(Math.max(...all) - 1e-12);
      }),
    );
  });
});

describe('a demonstration', () => {
  it.each([
    [0, 29],
    [1, 46],
    [2, 61],
  ])('of 90 %% at 95 %% confidence with %d misses needs %d flaws', (misses, trials) => {
    expect(trialsToDemonstrate(misses, 0.9, 0.95)).toEqual({ status: 'found', trials, misses });
  });

  it('demonstrates just what its size was chosen for', () => {
    for (const [found, of] of [
      [29, 29],
      [45, 46],
      [59, 61],
    ] as const) {
      const shown = demonstratedDetection(found, of, 0.95);
      expect(shown.status === 'found' && shown.lower).toBeGreaterThanOrEqual(0.9);
      const fewer = demonstratedDetection(found - 1, of - 1, 0.95);
      expect(fewer.status === 'found' && fewer.lower).toBeLessThan(0.9);
    }
  });

  it('shows nothing when nothing was found', () => {
    expect(demonstratedDetection(0, 10, 0.95)).toMatchObject({ observed: 0, lower: 0 });
  });

  it('refuses what cannot be', () => {
    expect(demonstratedDetection(11, 10, 0.95).status).toBe('refused');
    expect(demonstratedDetection(1.5, 10, 0.95).status).toBe('refused');
    expect(demonstratedDetection(1, Number.NaN, 0.95).status).toBe('refused');
    expect(trialsToDemonstrate(0, 90, 0.95).status).toBe('refused');
    expect(trialsToDemonstrate(-1, 0.9, 0.95).status).toBe('refused');
    expect(trialsToDemonstrate(0, 0.9999999, 0.95).status).toBe('refused');
  });
});

describe('a curve fitted to found and missed flaws', () => {
  const { uniform } = randomGenerator(12);
  const truth = { form: 'log-logistic', a50Mm: 2, spread: 0.6 } as const;
  const trials = Array.from({ length: 600 }, () => {
    const sizeMm = 0.5 * 16 ** uniform();
    return { sizeMm, found: uniform() < detectionProbability(truth, sizeMm) };
  });

  it.each(DETECTION_FORMS)('comes back to the curve the flaws were drawn from (%s)', (form) => {
    const fit = fitDetection(trials, form);
    if (fit.status === 'refused') throw new Error('refused');
    expect(Math.abs(fit.a50Mm / 2 - 1)).toBeLessThan(0.15);
    expect(Math.abs(fit.a90Mm / sizeDetectedWith(truth, 0.9) - 1)).toBeLessThan(0.25);
    expect(fit.a9095.waldMm).toBeGreaterThan(fit.a90Mm);
    expect(fit.a9095.likelihoodRatioMm).toBeGreaterThan(fit.a90Mm);
    expect(sizeDetectedWith(fit.curve, 0.9)).toBeCloseTo(fit.a90Mm, 9);
    expect(fit.found + fit.missed).toBe(600);
    expect(fit.cautions).toEqual([]);
  });

  it('is more certain with more flaws: the bound comes closer', () => {
    const [few, many] = [trials.slice(0, 100), trials].map((set) => {
      const fit = fitDetection(set, 'log-logistic');
      return fit.status === 'fitted' ? fit.a9095.waldMm / fit.a90Mm : Number.NaN;
    });
    expect(many).toBeLessThan(few ?? 0);
  });

  it('warns of few flaws and of extrapolation', () => {
    const few = [
      [1, false],
      [1.1, true],
      [1.3, false],
      [1.4, true],
      [1.5, false],
      [1.7, true],
    ] as const;
    const fit = fitDetection(
      few.map(([sizeMm, found]) => ({ sizeMm, found })),
      'log-logistic',
    );
    if (fit.status === 'refused') throw new Error('refused');
    expect(fit.a9095.likelihoodRatioMm).toBeNull();
    expect(fit.cautions).toHaveLength(3);
  });

  it.each([
    ['all found', [1, 2, 3], [true, true, true]],
    ['all missed', [1, 2, 3], [false, false, false]],
    ['no overlap', [1, 2, 3, 4], [false, false, true, true]],
    ['falling with size', [1, 2, 3, 4, 5], [true, true, false, true, false]],
    ['a size that is none', [1, -2, 3], [true, false, true]],
  ])('is refused: %s', (_, sizes, hits) => {
    const set = sizes.map((sizeMm, i) => ({ sizeMm, found: hits[i] ?? false }));
    expect(fitDetection(set, 'log-logistic').status).toBe('refused');
  });

  it('is refused without trials', () => {
    expect(fitDetection([], 'lognormal').status).toBe('refused');
  });
});
