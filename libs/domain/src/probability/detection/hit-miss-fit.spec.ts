import fc from 'fast-check';
import { normal } from '../distributions/normal';
import { randomGenerator } from '../sampling/random-generator';
import { DETECTION_FORMS, detectionProbability, type DetectionForm } from './detection-curve';
import { fitDetection, type FittedDetection } from './fit-detection';
import { LINKS } from './links';
import { waldBound } from './upper-bounds';
import { logLikelihood, maximiseLikelihood, type HitOrMiss } from './maximise-likelihood';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const forms = fc.constantFrom(...DETECTION_FORMS);
const TRUTH = { form: 'lognormal', a50Mm: 2, spread: 0.6 } as const;

/** Flaws spread evenly over ln a from 0.5 to 8 mm, found as the curve says. */
function trialsOf(seed: number, count: number): HitOrMiss[] {
  const { uniform } = randomGenerator(seed);
  return Array.from({ length: count }, () => {
    const sizeMm = 0.5 * 16 ** uniform();
    return { sizeMm, found: uniform() < detectionProbability(TRUTH, sizeMm) };
  });
}

function fitted(trials: readonly HitOrMiss[], form: DetectionForm): FittedDetection {
  const fit = fitDetection(trials, form);
  if (fit.status === 'refused') throw new Error(fit.refusals[0]?.message);
  return fit;
}

describe('the links from a line to a probability', () => {
  it('find or miss for certain together, and are undone by their inverse', () => {
    fc.assert(
      fc.property(forms, between(-5, 5), (form, eta) => {
        const { found, missed, inverse } = LINKS[form];
        expect(found(eta) + missed(eta)).toBeCloseTo(1, 12);
        expect(inverse(found(eta))).toBeCloseTo(eta, 7);
      }),
    );
  });

  it('have the slope they say', () => {
    fc.assert(
      fc.property(forms, between(-4, 4), (form, eta) => {
        const { found, slope } = LINKS[form];
        const h = 1e-5;
        expect(slope(eta)).toBeCloseTo((found(eta + h) - found(eta - h)) / (2 * h), 8);
      }),
    );
  });

  it('spread as the curve does: line and curve give the same probability', () => {
    fc.assert(
      fc.property(forms, between(0.5, 6), between(-3, 3), between(0.5, 9), (form, b1, b0, size) => {
        const { found, spread } = LINKS[form];
        const curve = { form, a50Mm: Math.exp(-b0 / b1), spread: spread(b1) };
        expect(detectionProbability(curve, size)).toBeCloseTo(found(b0 + b1 * Math.log(size)), 10);
      }),
    );
  });
});

describe('the fit of found and missed flaws', () => {
  it.each(DETECTION_FORMS)('is the most likely line: every other is less likely (%s)', (form) => {
    const trials = trialsOf(3, 120);
    const link = LINKS[form];
    const { b0, b1, logLikelihood: best, converged } = maximiseLikelihood(trials, link);
    expect(converged).toBe(true);
    fc.assert(
      fc.property(between(-1, 1), between(-1, 1), (d0, d1) => {
        expect(logLikelihood(trials, link, b0 + d0, b1 + d1)).toBeLessThanOrEqual(best + 1e-12);
      }),
    );
  });

  it('scales with the sizes: in other units it is the same curve', () => {
    fc.assert(
      fc.property(forms, between(0.1, 20), (form, factor) => {
        const trials = trialsOf(4, 80);
        const scaled = trials.map(({ sizeMm, found }) => ({ sizeMm: factor * sizeMm, found }));
        const [one, other] = [fitted(trials, form), fitted(scaled, form)];
        expect(other.a50Mm / one.a50Mm).toBeCloseTo(factor, 6);
        expect(other.a9095.waldMm / one.a9095.waldMm).toBeCloseTo(factor, 5);
        expect(
          (other.a9095.likelihoodRatioMm ?? 0) / (one.a9095.likelihoodRatioMm ?? 1),
        ).toBeCloseTo(factor, 4);
        expect(other.curve.spread).toBeCloseTo(one.curve.spread, 7);
      }),
      { numRuns: 10 },
    );
  });

  it('does not depend on the order of the flaws', () => {
    const trials = trialsOf(6, 70);
    const [one, other] = [fitted(trials, 'lognormal'), fitted([...trials].reverse(), 'lognormal')];
    expect(other.a90Mm).toBeCloseTo(one.a90Mm, 8);
  });

  it('bounds the true a90 about as often as it says', () => {
    const a90 = normal(Math.log(TRUTH.a50Mm), TRUTH.spread).quantile(0.9);
    const link = LINKS.lognormal;
    const eta = link.inverse(0.9);
    let [covered, total] = [0, 0];
    for (let seed = 100; seed < 260; seed++) {
      const fit = maximiseLikelihood(trialsOf(seed, 80), link);
      if (!fit.converged) continue;
      total += 1;
      const size = Math.exp((eta - fit.b0) / fit.b1);
      if (waldBound(fit, size, eta, fit.b0) >= Math.exp(a90)) covered += 1;
    }
    // the delta method is known to fall a little short of its 95 % with so few flaws
    expect(covered / total).toBeGreaterThan(0.85);
    expect(total).toBeGreaterThan(150);
  });
});
