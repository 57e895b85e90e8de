import fc from 'fast-check';
import { levelTwoLine, optionOneLine } from '../fad/diagram-lines';
import { tearingAssessment, type TearingAssessment, type TearingInput } from './tearing-assessment';
import { tearingInstability } from './tearing-instability';

const STEEL = { yieldMPa: 350, tensileMPa: 500, youngsModulusMPa: 207_000, yieldPlateau: false };
const LENGTH = 15;
const WIDTH = 200;

/** Centre crack in a plate: K = σ√(πa), Lr = σ/σY over the ligament. */
const stateOf = (stress: number, residual: number) => (extension: number) => {
  const a = LENGTH + extension;
  return {
    kPrimary: stress * Math.sqrt(Math.PI * a),
    kSecondary: residual * Math.sqrt(Math.PI * a),
    lr: stress / STEEL.yieldMPa / (1 - (2 * a) / WIDTH),
  };
};

const input = (change: Partial<TearingInput> = {}): TearingInput => ({
  curve: { coefficient: 120, exponent: 0.4, validToMm: 3 },
  youngsModulusMPa: 207_000,
  poissonsRatio: 0.3,
  line: optionOneLine(STEEL),
  stateAt: stateOf(150, 0),
  ...change,
});

function found(change: Partial<TearingInput> = {}): TearingAssessment {
  const answer = tearingAssessment(input(change));
  if (answer.status === 'refused') throw new Error(answer.refusals[0]?.message);
  return answer;
}

describe('tearing on the diagram', () => {
  it('has no point of the locus inside at a load above the reserve, and one on the line at it', () => {
    const { reserveOnLoad: factor } = found();
    expect(found({ stateAt: stateOf(150 * factor, 0) }).reserveOnLoad).toBeCloseTo(1, 7);
    expect(found({ stateAt: stateOf(150 * factor * 1.01, 0) }).reserveOnLoad).toBeLessThan(1);
  });

  it('is the instability of K alone where plasticity plays no part', () => {
    const stateAt = (extension: number) => ({
      kPrimary: 40 * Math.sqrt(Math.PI * (LENGTH + extension)),
      kSecondary: 0,
      lr: 0,
    });
    const curve = { coefficient: 120, exponent: 0.2, validToMm: 20 };
    const { reserveOnLoad: factor, extensionMm, end } = found({ stateAt, curve });
    const elastic = (extension: number) => (0.91 * stateAt(extension).kPrimary ** 2) / 207_000;
    const free = tearingInstability(curve, elastic);
    if (free.status === 'refused') throw new Error('refused');
    expect(factor * factor).toBeCloseTo(free.factorOnJ, 5);
    expect(extensionMm).toBeCloseTo(free.extensionMm, 3);
    expect(end).toBe('tangent');
  });

  it('reaches a point of the line no later with more residual stress or less resistance', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 80, noNaN: true }),
        fc.double({ min: 1.01, max: 2, noNaN: true }),
        (residual, times) => {
          const stateAt = stateOf(150, residual);
          const base = found({ stateAt }).reserveOnLoad;
          const curve = { coefficient: 120 / times, exponent: 0.4, validToMm: 3 };
          expect(found({ stateAt: stateOf(150, residual + 10) }).reserveOnLoad).toBeLessThan(base);
          expect(found({ stateAt, curve }).reserveOnLoad).toBeLessThan(base);
        },
      ),
      { numRuns: 20 },
    );
  });

  it('draws the locus from a small extension to the valid one', () => {
    const { locus } = found();
    expect(locus).toHaveLength(25);
    expect(locus[0]?.extensionMm).toBeCloseTo(0.003, 12);
    expect(locus.at(-1)?.extensionMm).toBeCloseTo(3, 12);
    expect(locus[0]?.kr).toBeGreaterThan(locus[12]?.kr ?? Infinity);
  });

  it('says when the tests end before the instability', () => {
    const curve = { coefficient: 120, exponent: 0.6, validToMm: 0.5 };
    expect(found({ curve, line: levelTwoLine('flow stress', STEEL) })).toMatchObject({
      end: 'valid extension',
      extensionMm: 0.5,
    });
  });

  it.each<[string, Partial<TearingInput>, string]>([
    [
      'an exponent above 1',
      { curve: { coefficient: 120, exponent: 1.2, validToMm: 3 } },
      'curve.exponent',
    ],
    [
      'no extension',
      { curve: { coefficient: 120, exponent: 0.4, validToMm: 0 } },
      'curve.validToMm',
    ],
    ['no primary stress', { stateAt: () => ({ kPrimary: 0, kSecondary: 100, lr: 0 }) }, 'stateAt'],
    ['a modulus in GPa', { youngsModulusMPa: 207 }, 'youngsModulusMPa'],
  ])('refuses %s by name', (_, change, name) => {
    const answer = tearingAssessment(input(change));
    expect(answer.status).toBe('refused');
    if (answer.status === 'refused') expect(answer.refusals[0]?.input).toBe(name);
  });
});
