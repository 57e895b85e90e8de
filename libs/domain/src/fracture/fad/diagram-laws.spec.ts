import fc from 'fast-check';
import { brokenLimits, linePoints } from './diagram-line';
import { levelTwoLine, optionOneLine, optionTwoLine } from './diagram-lines';
import { rayFactor } from './governing-point';
import { LEVEL_TWO_CUT_OFFS, levelTwoHeight } from './level-two';
import { measuredCurve } from './measured-curve';
import { continuousLine, type DiagramMaterial } from './option-one';
import { optionTwoHeight } from './option-two';
import { reserveOnLoad } from './reserve-on-load';
import { reserveOnSize } from './reserve-on-size';
import { reserveOnToughness } from './reserve-on-toughness';
import { rambergOsgoodCurve } from './stress-strain-curve';
import { interaction } from './interaction';
import { toughnessRatio } from './toughness-ratio';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const materials: fc.Arbitrary<DiagramMaterial> = fc
  .record({
    yieldMPa: between(200, 800),
    strengthening: between(1.05, 1.9),
    youngsModulusMPa: between(180_000, 215_000),
  })
  .map(({ yieldMPa, strengthening, youngsModulusMPa }) => ({
    yieldMPa,
    tensileMPa: yieldMPa * strengthening,
    youngsModulusMPa,
    yieldPlateau: false,
  }));
const STEEL: DiagramMaterial = {
  yieldMPa: 350,
  tensileMPa: 500,
  youngsModulusMPa: 207_000,
  yieldPlateau: false,
};

describe('the lines of one material', () => {
  it('do not depend on the unit stress is measured in', () => {
    fc.assert(
      fc.property(materials, between(0.1, 10), between(0, 1.4), (material, unit, lr) => {
        const scaled = {
          ...material,
          yieldMPa: unit * material.yieldMPa,
          tensileMPa: unit * material.tensileMPa,
          youngsModulusMPa: unit * material.youngsModulusMPa,
        };
        expect(continuousLine(lr, scaled)).toBeCloseTo(continuousLine(lr, material), 10);
        expect(optionOneLine(scaled).lrMax).toBeCloseTo(optionOneLine(material).lrMax, 10);
      }),
    );
  });

  it('lie higher beyond yield the more the material hardens', () => {
    fc.assert(
      fc.property(materials, between(1.01, 1.3), between(1.01, 1.2), (material, more, lr) => {
        const harder = { ...material, tensileMPa: material.tensileMPa * more };
        expect(optionOneLine(harder).height(lr)).toBeGreaterThan(
          optionOneLine(material).height(lr),
        );
        expect(optionOneLine(harder).lrMax).toBeGreaterThan(optionOneLine(material).lrMax);
      }),
    );
  });

  it('share the cut-off at the flow stress', () => {
    fc.assert(
      fc.property(materials, (material) => {
        const curve = rambergOsgoodCurve({ ...material, exponent: 10, plasticStrain: 0.002 });
        const ends = [
          optionOneLine(material),
          optionOneLine({ ...material, yieldPlateau: true }, 'at flow stress'),
          optionTwoLine(material, curve),
          levelTwoLine('flow stress', material),
        ].map(({ lrMax }) => lrMax);
        for (const end of ends) expect(end).toBeCloseTo(ends[0] ?? Number.NaN, 12);
      }),
    );
  });

  it('have limits that name input, limit and value when they are broken', () => {
    fc.assert(
      fc.property(materials, between(0.3, 0.99), (material, share) => {
        const swapped = { ...material, tensileMPa: share * material.yieldMPa };
        for (const line of [optionOneLine(swapped), levelTwoLine('flow stress', swapped)]) {
          const [refusal] = brokenLimits(line, swapped);
          expect(refusal?.input).toBe('material.tensileMPa');
          expect(refusal?.value).toBeCloseTo(share, 9);
          expect(refusal?.message).toContain(line.title);
        }
      }),
    );
  });
});

describe('the line of Option 2', () => {
  it('lies lower the more the material strains', () => {
    fc.assert(
      fc.property(between(0.1, 1.4), between(1, 20), between(1.01, 3), (lr, ratio, more) => {
        fc.pre(lr < Math.SQRT2 * ratio);
        expect(optionTwoHeight(lr, ratio * more)).toBeLessThan(optionTwoHeight(lr, ratio));
      }),
    );
  });

  it('never lies above that of an elastic material', () => {
    fc.assert(
      fc.property(materials, between(4, 25), between(0, 1.4), (material, exponent, lr) => {
        const curve = rambergOsgoodCurve({ ...material, exponent, plasticStrain: 0.002 });
        expect(optionTwoLine(material, curve).height(lr)).toBeLessThanOrEqual(
          optionTwoHeight(lr, 1),
        );
      }),
    );
  });

  it('approaches the smooth law as the points of the test get closer', () => {
    const law = rambergOsgoodCurve({ ...STEEL, exponent: 9, plasticStrain: 0.002 });
    const worst = [14, 28, 56].map((count) => {
      const points = Array.from({ length: count + 1 }, (_, i) => {
        const stressMPa = 70 + (400 * i) / count;
        return { strain: (law.secantRatio(stressMPa) * stressMPa) / 207_000, stressMPa };
      });
      const measured = measuredCurve({ ...STEEL, points, values: 'true' });
      if (measured.status === 'refused') throw new Error(measured.refusals[0]?.message);
      const ratio = (stress: number) =>
        measured.curve.secantRatio(stress) / law.secantRatio(stress) - 1;
      return Math.max(...Array.from({ length: 80 }, (_, i) => Math.abs(ratio(70 + 5 * i))));
    });
    expect(worst[1]).toBeLessThan((worst[0] ?? 0) / 2);
    expect(worst[2]).toBeLessThan((worst[1] ?? 0) / 2);
    expect(worst[2]).toBeLessThan(1e-3);
  });
});

describe('the curve of one shape', () => {
  it('crosses the axis only beyond every cut-off', () => {
    for (const { lrMax } of Object.values(LEVEL_TWO_CUT_OFFS)) {
      expect(levelTwoHeight(lrMax)).toBeGreaterThan(0.15);
    }
    expect(levelTwoHeight(3)).toBe(0);
  });

  it('has a source for every cut-off', () => {
    for (const { key, title, source } of Object.values(LEVEL_TWO_CUT_OFFS)) {
      expect(key).toMatch(/^[a-z-]+$/);
      expect(title.length).toBeGreaterThan(5);
      expect(source).toMatch(/from memory/);
    }
  });
});

describe('a drawn line', () => {
  it('has the heights of the line', () => {
    fc.assert(
      fc.property(materials, fc.integer({ min: 4, max: 80 }), (material, intervals) => {
        const line = optionOneLine(material);
        const points = linePoints(line, intervals);
        expect(points).toHaveLength(intervals + 2);
        for (const { lr, kr } of points.slice(0, -1)) expect(kr).toBe(line.height(lr));
      }),
    );
  });

  it('leaves out a jump beyond its cut-off', () => {
    const line = { ...optionOneLine({ ...STEEL, yieldPlateau: true }), lrMax: 0.9 };
    expect(linePoints(line).every(({ kr }) => kr === 0 || kr > 0.8)).toBe(true);
  });
});

describe('the reserves of one point', () => {
  const line = optionOneLine(STEEL);
  const flaws = fc.record({
    kPrimary: between(300, 2500),
    kSecondary: between(0, 1500),
    toughness: between(2500, 6000),
    lr: between(0.1, 1),
  });
  const inside = (input: { lr: number } & Parameters<typeof toughnessRatio>[0]) =>
    toughnessRatio(input) < line.height(input.lr) && input.lr < line.lrMax;

  it('are all above 1 inside and none above 1 outside', () => {
    fc.assert(
      fc.property(flaws, (input) => {
        const { kPrimary, kSecondary, toughness, lr } = input;
        const load = reserveOnLoad((f) => {
          const at = { kPrimary: f * kPrimary, kSecondary, toughness, lr: f * lr };
          return Math.min(line.height(at.lr) - toughnessRatio(at), line.lrMax - at.lr);
        }, line.lrMax / lr);
        const rho = interaction(kPrimary, kSecondary, lr);
        const onToughness = reserveOnToughness(
          kPrimary + kSecondary,
          rho,
          line.height(lr),
          toughness,
        );
        const ray = rayFactor({ lr, kr: toughnessRatio(input) }, line) ?? Number.NaN;
        const size = reserveOnSize((f) => {
          const root = Math.sqrt(f);
          const at = { kPrimary: root * kPrimary, kSecondary: root * kSecondary, toughness, lr };
          return line.height(lr) - toughnessRatio(at);
        }, 100);
        if (inside(input)) {
          expect(load).toBeGreaterThanOrEqual(1);
          expect(ray).toBeGreaterThanOrEqual(1);
          expect(onToughness ?? 0).toBeGreaterThanOrEqual(1);
          expect(size.factor).toBeGreaterThanOrEqual(1);
        } else {
          expect(load).toBeLessThanOrEqual(1);
          expect(ray).toBeLessThanOrEqual(1);
          expect(onToughness ?? 0).toBeLessThanOrEqual(1);
          expect(size.factor).toBeLessThanOrEqual(1);
        }
      }),
    );
  });

  it('grow with toughness', () => {
    fc.assert(
      fc.property(between(0.1, 0.9), between(0.2, 0.9), between(1.01, 2), (lr, kr, tougher) => {
        const before = rayFactor({ lr, kr }, line) ?? Number.NaN;
        const after = rayFactor({ lr, kr: kr / tougher }, line) ?? Number.NaN;
        expect(after).toBeGreaterThanOrEqual(before - 1e-9);
      }),
    );
  });
});
