import fc from 'fast-check';
import { raiserInStrip } from './raiser-in-strip';
import { ellipseInStrip, holeInStrip, holeInStripHeywood } from './strip-factors';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('holes in a strip', () => {
  it('raise the net stress less and the gross stress more the wider they are', () => {
    fc.assert(
      fc.property(between(0.05, 0.8), between(0.01, 0.1), (share, more) => {
        for (const form of [holeInStrip, holeInStripHeywood]) {
          expect(form(share + more).net).toBeLessThan(form(share).net);
          expect(form(share + more).gross).toBeGreaterThan(form(share).gross);
        }
      }),
    );
  });

  it('are nowhere more than 0.1 % below the wide plate on the gross stress, where the fit dips', () => {
    fc.assert(
      fc.property(between(0, 0.99), (share) => {
        expect(holeInStrip(share).gross).toBeGreaterThan(3 * 0.999);
      }),
    );
  });

  it('agree within 2 % between the two published forms, to half the width', () => {
    fc.assert(
      fc.property(between(0, 0.5), (share) => {
        expect(Math.abs(holeInStrip(share).net / holeInStripHeywood(share).net - 1)).toBeLessThan(
          0.02,
        );
      }),
    );
  });

  it('end at twice the net stress when nothing is left, whatever the ellipse', () => {
    fc.assert(
      fc.property(between(0.5, 10), (slenderness) => {
        expect(ellipseInStrip(slenderness, 1).net).toBeCloseTo(2, 10);
      }),
    );
  });

  it('have the circle as an ellipse of equal axes, within 1 %', () => {
    fc.assert(
      fc.property(between(0, 0.6), (share) => {
        expect(Math.abs(ellipseInStrip(1, share).net / holeInStrip(share).net - 1)).toBeLessThan(
          0.012,
        );
      }),
    );
  });
});

describe('the raiser in a strip', () => {
  const strip = { halfAxisAcrossMm: 10, halfAxisAlongMm: 10, widthMm: 100 };

  it('is a circle with equal half axes, an ellipse otherwise', () => {
    const circle = raiserInStrip(strip);
    expect(circle.status === 'found' && circle.gross).toBeCloseTo(3.1352, 4);
    const ellipse = raiserInStrip({ ...strip, halfAxisAlongMm: 5 });
    expect(ellipse.status === 'found' && ellipse.source).toMatch(/Isida/);
    expect(ellipse.status === 'found' && ellipse.gross).toBeGreaterThan(5);
  });

  it('says when it is beyond the results behind the fit', () => {
    const wide = raiserInStrip({ ...strip, widthMm: 30 });
    expect(wide).toMatchObject({ status: 'found', extrapolated: true });
    expect(raiserInStrip(strip)).toMatchObject({ extrapolated: false });
  });

  it.each([
    [{ ...strip, widthMm: 20 }, 'halfAxisAcrossMm'],
    [{ ...strip, widthMm: 10 }, 'halfAxisAcrossMm'],
    [{ ...strip, halfAxisAlongMm: 0.5 }, 'halfAxisAlongMm'],
    [{ ...strip, halfAxisAlongMm: 0 }, 'halfAxisAlongMm'],
    [{ ...strip, halfAxisAcrossMm: -10 }, 'halfAxisAcrossMm'],
    [{ ...strip, widthMm: Number.NaN }, 'widthMm'],
    [{ ...strip, widthMm: 1e9 }, 'widthMm'],
  ])('refuses %j by %s', (input, path) => {
    const found = raiserInStrip(input);
    expect(found.status === 'refused' && found.refusals.map((each) => each.input)).toContain(path);
  });
});
