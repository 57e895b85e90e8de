import { outOfBounds, refused, type NumberRule, type Refused } from '../../geometry/refusal';
import type { GrowthLaw } from '../growth-law';
import { cyclesThroughStages, growsFrom, sizeThroughStages } from './stage-life';

/** Load and shape that stay the same while the flaw grows: ΔK = Y ΔS √(πa). */
export interface ConstantShape {
  readonly shapeFactor: number;
  readonly stressRangeMPa: number;
}

export type LifeAnswer =
  { readonly status: 'found'; readonly cycles: number } | { readonly status: 'below threshold' };

export type SizeAnswer =
  | { readonly status: 'found'; readonly sizeMm: number }
  /** The cycles are more than the flaw takes to grow without bound. */
  | { readonly status: 'beyond any size' }
  | { readonly status: 'below threshold'; readonly sizeMm: number };

/** Cycles that take a flaw from one size to another. */
export function lifeAtConstantShape(
  law: GrowthLaw,
  shape: ConstantShape,
  { fromMm, toMm }: { readonly fromMm: number; readonly toMm: number },
): LifeAnswer | Refused {
  const broken = outOfBounds([
    ...rulesOf(shape, fromMm),
    {
      ...SIZE,
      input: 'toMm',
      name: 'Last size',
      value: toMm,
      min: fromMm > 0 ? fromMm : 0,
      instead: 'Give a last size that is not below the first.',
    },
  ]);
  if (broken.length > 0) return refused(...broken);
  const drive = shape.shapeFactor * shape.stressRangeMPa;
  if (!growsFrom(law, drive, fromMm)) return { status: 'below threshold' };
  return { status: 'found', cycles: cyclesThroughStages(law, drive, [fromMm, toMm]) };
}

/** Size of a flaw after a number of cycles. */
export function sizeAtConstantShape(
  law: GrowthLaw,
  shape: ConstantShape,
  { fromMm, cycles }: { readonly fromMm: number; readonly cycles: number },
): SizeAnswer | Refused {
  const broken = outOfBounds([
    ...rulesOf(shape, fromMm),
    {
      input: 'cycles',
      name: 'Cycles',
      unit: '',
      value: cycles,
      min: 0,
      max: 1e15,
      instead: 'Give the number of cycles done.',
    },
  ]);
  if (broken.length > 0) return refused(...broken);
  const drive = shape.shapeFactor * shape.stressRangeMPa;
  if (!growsFrom(law, drive, fromMm)) return { status: 'below threshold', sizeMm: fromMm };
  const sizeMm = sizeThroughStages(law, drive, fromMm, cycles);
  return Number.isFinite(sizeMm) ? { status: 'found', sizeMm } : { status: 'beyond any size' };
}

const SIZE = { unit: 'mm', max: 1e5 } as const;

const rulesOf = (
  { shapeFactor, stressRangeMPa }: ConstantShape,
  fromMm: number,
): readonly NumberRule[] => [
  {
    input: 'shapeFactor',
    name: 'Shape factor',
    unit: '',
    value: shapeFactor,
    min: 0,
    max: 100,
    above: true,
    instead: 'Give K over stress times the root of πa, about 1.',
  },
  {
    input: 'stressRangeMPa',
    name: 'Stress range',
    unit: 'MPa',
    value: stressRangeMPa,
    min: 0,
    max: 5000,
    instead: 'Give the range of stress, maximum less minimum, in MPa.',
  },
  {
    ...SIZE,
    input: 'fromMm',
    name: 'First size',
    value: fromMm,
    min: 0,
    above: true,
    instead: 'Give the size at the start in millimetres.',
  },
];
