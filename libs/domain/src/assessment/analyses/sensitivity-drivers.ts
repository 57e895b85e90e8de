import { hasHeight, hasLength } from '../../geometry/flaw-kind';
import type { Given } from '../../units/provenance';
import type { AssessmentInput } from '../assessment-input';

/** One input that is moved, between which values, and how it is put into the case. */
export interface Driver {
  readonly name: string;
  readonly unit: string;
  readonly change: string;
  readonly value: number;
  readonly low: number;
  readonly high: number;
  readonly set: (input: AssessmentInput, value: number) => AssessmentInput;
}

/** Plausible changes where no spread is given; common practice. */
const SHARE = {
  toughness: 0.2,
  stress: 0.1,
  strength: 0.1,
  cycles: 0.25,
  rate: 0.5,
  residual: 0.2,
} as const;
/** Two standard deviations of a growth law in steel, as a factor on its coefficient; common practice. */
const LAW_FACTOR = 2;

/** The inputs of the case that are worth moving; what it does not have is left out. */
export const drivers = (input: AssessmentInput): readonly Driver[] => [
  ...sizes(input),
  ...stresses(input),
  ...properties(input),
  ...growth(input),
];

const byShare = (
  name: string,
  unit: string,
  value: number,
  share: number,
  set: Driver['set'],
): Driver => ({
  name,
  unit,
  change: `± ${share * 100} %`,
  value,
  low: value * (1 - share),
  high: value * (1 + share),
  set,
});

const withValue = (given: Given, value: number): Given => ({ ...given, value });

function sizes({ flaw, sizing, wall }: AssessmentInput): Driver[] {
  const by = (name: string, key: 'heightMm' | 'lengthMm', allowance: number): Driver[] => {
    const { value } = flaw[key];
    if (!(allowance > 0)) return [];
    return [
      {
        name,
        unit: 'mm',
        change: `± the sizing allowance, ${allowance} mm`,
        value,
        low: Math.max(value - allowance, value / 10),
        high: value + allowance,
        set: (input, size) => ({
          ...input,
          flaw: { ...input.flaw, [key]: withValue(input.flaw[key], size) },
        }),
      },
    ];
  };
  return [
    ...(hasHeight(flaw.kind) ? by('Flaw height', 'heightMm', sizing.heightAllowanceMm.value) : []),
    ...(hasLength(flaw.kind) ? by('Flaw length', 'lengthMm', sizing.lengthAllowanceMm.value) : []),
    byShare('Wall thickness', 'mm', wall.thicknessMm.value, 0.05, (input, value) => ({
      ...input,
      wall: { ...input.wall, thicknessMm: withValue(input.wall.thicknessMm, value) },
    })),
  ];
}

function stresses({ stress }: AssessmentInput): Driver[] {
  const { residual } = stress;
  const primary = stress.primaryProfileMPa
    ? []
    : (['primaryMembraneMPa', 'primaryBendingMPa'] as const)
        .filter((key) => stress[key].value !== 0)
        .map((key) =>
          byShare(
            key === 'primaryMembraneMPa' ? 'Primary membrane stress' : 'Primary bending stress',
            'MPa',
            stress[key].value,
            SHARE.stress,
            (input, value) => ({
              ...input,
              stress: { ...input.stress, [key]: withValue(input.stress[key], value) },
            }),
          ),
        );
  const entered =
    residual.state === 'entered' && residual.membraneMPa.value !== 0
      ? [
          byShare(
            'Residual membrane stress',
            'MPa',
            residual.membraneMPa.value,
            SHARE.residual,
            (input, value) => ({
              ...input,
              stress: {
                ...input.stress,
                residual: { ...residual, membraneMPa: withValue(residual.membraneMPa, value) },
              },
            }),
          ),
        ]
      : [];
  return [...primary, ...entered];
}

function properties({ material }: AssessmentInput): Driver[] {
  return [
    byShare(
      'Fracture toughness',
      'MPa·√m',
      material.toughnessMPaSqrtM.value,
      SHARE.toughness,
      (input, value) => ({
        ...input,
        material: {
          ...input.material,
          toughnessMPaSqrtM: withValue(input.material.toughnessMPaSqrtM, value),
        },
      }),
    ),
    byShare('Yield strength', 'MPa', material.yieldMPa.value, SHARE.strength, (input, value) => ({
      ...input,
      material: {
        ...input.material,
        yieldMPa: withValue(input.material.yieldMPa, value),
        // strength moves as a whole: the tensile strength is never left below the yield strength
        tensileMPa: withValue(
          input.material.tensileMPa,
          (input.material.tensileMPa.value * value) / input.material.yieldMPa.value,
        ),
      },
    })),
  ];
}

function growth({ growth: { fatigue, stressCorrosion } }: AssessmentInput): Driver[] {
  const found: Driver[] = [];
  if (fatigue && fatigue.blocks.length > 0) {
    const perYear = fatigue.blocks.reduce((sum, { cyclesPerYear }) => sum + cyclesPerYear, 0);
    found.push(
      {
        name: 'Growth law coefficient',
        unit: '×',
        change: `÷ and × ${LAW_FACTOR}`,
        value: 1,
        low: 1 / LAW_FACTOR,
        high: LAW_FACTOR,
        set: (input, factor) =>
          withFatigue(input, (part) => ({ ...part, law: steeper(part.law, factor) })),
      },
      byShare('Cycles per year', '', perYear, SHARE.cycles, (input, value) =>
        withFatigue(input, (part) => ({
          ...part,
          blocks: part.blocks.map((block) => ({
            ...block,
            cyclesPerYear: (block.cyclesPerYear * value) / perYear,
          })),
        })),
      ),
    );
  }
  if (stressCorrosion && stressCorrosion.depthRateMmPerYear.value > 0) {
    const { depthRateMmPerYear } = stressCorrosion;
    found.push(
      byShare(
        'Stress corrosion rate',
        'mm/year',
        depthRateMmPerYear.value,
        SHARE.rate,
        (input, value) => ({
          ...input,
          growth: {
            ...input.growth,
            stressCorrosion: {
              ...stressCorrosion,
              depthRateMmPerYear: withValue(depthRateMmPerYear, value),
            },
          },
        }),
      ),
    );
  }
  return found;
}

type Fatigue = NonNullable<AssessmentInput['growth']['fatigue']>;

function withFatigue(input: AssessmentInput, change: (part: Fatigue) => Fatigue): AssessmentInput {
  const { fatigue } = input.growth;
  return fatigue ? { ...input, growth: { ...input.growth, fatigue: change(fatigue) } } : input;
}

const steeper = (law: Fatigue['law'], factor: number): Fatigue['law'] => ({
  ...law,
  stages: law.stages.map((stage) => ({ ...stage, coefficient: stage.coefficient * factor })),
});
