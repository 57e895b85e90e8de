import { outOfBounds, type NumberRule, type Refusal } from '../../geometry/refusal';
import type { CavityBlock, CavityInput } from './cavity-input';
import { LENGTH_HINT, STRESS_HINT } from './hole-rules';

type Row = readonly [
  key: keyof CavityInput & string,
  name: string,
  unit: string,
  min: number,
  max: number,
  instead: string,
  above?: 'above',
];

const ROWS: readonly Row[] = [
  ['thicknessMm', 'Wall thickness', 'mm', 1, 1000, LENGTH_HINT],
  ['requiredThicknessMm', 'Required wall', 'mm', 0, 1000, LENGTH_HINT, 'above'],
  ['depthMm', 'Cavity depth', 'mm', 0, 1000, LENGTH_HINT, 'above'],
  ['lengthMm', 'Cavity length', 'mm', 0, 1e5, LENGTH_HINT, 'above'],
  ['widthMm', 'Cavity width', 'mm', 0, 1e5, LENGTH_HINT, 'above'],
  ['membraneMPa', 'Membrane stress', 'MPa', 0, 2000, STRESS_HINT],
  ['bendingMPa', 'Bending stress', 'MPa', -2000, 2000, STRESS_HINT],
  ['yieldMPa', 'Yield strength', 'MPa', 50, 2000, STRESS_HINT],
  ['tensileMPa', 'Tensile strength', 'MPa', 50, 3000, STRESS_HINT],
  ['leastTaper', 'Least taper', '', 1, 100, 'Give the extent over the depth: 4 for one in four.'],
];

/** Every number of a cavity that is impossible or in another unit, and every pair that contradicts itself. */
export function cavityRefusals(input: CavityInput): readonly Refusal[] {
  const single = outOfBounds([
    ...ROWS.map(([key, name, unit, min, max, instead, above]) => ({
      input: `cavity.${key}`,
      name,
      unit,
      value: Number(input[key]),
      min,
      max,
      instead,
      above: above === 'above',
    })),
    ...radiusRule(input),
    ...fatigueRules(input),
  ]);
  return single.length > 0 ? single : outOfBounds(relations(input));
}

type Bounds = readonly [unit: string, min: number, max: number, instead: string];

const RADIUS: Bounds = ['mm', 0.1, 1e5, LENGTH_HINT];
const RANGE: Bounds = [
  'MPa',
  0,
  4000,
  'Give the range from least to greatest stress in MPa, not the amplitude.',
];
const CYCLES: Bounds = ['per year', 0, 1e9, 'Count the cycles of one year.'];
const CLASS: Bounds = ['MPa', 20, 250, 'Take a class of the list.'];
const SLOPE: Bounds = ['', 2, 5, 'Take a class of the list.'];
const YEARS: Bounds = ['years', 0, 100, 'Give it in years, at most 100.'];

const rule = (
  path: string,
  name: string,
  value: number,
  [unit, min, max, instead]: Bounds,
): NumberRule => ({ input: `cavity.${path}`, name, unit, value, min, max, instead });

const radiusRule = ({ bottomRadiusMm }: CavityInput): readonly NumberRule[] =>
  bottomRadiusMm === null ? [] : [rule('bottomRadiusMm', 'Bottom radius', bottomRadiusMm, RADIUS)];

function fatigueRules({ fatigue }: CavityInput): readonly NumberRule[] {
  if (fatigue === null) return [];
  const { surface, blocks, years } = fatigue;
  return [
    rule('fatigue.surface.rangeMPa', 'Range of the class', surface.rangeMPa, CLASS),
    rule('fatigue.surface.slope', 'Slope of the class', surface.slope, SLOPE),
    { ...rule('fatigue.years', 'Time', years, YEARS), above: true },
    ...blocks.flatMap(blockRules),
  ];
}

const blockRules = (block: CavityBlock, i: number): readonly NumberRule[] => [
  rule(`fatigue.blocks.${i}.membraneRangeMPa`, 'Membrane range', block.membraneRangeMPa, RANGE),
  rule(`fatigue.blocks.${i}.bendingRangeMPa`, 'Bending range', block.bendingRangeMPa, RANGE),
  rule(`fatigue.blocks.${i}.cyclesPerYear`, 'Cycles', block.cyclesPerYear, CYCLES),
];

const relations = (input: CavityInput): readonly NumberRule[] => [
  {
    input: 'cavity.depthMm',
    name: 'Cavity depth',
    unit: 'mm',
    value: input.depthMm,
    min: 0,
    max: input.thicknessMm / 2,
    instead: 'A cavity deeper than half the wall needs a weld repair or a numerical analysis.',
  },
  {
    input: 'cavity.depthMm',
    name: 'Cavity depth',
    unit: 'mm',
    value: input.depthMm,
    min: 0,
    max: Math.min(input.lengthMm, input.widthMm) / 2,
    instead: 'A groove steeper than a half circle is assessed as a crack, or ground wider first.',
  },
  {
    input: 'cavity.tensileMPa',
    name: 'Tensile strength',
    unit: 'MPa',
    value: input.tensileMPa,
    min: input.yieldMPa,
    max: 3000,
    instead: 'Yield and tensile strength may be swapped.',
  },
];
