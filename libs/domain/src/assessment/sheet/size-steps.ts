import { hasHeight, lengthIsOneSided } from '../../geometry/flaw-kind';
import { PROXIMITY_RULE } from '../../growth/recategorise';
import type { CalculationStep } from '../assessment-outcome';
import type { SheetSubject } from '../calculation-sheet';
import { number } from '../number-text';
import { factorsOf } from '../partial-factors';
import { stepIn } from './step-in';

const ALLOWANCE = 'Sizing allowance of the technique, site rule';
const step = stepIn('Flaw size');

/** From the measured size to the assessed flaw. */
export const sizeSteps = (subject: SheetSubject): CalculationStep[] => [
  ...measuredSteps(subject),
  ...neighbourSteps(subject),
  ...categorySteps(subject),
];

function measuredSteps({ input, flaw }: SheetSubject): CalculationStep[] {
  const { flaw: measured, sizing, wall } = input;
  const { size } = factorsOf(input);
  const oneSided = lengthIsOneSided(measured.kind, wall.shape);
  const formula = size === 1 ? 'measured + allowance' : 'γ (measured + allowance)';
  const inputs = (value: number, allowance: number) => [
    `measured = ${number(value)} mm`,
    `allowance = ${number(allowance)} mm`,
    ...(size === 1 ? [] : [`γ = ${number(size)}`]),
  ];
  const height = step(
    measured.kind === 'embedded' ? '2a' : 'a',
    'Through-wall extent with allowance',
    flaw.sizedHeight,
    'mm',
    {
      formula,
      source: ALLOWANCE,
      inputs: inputs(measured.heightMm.value, sizing.heightAllowanceMm.value),
    },
  );
  const length = step(
    oneSided ? 'c' : '2c',
    oneSided ? 'Length from the edge with allowance' : 'Length with allowance',
    flaw.sizedLength,
    'mm',
    {
      formula,
      source: ALLOWANCE,
      inputs: inputs(measured.lengthMm.value, sizing.lengthAllowanceMm.value),
    },
  );
  return hasHeight(measured.kind) ? [height, length] : [length];
}

/** What the rules of interaction made of the flaw and its neighbours. */
function neighbourSteps({ flaw: { neighbourhood } }: SheetSubject): CalculationStep[] {
  if (!neighbourhood) return [];
  const { rule, steps } = neighbourhood;
  if (steps.length === 0) {
    return [
      step('s', 'Neighbours do not interact', 'apart', '', {
        formula: 'gap above the limit of the rule, or another plane',
        source: rule.source,
        inputs: neighbourhood.others.map(({ name }) => name),
      }),
    ];
  }
  return steps.map(({ flaws, into, gapMm, limitMm, arrangement }) =>
    step('2c', `Combined, ${arrangement}: ${flaws.join(' and ')}`, 2 * into.c, 'mm', {
      formula: 'from end to end and from face to lowest point, as the gap is within the limit',
      source: rule.source,
      inputs: [
        `gap = ${number(gapMm)} mm`,
        `limit = ${number(limitMm)} mm`,
        `${into.kind === 'surface' ? 'a' : '2a'} = ${number(into.kind === 'surface' ? into.a : 2 * into.a)} mm`,
      ],
    }),
  );
}

function categorySteps(subject: SheetSubject): CalculationStep[] {
  const { input, flaw, section } = subject;
  if (flaw.recategorised) {
    return [
      step('a', 'Depth as a surface flaw', flaw.a, 'mm', {
        formula: '2a + p',
        source: PROXIMITY_RULE,
        inputs: [`2a = ${number(flaw.sizedHeight)} mm`],
      }),
    ];
  }
  if (flaw.kind !== 'embedded') return [];
  return [
    step('p', 'Ligament to the nearer face', section.ligament(flaw.a), 'mm', {
      formula: 'measured − half of what the size grew, or t − 2a − that',
      source: ALLOWANCE,
      inputs: [`measured = ${number(input.flaw.ligamentMm?.value ?? 0)} mm`],
    }),
  ];
}
