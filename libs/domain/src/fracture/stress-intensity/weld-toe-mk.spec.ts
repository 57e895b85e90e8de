import fc from 'fast-check';
import { mm } from '../../units/quantity';
import { influenceOf, kOf } from '../../verification/crack-of';
import { PLATE_EXTENDED_SURFACE_K } from './plate-extended-surface-k';
import { PLATE_SURFACE_K } from './plate-surface-k';
import { weldToeBending, weldToeMembrane } from './weld-toe-mk';
import { withWeldToe } from './with-weld-toe';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const sizes = fc.record({ z: between(0.005, 20), length: between(1, 100) });
const B = mm(20);

describe('the magnification at a weld toe', () => {
  it('is never below 1 and fades with depth', () => {
    fc.assert(
      fc.property(sizes, ({ z, length }) => {
        for (const mk of [weldToeMembrane, weldToeBending]) {
          const here = mk(mm(z), mm(length), B);
          expect(here).toBeGreaterThanOrEqual(1);
          // the printed branches meet within 3 %
          expect(mk(mm(1.05 * z), mm(length), B)).toBeLessThanOrEqual(1.03 * here);
        }
        expect(weldToeMembrane(mm(20), mm(length), B)).toBe(1);
        expect(weldToeBending(mm(20), mm(length), B)).toBe(1);
      }),
    );
  });

  it.each([
    [weldToeMembrane, (l: number) => (l <= 2 ? 0.05 * l ** 0.55 : 0.073), 0.035],
    [weldToeBending, (l: number) => 0.03 * Math.min(l, 1) ** 0.55, 0.025],
  ] as const)('%p: its branches meet', (mk, end, gap) => {
    for (const length of [0.1, 0.5, 1, 2, 3]) {
      const at = (z: number) => mk(mm(z), mm(length), mm(1));
      const ratio = at(end(length) * (1 + 1e-9)) / at(end(length) * (1 - 1e-9));
      expect(Math.abs(ratio - 1)).toBeLessThan(gap);
    }
  });

  it('stays as it is for attachments longer than the rule counts', () => {
    const z = mm(0.4);
    expect(weldToeMembrane(z, mm(60), B)).toBe(weldToeMembrane(z, mm(90), B));
    expect(weldToeMembrane(z, mm(40.001), B) / weldToeMembrane(z, mm(39.999), B)).toBeCloseTo(1, 2);
    expect(weldToeBending(z, mm(21), B)).toBe(weldToeBending(z, mm(90), B));
  });

  it('is higher for a longer attachment near the toe', () => {
    fc.assert(
      fc.property(between(1, 39), (length) => {
        const mk = (l: number) => weldToeMembrane(mm(0.02), mm(l), B);
        expect(mk(length + 1)).toBeGreaterThan(mk(length));
      }),
    );
  });

  it('depends on ratios alone', () => {
    expect(weldToeMembrane(mm(1), mm(10), mm(20))).toBeCloseTo(
      weldToeMembrane(mm(3), mm(30), mm(60)),
      12,
    );
  });
});

describe('a surface flaw at a weld toe', () => {
  const toe = withWeldToe(PLATE_SURFACE_K, mm(30));
  const crack = { a: 2, c: 5, t: 20, W: 400 };
  const ratio = (angle: number, part: 'membrane' | 'bending' | 'reversedBending') =>
    influenceOf(toe, crack, angle)[part] / influenceOf(PLATE_SURFACE_K, crack, angle)[part];

  it('is magnified at z = a in the depth and at z = 0.15 mm at its ends', () => {
    expect(ratio(90, 'membrane')).toBeCloseTo(weldToeMembrane(mm(2), mm(30), B), 12);
    expect(ratio(90, 'bending')).toBeCloseTo(weldToeBending(mm(2), mm(30), B), 12);
    expect(ratio(0, 'membrane')).toBeCloseTo(weldToeMembrane(mm(0.15), mm(30), B), 12);
    expect(ratio(0, 'bending')).toBeCloseTo(weldToeBending(mm(0.15), mm(30), B), 12);
    expect(ratio(0, 'reversedBending')).toBeCloseTo(ratio(0, 'bending'), 12);
  });

  it('is never below the plain flaw in tension', () => {
    fc.assert(
      fc.property(between(0.05, 15), between(0, 90), (a, angle) => {
        const flaw = { a, c: 2 * a, t: 20 };
        expect(kOf(toe, flaw, angle, 100)).toBeGreaterThanOrEqual(
          kOf(PLATE_SURFACE_K, flaw, angle, 100),
        );
      }),
    );
  });

  it('takes a flaw shallower than 0.15 mm at its own depth', () => {
    const shallow = { a: 0.1, c: 0.3, t: 20 };
    const mk =
      influenceOf(toe, shallow, 0).membrane / influenceOf(PLATE_SURFACE_K, shallow, 0).membrane;
    expect(mk).toBeCloseTo(weldToeMembrane(mm(0.1), mm(30), B), 12);
  });

  it('keeps limits and front, says the toe, and leaves curved stress to the upper estimate', () => {
    const long = withWeldToe(PLATE_EXTENDED_SURFACE_K, mm(30));
    expect(long.limits).toBe(PLATE_EXTENDED_SURFACE_K.limits);
    expect(long.front).toBe('straight');
    expect(long.key).toBe('plate-extended-surface-weld-toe');
    expect(long.source).toMatch(/from memory/);
    expect(long.higher).toBeNull();
  });
});
