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

function radiusRule({ bottomRadiusMm }: CavityInput): readonly NumberRule[] {
  if (bottomRadiusMm === null) return [];
  const named = { input: 'cavity.bottomRadiusMm', name: 'Bottom radius', unit: 'mm' };
  return [{ ...named, value: bottomRadiusMm, min: 0.1, max: 1e5, instead: LENGTH_HINT }];
}

function fatigueRules({ fatigue }: CavityInput): readonly NumberRule[] {
  if (fatigue === null) return [];
  const { surface, blocks, years } = fatigue;
  const at = (path: string, name: string, unit: string, value: number) => ({
    input: `cavity.fatigue.${path}`,
    name,
    unit,
    value,
  });
  const block = ({ membraneRangeMPa, bendingRangeMPa, cyclesPerYear }: CavityBlock, i: number) => [
    {
      ...at(`blocks.${i}.membraneRangeMPa`, 'Membrane range', 'MPa', membraneRangeMPa),
      ...RANGE,
    },
    { ...at(`blocks.${i}.bendingRangeMPa`, 'Bending range', 'MPa', bendingRangeMPa), ...RANGE },
    {
      ...at(`blocks.${i}.cyclesPerYear`, 'Cycles', 'per year', cyclesPerYear),
      ...{ min: 0, max: 1e9, instead: 'Count the cycles of one year.' },
    },
  ];
  return [
    {
      ...at('surface.rangeMPa', 'Range of the class', 'MPa', surface.rangeMPa),
      ...{ min: 20, max: 250, instead: 'Take a class of the list.' },
    },
    {
      ...at('surface.slope', 'Slope of the class', '', surface.slope),
      ...{ min: 2, max: 5, instead: 'Take a class of the list.' },
    },
    {
      ...at('years', 'Time', 'years', years),
      ...{ min: 0, max: 100, above: true, instead: 'Give it in years, at most 100.' },
    },
    ...blocks.flatMap(block),
  ];
}

const RANGE = {
  min: 0,
  max: 4000,
  instead: 'Give the range from least to greatest stress in MPa, not the amplitude.',
} as const;

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
