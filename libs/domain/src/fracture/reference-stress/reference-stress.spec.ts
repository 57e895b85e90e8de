import fc from 'fast-check';
import { mpa } from '../../units/quantity';
import { crackOf } from '../../verification/crack-of';
import { CATALOGUE } from '../catalogue';
import { cylinderAxialApiReference } from './cylinder-axial-api-reference';
import { cylinderAxialReference } from './cylinder-axial-reference';
import { cylinderCircumferentialReference } from './cylinder-circumferential-reference';
import { plateEmbeddedReference } from './plate-embedded-reference';
import { plateSurfaceReference, plateSurfaceReferencePinned } from './plate-surface-reference';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const FORMULAS = {
  plateSurfaceReference,
  plateSurfaceReferencePinned,
  plateEmbeddedReference,
  cylinderAxialReference,
  cylinderAxialApiReference,
  cylinderCircumferentialReference,
};
const crack = (depth: number, c: number) =>
  crackOf({ a: 10 * depth, c, t: 20, p: 20 - 20 * depth > 1 ? 0.5 : 0, Ri: 400 });

describe.each(Object.entries(FORMULAS))('%s', (_, formula) => {
  it('scales with the load', () => {
    fc.assert(
      fc.property(between(0.05, 0.9), between(5, 200), (depth, c) => {
        const at = (f: number) => formula(crack(depth, c), mpa(100 * f), mpa(40 * f));
        expect(at(2)).toBeCloseTo(2 * at(1), 7);
      }),
    );
  });

  it('rises with depth, with length and with either stress', () => {
    fc.assert(
      fc.property(between(0.05, 0.85), between(5, 200), (depth, c) => {
        const base = formula(crack(depth, c), mpa(100), mpa(40));
        expect(formula(crack(depth + 0.05, c), mpa(100), mpa(40))).toBeGreaterThan(base);
        expect(formula(crack(depth, c * 1.1), mpa(100), mpa(40))).toBeGreaterThanOrEqual(base);
        expect(formula(crack(depth, c), mpa(110), mpa(40))).toBeGreaterThan(base);
        expect(formula(crack(depth, c), mpa(100), mpa(50))).toBeGreaterThan(base);
      }),
    );
  });

  it('takes bending without its sign', () => {
    expect(formula(crack(0.4, 30), mpa(100), mpa(-40))).toBe(
      formula(crack(0.4, 30), mpa(100), mpa(40)),
    );
  });

  it('never falls below the stress of the sound wall', () => {
    fc.assert(
      fc.property(
        between(0.01, 0.9),
        between(5, 200),
        between(0, 200),
        between(0, 200),
        (depth, c, pm, pb) => {
          const sound = (pb + Math.hypot(pb, 3 * pm)) / 3;
          const own = formula(crack(depth, c), mpa(pm), mpa(pb));
          // the cylinder forms add bending elastically: below the plastic sum by design only with pure parts
          expect(own).toBeGreaterThan(Math.max(pm, (2 * pb) / 3) * 0.999 - 1e-9);
          expect(own).toBeLessThan(Math.max(sound, 1e-9) * 400);
        },
      ),
    );
  });
});

describe('reference stress at the end', () => {
  it('is infinite once the wall is gone', () => {
    const gone = crackOf({ a: 20, c: Infinity, t: 20, Ri: 400 });
    expect(plateSurfaceReference(gone, mpa(100), mpa(0))).toBe(Infinity);
    expect(cylinderAxialReference(gone, mpa(100), mpa(0))).toBe(Infinity);
    expect(cylinderAxialApiReference(gone, mpa(100), mpa(0))).toBe(Infinity);
    expect(cylinderCircumferentialReference(gone, mpa(100), mpa(0))).toBe(Infinity);
    const middle = crackOf({ a: 10, c: Infinity, t: 20, p: 0 });
    expect(plateEmbeddedReference(middle, mpa(100), mpa(0))).toBe(Infinity);
  });

  it('is higher when the wall is free to bend', () => {
    const flaw = crackOf({ a: 8, c: 40, t: 20 });
    expect(plateSurfaceReferencePinned(flaw, mpa(100), mpa(0))).toBeGreaterThan(
      plateSurfaceReference(flaw, mpa(100), mpa(0)),
    );
  });

  it('is more cautious in the BS form for an axial flaw than in the API form', () => {
    fc.assert(
      fc.property(between(0.05, 0.75), between(10, 150), (depth, c) => {
        const flaw = crackOf({ a: 25 * depth, c, t: 25, Ri: 750 });
        expect(cylinderAxialReference(flaw, mpa(200), mpa(0))).toBeGreaterThan(
          cylinderAxialApiReference(flaw, mpa(200), mpa(0)),
        );
      }),
    );
  });

  it('has a title, a source and a basis for every choice', () => {
    for (const { referenceStress, stressIntensity } of Object.values(CATALOGUE)) {
      for (const each of referenceStress) {
        expect(each.source.length).toBeGreaterThan(10);
        expect(each.basis.length).toBeGreaterThan(10);
      }
      for (const each of stressIntensity) {
        expect(each.source.length).toBeGreaterThan(10);
        expect(each.accuracy.length).toBeGreaterThan(10);
        for (const limit of each.limits) expect(limit.instead.length).toBeGreaterThan(10);
      }
    }
  });
});
