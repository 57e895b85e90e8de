import fc from 'fast-check';
import { chi, interaction } from './interaction';
import { reserveOnLoad } from './reserve-on-load';
import { reserveOnToughness } from './reserve-on-toughness';
import { heatTreatedResidual, relaxedResidual } from './residual-stress';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('the interaction of secondary with primary stress', () => {
  it('is never negative, never above a quarter and never NaN', () => {
    fc.assert(
      fc.property(between(0, 1e4), between(-1e4, 1e4), between(0, 2), (kp, ks, lr) => {
        const rho = interaction(kp, ks, lr);
        expect(rho).toBeGreaterThanOrEqual(0);
        expect(rho).toBeLessThanOrEqual(0.25);
      }),
    );
  });

  it('is 0.25 without primary K, where χ is infinite', () => {
    expect(chi(0, 50, 0.4)).toBe(Infinity);
    expect(interaction(0, 50, 0.4)).toBe(0.25);
  });

  it('joins 0.25 where the polynomial ends', () => {
    expect(interaction(100, (100 * (5.2 - 1e-9)) / 0.5, 0.5)).toBeCloseTo(0.2493, 3);
  });

  it('falls from 0.8 to 1.05 without a jump at either end', () => {
    expect(interaction(100, 200, 0.8 + 1e-9)).toBeCloseTo(interaction(100, 200, 0.8), 7);
    expect(interaction(100, 200, 1.05 - 1e-9)).toBeCloseTo(0, 7);
  });
});

describe('the reserve on load', () => {
  it('takes the first crossing when the margin comes back above the line', () => {
    const margin = (f: number) => Math.cos(3 * f);
    expect(reserveOnLoad(margin, 6)).toBeCloseTo(Math.PI / 6, 8);
  });

  it('is 0 when the secondary stress alone is outside', () => {
    expect(reserveOnLoad(() => -0.1, 3)).toBe(0);
  });

  it('is the factor to the cut-off when nothing else ends it', () => {
    expect(reserveOnLoad((f) => 3 - f, 3)).toBeCloseTo(3, 8);
  });

  it('is 0 once the ligament has failed', () => {
    expect(reserveOnLoad(() => 1, 0)).toBe(0);
    expect(reserveOnLoad(() => Number.NaN, 3)).toBe(0);
  });
});

describe('the reserve on toughness', () => {
  it('is what the toughness may be divided by', () => {
    fc.assert(
      fc.property(
        between(100, 5000),
        between(0, 0.2),
        between(0.3, 1),
        between(1000, 8000),
        (k, rho, line, kmat) => {
          const reserve = reserveOnToughness(k, rho, line, kmat) ?? Number.NaN;
          expect(k / (kmat / reserve) + rho).toBeCloseTo(line, 9);
        },
      ),
    );
  });

  it('does not exist when interaction alone reaches the line', () => {
    expect(reserveOnToughness(1000, 0.3, 0.2, 3000)).toBeNull();
    expect(reserveOnToughness(0, 0, 0.5, 3000)).toBeNull();
  });
});

describe('residual stress', () => {
  it('is relaxed by load, capped at yield and never compressive', () => {
    fc.assert(
      fc.property(
        between(0, 2000),
        between(150, 700),
        between(1, 2),
        (reference, yields, hardening) => {
          const q = relaxedResidual(reference, yields, yields * hardening);
          expect(q).toBeGreaterThanOrEqual(0);
          expect(q).toBeLessThanOrEqual(yields);
          expect(relaxedResidual(reference + 10, yields, yields * hardening)).toBeLessThanOrEqual(
            q,
          );
        },
      ),
    );
  });

  it('keeps a fifth of yield along the weld and three tenths across it after heat treatment', () => {
    expect(heatTreatedResidual('parallel', 285)).toBeCloseTo(57, 12);
    expect(heatTreatedResidual('transverse', 285)).toBeCloseTo(85.5, 12);
  });
});
