import fc from 'fast-check';
import { degrees, mm, mpa, mpaSqrtMm } from '../../units/quantity';
import { vonMises } from '../principal-stress';
import { effectiveLength, type EffectiveLengthInput } from './effective-length';
import { energyRelease, intensityOf, planeModulus, type ElasticPlane } from './energy-release';
import { nearTipStress, yieldedEdge } from './near-tip-field';
import { leastElasticSize, plasticExtent, plasticRadius, yieldedStrip } from './plastic-zone';
import { pulledCrackK } from './westergaard-field';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const K = mpaSqrtMm(1000);
const SY = mpa(400);

describe('the plastic zone', () => {
  it('is three times smaller in plane strain, and twice its radius long', () => {
    expect(plasticRadius(K, SY, 'plane stress') / plasticRadius(K, SY, 'plane strain')).toBeCloseTo(
      3,
      12,
    );
    expect(plasticExtent(K, SY, 'plane strain')).toBe(2 * plasticRadius(K, SY, 'plane strain'));
  });

  it('grows with the square of K', () => {
    fc.assert(
      fc.property(between(10, 5000), between(1.01, 3), (k, factor) => {
        const one = plasticRadius(mpaSqrtMm(k), SY, 'plane stress');
        const more = plasticRadius(mpaSqrtMm(k * factor), SY, 'plane stress');
        expect(more / one).toBeCloseTo(factor * factor, 9);
      }),
    );
  });

  it('is a fixed share of the size that E399 asks for', () => {
    const size = leastElasticSize(K, SY);
    expect(plasticRadius(K, SY, 'plane strain') / size).toBeCloseTo(1 / (15 * Math.PI), 12);
    expect(yieldedStrip(K, SY) / size).toBeCloseTo(Math.PI / 20, 12);
  });

  it('ends where the von Mises stress of the near-tip field is yield, at every angle', () => {
    const load = { opening: K, sliding: mpaSqrtMm(0), along: mpa(0) };
    fc.assert(
      fc.property(
        between(-179, 179),
        fc.constantFrom('plane stress' as const, 'plane strain' as const),
        between(0.1, 0.45),
        (theta, condition, nu) => {
          const r = yieldedEdge(K, SY, degrees(theta), condition, nu);
          const state = nearTipStress(load, r, degrees(theta));
          expect(vonMises(state, condition, nu)).toBeCloseTo(400, 6);
        },
      ),
    );
  });

  it('has Irwin’s radius straight ahead in plane stress', () => {
    expect(yieldedEdge(K, SY, degrees(0), 'plane stress', 0.3)).toBeCloseTo(
      plasticRadius(K, SY, 'plane stress'),
      12,
    );
  });
});

describe('the crack with its plastic zone', () => {
  const input = (stress: number, more: Partial<EffectiveLengthInput> = {}) => ({
    lengthMm: 10,
    longestMm: 100,
    yieldMPa: 400,
    condition: 'plane stress' as const,
    intensityAt: (a: number) => pulledCrackK({ halfLength: mm(a), stress: mpa(stress), ratio: 0 }),
    ...more,
  });

  it('is a/(1 − (σ/σy)²/2) long in a wide plate', () => {
    fc.assert(
      fc.property(between(1, 380), (stress) => {
        const found = effectiveLength(input(stress));
        expect(found.status === 'found' && found.lengthMm).toBeCloseTo(
          10 / (1 - (stress / 400) ** 2 / 2),
          8,
        );
      }),
    );
  });

  it('is the crack itself without stress', () => {
    expect(effectiveLength(input(0))).toMatchObject({ status: 'found', lengthMm: 10 });
  });

  it('is consistent: length, zone and K belong together', () => {
    const found = effectiveLength(input(250));
    if (found.status === 'refused') throw new Error('refused');
    expect(found.lengthMm).toBeCloseTo(10 + found.plasticRadiusMm, 9);
    expect(found.intensity).toBeCloseTo(250 * Math.sqrt(Math.PI * found.lengthMm), 8);
  });

  it.each([
    ['does not settle', input(600), 'crack.lengthMm'],
    ['no number', input(100, { intensityAt: () => Number.NaN }), 'crack.lengthMm'],
    ['no crack', input(100, { lengthMm: 0 }), 'crack.lengthMm'],
    ['wall shorter than crack', input(100, { longestMm: 5 }), 'longestMm'],
    ['yield in kPa', input(100, { yieldMPa: 400_000 }), 'material.yieldMPa'],
  ])('is refused when it %s', (_, given, path) => {
    const found = effectiveLength(given);
    expect(found.status === 'refused' && found.refusals.map((each) => each.input)).toContain(path);
  });
});

describe('the energy release rate', () => {
  const elastic: ElasticPlane = {
    youngsModulus: mpa(207_000),
    poisson: 0.3,
    condition: 'plane strain',
  };

  it('gives K back', () => {
    fc.assert(
      fc.property(between(0, 1e4), (k) => {
        expect(intensityOf(elastic, energyRelease(elastic, mpaSqrtMm(k)))).toBeCloseTo(k, 7);
      }),
    );
  });

  it('adds the modes, tearing by the shear modulus', () => {
    const [one, two, three] = [mpaSqrtMm(500), mpaSqrtMm(300), mpaSqrtMm(200)];
    const none = mpaSqrtMm(0);
    expect(energyRelease(elastic, one, two, three)).toBeCloseTo(
      energyRelease(elastic, one) +
        energyRelease(elastic, none, two) +
        energyRelease(elastic, none, none, three),
      12,
    );
    const shearModulus = 207_000 / 2.6;
    expect(energyRelease(elastic, none, none, three)).toBeCloseTo(
      200 ** 2 / (2 * shearModulus),
      12,
    );
  });

  it('is larger in plane stress, where less holds the material', () => {
    const thin: ElasticPlane = { ...elastic, condition: 'plane stress' };
    expect(energyRelease(thin, K)).toBeGreaterThan(energyRelease(elastic, K));
    expect(planeModulus(thin)).toBe(207_000);
  });
});
