import fc from 'fast-check';
import { tearingInstability } from './tearing-instability';
import { extensionAtInstability, tearingResistance, tearingSlope } from './tearing-resistance';

const CURVE = { coefficient: 200, exponent: 0.4, validToMm: 20 };
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('the instability of tearing', () => {
  it('is where resistance and driving J touch: the closed form of J = β a', () => {
    fc.assert(
      fc.property(between(2, 20), between(0.2, 0.45), between(5, 50), (a0, exponent, slope) => {
        const curve = { ...CURVE, exponent, validToMm: 60 };
        const found = tearingInstability(curve, (extension) => slope * (a0 + extension));
        expect(found.status).toBe('found');
        if (found.status !== 'found') return;
        const extension = extensionAtInstability(a0, exponent);
        expect(found.end).toBe('tangent');
        expect(found.extensionMm / extension).toBeCloseTo(1, 5);
        expect((found.factorOnJ * slope) / tearingSlope(curve, extension)).toBeCloseTo(1, 9);
      }),
    );
  });

  it('is ended by the valid extension where the curves do not touch before', () => {
    const found = tearingInstability(
      { ...CURVE, validToMm: 2 },
      (extension) => 20 * (10 + extension),
    );
    expect(found).toMatchObject({ status: 'found', end: 'valid extension', extensionMm: 2 });
    if (found.status === 'found') {
      expect(found.jNPerMm).toBeCloseTo(tearingResistance(CURVE, 2), 9);
      expect(found.factorOnJ).toBeCloseTo(found.jNPerMm / 240, 9);
    }
  });

  it('comes sooner under a higher driving J', () => {
    const at = (load: number) =>
      tearingInstability(CURVE, (extension) => load * (10 + extension) ** 1.2);
    const [low, high] = [at(10), at(20)];
    if (low.status === 'refused' || high.status === 'refused') throw new Error('refused');
    expect(low.factorOnJ / high.factorOnJ).toBeCloseTo(2, 9);
    expect(low.extensionMm).toBeCloseTo(high.extensionMm, 5);
  });

  it.each<[string, Partial<typeof CURVE>, number, string]>([
    ['no coefficient', { coefficient: 0 }, 1, 'coefficient'],
    ['an exponent of 1', { exponent: 1 }, 1, 'exponent'],
    ['no extension', { validToMm: 0 }, 1, 'validToMm'],
    ['no number', { validToMm: Number.NaN }, 1, 'validToMm'],
    ['a negative driving J', {}, -1, 'drivingJ'],
  ])('refuses %s by name', (_, change, sign, input) => {
    const found = tearingInstability({ ...CURVE, ...change }, () => sign * 100);
    expect(found.status).toBe('refused');
    if (found.status === 'refused') expect(found.refusals[0]?.input).toBe(input);
  });

  it('refuses a driving J that is no number on the way', () => {
    const found = tearingInstability(CURVE, (extension) =>
      extension > 0 && extension < 20 ? Number.NaN : 100,
    );
    expect(found).toMatchObject({ status: 'refused', refusals: [{ input: 'drivingJ' }] });
  });
});
