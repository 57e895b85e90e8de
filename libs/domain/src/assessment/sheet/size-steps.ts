import { PROXIMITY_RULE } from '../../growth/recategorise';
import type { CalculationStep } from '../assessment-outcome';
import type { SheetSubject } from '../calculation-sheet';
import { number } from '../number-text';

const GROUP = 'Flaw size';
const ALLOWANCE = 'Sizing allowance of the technique, site rule';

/** From the measured size to the assessed flaw. */
export function sizeSteps({ input, flaw, section }: SheetSubject): CalculationStep[] {
  const { flaw: measured, sizing } = input;
  const embedded = measured.kind === 'embedded';
  const step = (
    symbol: string,
    name: string,
    value: number,
    formula: string,
    inputs: readonly string[],
    source = ALLOWANCE,
  ): CalculationStep => ({
    group: GROUP,
    symbol,
    name,
    value,
    unit: 'mm',
    formula,
    source,
    inputs,
  });
  const height = measured.heightMm.value + sizing.heightAllowanceMm.value;
  const steps = [
    step(
      embedded ? '2a' : 'a',
      'Through-wall extent with allowance',
      height,
      'measured + allowance',
      [
        `measured = ${number(measured.heightMm.value)} mm`,
        `allowance = ${number(sizing.heightAllowanceMm.value)} mm`,
      ],
    ),
    step('c', 'Half length with allowance', flaw.c, '(measured + allowance)/2', [
      `measured 2c = ${number(measured.lengthMm.value)} mm`,
      `allowance = ${number(sizing.lengthAllowanceMm.value)} mm`,
    ]),
  ];
  if (embedded && !flaw.recategorised) {
    steps.push(
      step(
        'p',
        'Ligament to the nearer face',
        section.ligament(flaw.a),
        'measured − allowance/2, or t − 2a − that',
        [`measured = ${number(measured.ligamentMm?.value ?? 0)} mm`],
      ),
    );
  }
  if (flaw.recategorised) {
    steps.push(
      step(
        'a',
        'Depth as a surface flaw',
        flaw.a,
        '2a + p',
        [`2a = ${number(height)} mm`],
        PROXIMITY_RULE,
      ),
    );
  }
  return steps;
}
