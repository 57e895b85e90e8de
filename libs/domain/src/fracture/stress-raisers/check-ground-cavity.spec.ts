import fc from 'fast-check';
import { peakRange } from './cavity-fatigue';
import type { CavityInput } from './cavity-input';
import { cavityBending, cavityMembrane, cavityPeakFactor, type Cavity } from './cavity-stress';
import { checkGroundCavity, type CheckedCavity } from './check-ground-cavity';
import { mm } from '../../units/quantity';
import { GROUND_CLASSES } from './sn-curve';

const [weld] = GROUND_CLASSES;
const SHALLOW: CavityInput = {
  thicknessMm: 28,
  requiredThicknessMm: 24.8,
  depthMm: 2.5,
  lengthMm: 80,
  widthMm: 30,
  bottomRadiusMm: null,
  membraneMPa: 107,
  bendingMPa: 0,
  sides: 'held',
  yieldMPa: 345,
  tensileMPa: 510,
  leastTaper: 4,
  fatigue: {
    surface: weld,
    years: 20,
    blocks: [{ membraneRangeMPa: 107, bendingRangeMPa: 0, cyclesPerYear: 1400 }],
  },
};
const ground = (more: Partial<CavityInput> = {}): CavityInput => ({ ...SHALLOW, ...more });
const checked = (input: CavityInput): CheckedCavity => {
  const answer = checkGroundCavity(input);
  if (answer.status === 'refused') throw new Error(answer.refusals[0]?.message);
  return answer;
};
const cycling = (membraneRangeMPa: number, cyclesPerYear = 1400): CavityInput['fatigue'] => ({
  surface: weld,
  years: 20,
  blocks: [{ membraneRangeMPa, bendingRangeMPa: 0, cyclesPerYear }],
});
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('a shallow ground-out cavity', () => {
  it('is acceptable with its remaining wall, peak factor and life', () => {
    const answer = checked(ground());
    expect(answer.verdict).toBe('acceptable');
    expect(answer.reasons).toEqual([]);
    expect(answer.remainingWallMm).toBe(25.5);
    expect(answer.peakFactor).toBeCloseTo(4 / 3, 12);
    expect(answer.remainingMembraneMPa).toBeCloseTo((107 * 28) / 25.5, 10);
    expect(answer.peakMPa).toBeCloseTo((4 / 3) * 117.49, 1);
    expect(answer.fatigue?.lifeYears).toBeGreaterThan(20);
    expect(answer.fatigue?.basis).toMatch(/Peak stress range.*112 MPa.*from memory/);
  });

  it('is judged without fatigue when the load does not vary', () => {
    const answer = checked(ground({ fatigue: null }));
    expect(answer.fatigue).toBeNull();
    expect(answer.checks).toHaveLength(4);
  });

  it('has no end of life when no range does damage', () => {
    expect(checked(ground({ fatigue: cycling(0) })).fatigue).toMatchObject({
      damagePerYear: 0,
      lifeYears: null,
    });
  });
});

describe('a cavity is not acceptable', () => {
  it.each([
    ['too little wall', { requiredThicknessMm: 26 }, /Remaining wall is 25.5 mm.*at least 26 mm/],
    ['too steep', { widthMm: 19 }, /Taper.* is 3.8; it must be at least 4/],
    ['membrane', { membraneMPa: 200 }, /Membrane stress in the remaining wall/],
    ['bending', { bendingMPa: -180 }, /Membrane and bending in the remaining wall/],
    ['fatigue', { fatigue: cycling(107, 40_000) }, /Fatigue damage/],
  ] as const)('for %s, and says so', (_, more, reason) => {
    const answer = checked(ground(more));
    expect(answer.verdict).toBe('not acceptable');
    expect(answer.reasons).toHaveLength(1);
    expect(answer.reasons[0]).toMatch(reason);
  });

  it('for several reasons at once', () => {
    const answer = checked(ground({ requiredThicknessMm: 27, widthMm: 10, membraneMPa: 240 }));
    expect(answer.reasons).toHaveLength(3);
  });
});

describe('the stress of a cavity', () => {
  const cavity = (depth: number, more: Partial<Cavity> = {}): Cavity => ({
    thickness: mm(20),
    depth: mm(depth),
    length: mm(60),
    width: mm(24),
    bottomRadius: null,
    ...more,
  });

  it('takes the worse orientation: length and width may be swapped', () => {
    const swapped = { length: mm(24), width: mm(60) };
    expect(cavityPeakFactor(cavity(3))).toBe(cavityPeakFactor(cavity(3, swapped)));
    expect(cavityPeakFactor(cavity(3))).toBe(1.5);
  });

  it('takes the measured radius when it is sharper than the ellipse', () => {
    expect(cavityPeakFactor(cavity(3, { bottomRadius: mm(48) }))).toBeCloseTo(1.5, 12);
    expect(cavityPeakFactor(cavity(3, { bottomRadius: mm(3) }))).toBe(3);
    expect(cavityPeakFactor(cavity(3, { bottomRadius: mm(500) }))).toBe(1.5);
  });

  it('is never below the stress of the full wall and rises with depth', () => {
    fc.assert(
      fc.property(between(0.1, 9), between(0.01, 1), (depth, more) => {
        const [a, b] = [cavity(depth), cavity(depth + more)];
        const stress = { membrane: 100, bending: 20 };
        expect(cavityPeakFactor(a)).toBeGreaterThan(1);
        expect(cavityPeakFactor(b)).toBeGreaterThan(cavityPeakFactor(a));
        expect(cavityMembrane(b, 100)).toBeGreaterThan(cavityMembrane(a, 100));
        for (const free of [true, false])
          expect(cavityBending(b, stress, free)).toBeGreaterThan(cavityBending(a, stress, free));
      }),
    );
  });

  it('bends the wall when its sides are free to turn, in balance with the force off the middle', () => {
    // force σ t at the middle of the full wall, d/2 from the middle of what remains
    const moment = 100 * 20 * (4 / 2);
    const modulus = 16 ** 2 / 6;
    const stress = { membrane: 100, bending: 0 };
    expect(cavityBending(cavity(4), stress, true)).toBeCloseTo(moment / modulus, 10);
    expect(cavityBending(cavity(4), stress, false)).toBe(0);
  });

  it('scales with the load', () => {
    fc.assert(
      fc.property(between(1, 100), between(0.1, 2), (range, factor) => {
        const block = (r: number) => ({
          membraneRangeMPa: r,
          bendingRangeMPa: r / 3,
          cyclesPerYear: 1,
        });
        const one = peakRange(ground(), block(range));
        expect(peakRange(ground(), block(factor * range))).toBeCloseTo(factor * one, 8);
      }),
    );
  });
});

describe('a cavity that gets worse', () => {
  it('never lives longer', () => {
    fc.assert(
      fc.property(
        between(0.5, 3),
        between(0.05, 0.5),
        between(20, 120),
        between(1, 20),
        (depth, deeper, range, more) => {
          const life = (d: number, r: number) =>
            checked(ground({ depthMm: d, fatigue: cycling(r) })).fatigue?.lifeYears ?? Infinity;
          expect(life(depth + deeper, range)).toBeLessThan(life(depth, range));
          expect(life(depth, range + more)).toBeLessThan(life(depth, range));
        },
      ),
    );
  });

  it('adds the damage of its blocks', () => {
    const [one, other] = [cycling(100, 500), cycling(60, 3000)];
    const damage = (fatigue: CavityInput['fatigue']) =>
      checked(ground({ fatigue })).fatigue?.damagePerYear ?? 0;
    const blocks = [...(one?.blocks ?? []), ...(other?.blocks ?? [])];
    const both = damage({ surface: weld, years: 20, blocks });
    expect(both).toBeCloseTo(damage(one) + damage(other), 14);
  });
});

describe('a cavity outside the method is refused', () => {
  it.each([
    ['no depth', { depthMm: 0 }, 'cavity.depthMm'],
    ['deeper than half the wall', { depthMm: 15, widthMm: 200 }, 'cavity.depthMm'],
    ['steeper than a half circle', { widthMm: 4 }, 'cavity.depthMm'],
    ['wall in metres', { thicknessMm: 0.028 }, 'cavity.thicknessMm'],
    ['stress in kPa', { membraneMPa: 107_000 }, 'cavity.membraneMPa'],
    ['compression', { membraneMPa: -20 }, 'cavity.membraneMPa'],
    ['no number', { lengthMm: Number.NaN }, 'cavity.lengthMm'],
    ['infinite', { widthMm: Infinity }, 'cavity.widthMm'],
    ['yield and tensile swapped', { yieldMPa: 510, tensileMPa: 345 }, 'cavity.tensileMPa'],
    ['no radius', { bottomRadiusMm: 0 }, 'cavity.bottomRadiusMm'],
    ['taper upside down', { leastTaper: 0.25 }, 'cavity.leastTaper'],
    [
      'yields in every cycle',
      { fatigue: cycling(500) },
      'cavity.fatigue.blocks.0.membraneRangeMPa',
    ],
    ['negative cycles', { fatigue: cycling(100, -1) }, 'cavity.fatigue.blocks.0.cyclesPerYear'],
    [
      'no class',
      { fatigue: { surface: { ...weld, rangeMPa: 0 }, years: 20, blocks: [] } },
      'cavity.fatigue.surface.rangeMPa',
    ],
    ['no time', { fatigue: { surface: weld, years: 0, blocks: [] } }, 'cavity.fatigue.years'],
  ] as const)('%s', (_, more, path) => {
    const answer = checkGroundCavity(ground(more));
    expect(answer.status === 'refused' && answer.refusals.map((each) => each.input)).toContain(
      path,
    );
  });
});
