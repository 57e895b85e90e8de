import { growthPerCycle, transition } from '../../growth/growth-law';
import { GROWTH_LAWS } from '../../materials/growth-laws';
import { lawPieces, pieceOf, rateOf } from './law-pieces';

describe('a growth law in the logarithm', () => {
  it('gives the rates of every law of the library', () => {
    for (const law of GROWTH_LAWS) {
      const perCycle = growthPerCycle(law);
      const pieces = lawPieces(law);
      for (const range of [10, 62.9, 63.1, 100, 170, 400, 1500, 4000]) {
        const expected = perCycle(range);
        const scale = expected === 0 ? 1 : expected;
        expect(Math.abs(rateOf(pieces, Math.log(range)) - expected) / scale).toBeLessThan(1e-12);
      }
    }
  });

  it('leaves out a stage that lies under the threshold', () => {
    const stages = [
      { coefficient: 2.1e-17, exponent: 5.1 },
      { coefficient: 1.29e-12, exponent: 2.88 },
    ];
    const at = transition(
      { coefficient: 2.1e-17, exponent: 5.1 },
      { coefficient: 1.29e-12, exponent: 2.88 },
    );
    expect(lawPieces({ stages, thresholdMPaSqrtMm: at * 1.01 }).m).toHaveLength(2);
    expect(lawPieces({ stages, thresholdMPaSqrtMm: at * 0.99 }).m).toHaveLength(3);
  });

  it('has pieces that meet', () => {
    for (const law of GROWTH_LAWS) {
      const { low, high } = lawPieces(law);
      for (let i = 1; i < low.length; i++) expect(low[i]).toBe(high[i - 1]);
      expect(pieceOf(lawPieces(law), -1e9)).toBe(0);
      expect(pieceOf(lawPieces(law), 1e9)).toBe(low.length - 1);
    }
  });
});
