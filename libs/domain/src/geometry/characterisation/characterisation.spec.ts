import fc from 'fast-check';
import { boundingArea, boundingRectangle } from './bounding';
import { SURFACE_RULES, surfaceRule, THROUGH_RULES } from './category-rules';
import { combineFlaws } from './combine-flaws';
import { INTERACTION_RULES, interactionRule, type PlacedFlaw } from './interaction-rules';
import { combined, extentThrough, interacts } from './interacts';
import { principalDirection, projectedLength } from './projection';
import { sizedUp } from './sized-up';

const surface = (name: string, a: number, c: number, positionMm: number): PlacedFlaw => ({
  name,
  kind: 'surface',
  a,
  c,
  ligamentMm: 0,
  positionMm,
  planeMm: 0,
});
const embedded = (
  name: string,
  a: number,
  c: number,
  ligamentMm: number,
  positionMm = 0,
): PlacedFlaw => ({ ...surface(name, a, c, positionMm), kind: 'embedded', ligamentMm });

const size = fc.double({ min: 0.5, max: 20, noNaN: true });
const anyFlaw = fc
  .record({
    kind: fc.constantFrom('surface' as const, 'embedded' as const),
    a: size,
    c: size,
    ligament: size,
    positionMm: fc.double({ min: -150, max: 150, noNaN: true }),
    planeMm: fc.double({ min: 0, max: 8, noNaN: true }),
  })
  .map(({ ligament, ...flaw }): Omit<PlacedFlaw, 'name'> => ({
    ...flaw,
    ligamentMm: flaw.kind === 'surface' ? 0 : ligament,
  }));
const anyFlaws = fc
  .array(anyFlaw, { minLength: 1, maxLength: 6 })
  .map((flaws) => flaws.map((flaw, i): PlacedFlaw => ({ ...flaw, name: `F0${i + 1}` })));
const anyRule = fc.constantFrom(...INTERACTION_RULES);

describe('the rectangle around sized points', () => {
  it('has their extent and their distance to the face', () => {
    const points = [
      [0, 3],
      [4, 6.5],
      [9, 8],
      [18, 3.5],
    ].map(([alongMm = 0, depthMm = 0]) => ({ alongMm, depthMm }));
    expect(boundingRectangle(points)).toEqual({ lengthMm: 18, heightMm: 5, toFaceMm: 3 });
  });

  it('is none without points, or with one that is no number', () => {
    expect(boundingRectangle([])).toBeNull();
    expect(boundingRectangle([{ alongMm: Number.NaN, depthMm: 1 }])).toBeNull();
  });

  it('bounds an ellipse of twice the half ellipse', () => {
    expect(boundingArea('embedded', 5, 15)).toBeCloseTo(2 * boundingArea('surface', 5, 15), 12);
  });
});

describe('a flaw at an angle', () => {
  it('counts in full in the plane and not at all across it', () => {
    expect(projectedLength(20, 0)).toBe(20);
    expect(projectedLength(20, 90)).toBeCloseTo(0, 12);
    expect(projectedLength(20, -30)).toBe(projectedLength(20, 30));
  });

  it('is opened along the larger stress when there is no shear', () => {
    expect(principalDirection(100, 50, 0)).toBe(0);
    expect(principalDirection(50, 100, 0)).toBe(90);
    expect(principalDirection(100, 100, 0)).toBe(0);
  });
});

describe('a measured size', () => {
  it('grows with bias, deviation and level', () => {
    expect(sizedUp(5, 0, 0)).toBe(5);
    expect(sizedUp(5, 0.5, 0.8, '99 %')).toBeGreaterThan(sizedUp(5, 0.5, 0.8, '95 %'));
    expect(sizedUp(5, 0.5, 0.8)).toBeGreaterThan(sizedUp(5, 0, 0.8));
  });
});

describe('the rules of category', () => {
  it('take a flaw without a ligament as one of the surface, and enclose it', () => {
    fc.assert(
      fc.property(size, size, fc.constantFrom(...SURFACE_RULES), (a, c, rule) => {
        expect(rule.margin(a, 0, 50)).toBeLessThanOrEqual(0);
        const flaw = rule.surfaceFlaw(a, c, 1);
        expect(flaw.a).toBeCloseTo(2 * a + 1, 12);
        expect(flaw.c).toBeGreaterThanOrEqual(c);
      }),
    );
  });

  it('take the default where a key is not known', () => {
    expect(surfaceRule('no such rule')).toBe(SURFACE_RULES[0]);
    expect(interactionRule(null)).toBe(INTERACTION_RULES[0]);
  });

  it('let a flaw through the wall keep its length once nothing is left of the wall', () => {
    for (const rule of THROUGH_RULES) {
      expect(rule.halfLength(25, 30, 25)).toBe(30);
      expect(rule.margin(25, 25)).toBeLessThanOrEqual(0);
      expect(rule.margin(10, 25)).toBeGreaterThan(0);
    }
  });
});

describe('two flaws', () => {
  const [bs] = INTERACTION_RULES;

  it('side by side interact at the limit and not beyond it', () => {
    const one = surface('A', 3, 6, 0);
    const at = (gapMm: number) => interacts(one, surface('B', 4, 8, 14 + gapMm), bs);
    expect(at(2)).toMatchObject({ interacts: true, gapMm: 2, limitMm: 2 });
    expect(at(2.001).interacts).toBe(false);
  });

  it('of which one is deeper than half as long as it is interact over twice the shorter half length', () => {
    const found = interacts(surface('A', 6, 4, 0), surface('B', 4, 8, 12 + 7), bs);
    expect(found).toMatchObject({ interacts: true, limitMm: 8 });
  });

  it('one above the other interact through the wall', () => {
    const found = interacts(embedded('A', 2, 10, 5), embedded('B', 3, 10, 13.5), bs);
    expect(found).toMatchObject({
      interacts: true,
      arrangement: 'one above the other',
      gapMm: 4.5,
      limitMm: 5,
    });
  });

  it('in planes too far apart do not interact', () => {
    const far = { ...surface('B', 4, 8, 14), planeMm: 5 };
    expect(interacts(surface('A', 3, 6, 0), far, bs).interacts).toBe(false);
    expect(interacts(surface('A', 3, 6, 0), far, interactionRule('asme-xi')).interacts).toBe(true);
  });

  it('are seen alike from either side', () => {
    fc.assert(
      fc.property(anyFlaw, anyFlaw, anyRule, (a, b, rule) => {
        const [one, other] = [
          { ...a, name: 'A' },
          { ...b, name: 'B' },
        ];
        expect(interacts(one, other, rule)).toEqual(interacts(other, one, rule));
        expect(combined(one, other)).toEqual(combined(other, one));
      }),
    );
  });

  it('become one that encloses both', () => {
    fc.assert(
      fc.property(anyFlaw, anyFlaw, (a, b) => {
        const parts = [
          { ...a, name: 'A' },
          { ...b, name: 'B' },
        ] as const;
        const whole = combined(...parts);
        const [top, bottom] = extentThrough(whole);
        for (const part of parts) {
          const [from, to] = extentThrough(part);
          expect(top).toBeLessThanOrEqual(from + 1e-9);
          expect(bottom).toBeGreaterThanOrEqual(to - 1e-9);
          expect(whole.positionMm - whole.c).toBeLessThanOrEqual(part.positionMm - part.c + 1e-9);
          expect(whole.positionMm + whole.c).toBeGreaterThanOrEqual(
            part.positionMm + part.c - 1e-9,
          );
        }
      }),
    );
  });
});

describe('many flaws', () => {
  const combine = (flaws: readonly PlacedFlaw[], rule = INTERACTION_RULES[0], original = false) => {
    const found = combineFlaws(flaws, rule, { originalDimensionsOnly: original });
    if (found.status === 'refused') throw new Error('refused');
    return found;
  };

  it('are combined until nothing changes, whatever their order', () => {
    fc.assert(
      fc.property(anyFlaws, anyRule, (flaws, rule) => {
        const { flaws: left } = combine(flaws, rule);
        const other = combine([...flaws].reverse(), rule).flaws;
        const names = (list: readonly PlacedFlaw[]) => list.map(({ name }) => name).sort();
        expect(names(left)).toEqual(names(other));
        for (const [i, one] of left.entries()) {
          for (const two of left.slice(i + 1)) {
            expect(interacts(one, two, rule).interacts).toBe(false);
          }
        }
      }),
    );
  });

  it('say which were combined, by which rule and into what', () => {
    const { flaws, steps } = combine([surface('A', 3, 6, 0), surface('B', 4, 8, 15)]);
    expect(flaws).toHaveLength(1);
    expect(steps).toEqual([
      expect.objectContaining({ flaws: ['A', 'B'], rule: 'bs-2013', gapMm: 1, limitMm: 2 }),
    ]);
    expect(flaws[0]).toMatchObject({ a: 4, c: 14.5, positionMm: 8.5 });
  });

  it('by the dimensions as found alone do not grow from combination to combination', () => {
    // A and B become deep and reach C only as one
    const flaws = [surface('A', 3, 6, 0), surface('B', 8, 7, 12), surface('C', 1, 6, 26.5)];
    expect(combine(flaws).flaws.length).toBeLessThanOrEqual(
      combine(flaws, INTERACTION_RULES[0], true).flaws.length,
    );
  });

  it('that cannot be are refused by name', () => {
    const bad = [{ ...surface('A', 3, 6, 0), a: -1 }, surface('B', 4, Number.NaN, 0)];
    expect(combineFlaws(bad, INTERACTION_RULES[0])).toMatchObject({
      status: 'refused',
      refusals: [{ input: 'flaws.0.a', value: -1 }, { input: 'flaws.1.c' }],
    });
  });
});
