import { PROXIMITY_RULE } from '../../growth/recategorise';
import type { CalculationStep } from '../assessment-outcome';
import type { SheetSubject } from '../calculation-sheet';
import { number } from '../number-text';
import { stepIn } from './step-in';

const ALLOWANCE = 'Sizing allowance of the technique, site rule';
const step = stepIn('Flaw size');

/** From the measured size to the assessed flaw. */
export const sizeSteps = (subject: SheetSubject): CalculationStep[] => [
  ...measuredSteps(subject),
  ...categorySteps(subject),
];

const heightWithAllowance = ({ input: { flaw, sizing } }: SheetSubject) =>
  flaw.heightMm.value + sizing.heightAllowanceMm.value;

function measuredSteps(subject: SheetSubject): CalculationStep[] {
  const { flaw: measured, sizing } = subject.input;
  const symbol = measured.kind === 'embedded' ? '2a' : 'a';
  const height = heightWithAllowance(subject);
  return [
    step(symbol, 'Through-wall extent with allowance', height, 'mm', {
      formula: 'measured + allowance',
      source: ALLOWANCE,
      inputs: [
        `measured = ${number(measured.heightMm.value)} mm`,
        `allowance = ${number(sizing.heightAllowanceMm.value)} mm`,
      ],
    }),
    step('c', 'Half length with allowance', subject.flaw.c, 'mm', {
      formula: '(measured + allowance)/2',
      source: ALLOWANCE,
      inputs: [
        `measured 2c = ${number(measured.lengthMm.value)} mm`,
        `allowance = ${number(sizing.lengthAllowanceMm.value)} mm`,
      ],
    }),
  ];
}

function categorySteps(subject: SheetSubject): CalculationStep[] {
  const { input, flaw, section } = subject;
  if (flaw.recategorised) {
    return [
      step('a', 'Depth as a surface flaw', flaw.a, 'mm', {
        formula: '2a + p',
        source: PROXIMITY_RULE,
        inputs: [`2a = ${number(heightWithAllowance(subject))} mm`],
      }),
    ];
  }
  if (flaw.kind === 'surface') return [];
  return [
    step('p', 'Ligament to the nearer face', section.ligament(flaw.a), 'mm', {
      formula: 'measured − allowance/2, or t − 2a − that',
      source: ALLOWANCE,
      inputs: [`measured = ${number(input.flaw.ligamentMm?.value ?? 0)} mm`],
    }),
  ];
}
