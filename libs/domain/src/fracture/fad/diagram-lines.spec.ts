import fc from 'fast-check';
import { brokenLimits, linePoints, type DiagramLine } from './diagram-line';
import { levelTwoLine, optionOneLine, optionTwoLine } from './diagram-lines';
import { LEVEL_TWO_CUT_OFFS } from './level-two';
import type { DiagramMaterial } from './option-one';
import { optionTwoHeight } from './option-two';
import { rambergOsgoodCurve } from './stress-strain-curve';

const STEEL: DiagramMaterial = {
  yieldMPa: 350,
  tensileMPa: 500,
  youngsModulusMPa: 207_000,
  yieldPlateau: false,
};
const PLATEAU = { ...STEEL, yieldPlateau: true };
const CURVE = rambergOsgoodCurve({
  youngsModulusMPa: 207_000,
  yieldMPa: 350,
  exponent: 12,
  plasticStrain: 0.002,
});
const LINES: readonly DiagramLine[] = [
  optionOneLine(STEEL),
  optionOneLine(PLATEAU),
  optionOneLine(PLATEAU, 'at flow stress'),
  optionTwoLine(STEEL, CURVE),
  levelTwoLine(LEVEL_TWO_CUT_OFFS.austenitic, STEEL),
  levelTwoLine('flow stress', STEEL),
];
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe.each(LINES.map((line) => [`${line.title} to ${line.lrMax.toFixed(3)}`, line] as const))(
  '%s',
  (_, line) => {
    it('starts at 1 and falls all the way to its cut-off', () => {
      expect(line.height(0)).toBeCloseTo(1, 12);
      fc.assert(
        fc.property(between(0, 1), between(0.01, 0.3), (share, more) => {
          const lr = share * line.lrMax;
          expect(line.height(lr + more)).toBeLessThan(line.height(lr));
        }),
      );
    });

    it('is continuous but for the jumps it names', () => {
      fc.assert(
        fc.property(between(0, 1), (share) => {
          const lr = share * line.lrMax;
          fc.pre(line.jumps.every((jump) => Math.abs(jump.lr - lr) > 1e-6));
          expect(line.height(lr + 1e-9)).toBeCloseTo(line.height(lr), 6);
        }),
      );
      for (const { lr, before, after } of line.jumps) {
        expect(line.height(lr * (1 - 1e-12))).toBeCloseTo(before, 9);
        expect(line.height(lr)).toBeCloseTo(after, 12);
      }
    });

    it('is drawn from the axis to the cut-off and down, never rising', () => {
      const points = linePoints(line);
      expect(points[0]?.lr).toBe(0);
      expect(points.at(-1)).toEqual({ lr: line.lrMax, kr: 0 });
      points.slice(1).forEach(({ lr, kr }, i) => {
        expect(lr).toBeGreaterThanOrEqual(points[i]?.lr ?? Infinity);
        expect(kr).toBeLessThanOrEqual(points[i]?.kr ?? -1);
      });
    });
  },
);

describe('the line of a material with a yield plateau', () => {
  it('ends at yield, and goes on to the flow stress where the published form is asked for', () => {
    expect(optionOneLine(PLATEAU).lrMax).toBe(1);
    expect(optionOneLine(PLATEAU, 'at flow stress').lrMax).toBeCloseTo(850 / 700, 12);
  });

  it('is drawn with both ends of its drop', () => {
    const at = linePoints(optionOneLine(PLATEAU, 'at flow stress')).filter(({ lr }) => lr === 1);
    expect(at).toHaveLength(2);
    expect(at[0]?.kr).toBeCloseTo(Math.sqrt(2 / 3), 12);
    expect(at[1]?.kr).toBeCloseTo(0.2543, 3);
  });
});

describe('the line of Option 2', () => {
  it('is (1 + Lr²/2)^−½ for an elastic curve', () => {
    fc.assert(
      fc.property(between(0, 2), (lr) => {
        expect(optionTwoHeight(lr, 1)).toBeCloseTo((1 + (lr * lr) / 2) ** -0.5, 12);
      }),
    );
  });

  it('is two thirds at yield where E is 500 times the 0.2 % proof strength', () => {
    const curve = rambergOsgoodCurve({
      youngsModulusMPa: 200_000,
      yieldMPa: 400,
      exponent: 10,
      plasticStrain: 0.002,
    });
    const material = { ...STEEL, yieldMPa: 400, youngsModulusMPa: 200_000 };
    expect(optionTwoLine(material, curve).height(1)).toBeCloseTo(2 / 3, 14);
  });

  it('ends where its curve does', () => {
    const short = { ...CURVE, lastStressMPa: 385 };
    expect(optionTwoLine(STEEL, short).lrMax).toBeCloseTo(1.1, 12);
  });
});

describe('the limits of a line', () => {
  it('are met by a sound material', () => {
    for (const line of LINES) expect(brokenLimits(line, STEEL)).toEqual([]);
  });

  it('refuse strengths that are swapped or no numbers', () => {
    const swapped = { ...STEEL, yieldMPa: 500, tensileMPa: 350 };
    expect(brokenLimits(optionOneLine(swapped), swapped)[0]).toMatchObject({
      input: 'material.tensileMPa',
      limit: 'σU/σY ≥ 1',
      value: 0.7,
    });
    const none = { ...STEEL, tensileMPa: Number.NaN };
    expect(brokenLimits(optionOneLine(none), none)[0]?.value).toBe('NaN');
  });

  it('refuse a plateau the formula knows no length for', () => {
    const strong = { ...PLATEAU, yieldMPa: 960, tensileMPa: 1000 };
    expect(brokenLimits(optionOneLine(strong), strong)).toHaveLength(1);
    const smooth = { ...strong, yieldPlateau: false };
    expect(brokenLimits(optionOneLine(smooth), smooth)).toEqual([]);
  });
});
