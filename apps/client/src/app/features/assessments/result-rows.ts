import type { AssessedFlaw } from '@ligament/domain/assessment/assessment-outcome';
import { numberText } from '../../shared/quantity/quantity-text';

export interface ResultRow {
  readonly name: string;
  readonly value: string;
  readonly unit: string;
  readonly remark: string;
}

/** The main results by name, each with its unit. */
export function resultRows(outcome: AssessedFlaw): readonly ResultRow[] {
  const row = (name: string, value: number | null, unit: string, remark = '', digits = 3) => ({
    name,
    value: value === null ? 'none' : numberText(value, digits),
    unit,
    remark,
  });
  return [
    row('Fracture ratio Kr', outcome.kr, '', `at φ = ${outcome.governingAngleDeg}°, governing`),
    row('Load ratio Lr', outcome.lr, '', `cut-off Lr,max = ${numberText(outcome.lrMax, 3)}`),
    row('Reserve on load', outcome.reserveOnLoad, '×', 'factor on primary load to the line'),
    row(
      'Reserve on toughness',
      outcome.reserveOnToughness,
      '×',
      outcome.reserveOnToughness === null
        ? 'collapse alone governs'
        : 'toughness given over toughness needed',
    ),
    row('K, primary', outcome.kPrimaryMPaSqrtM, 'MPa√m', outcome.solution.stressIntensity, 2),
    row('K, secondary', outcome.kSecondaryMPaSqrtM, 'MPa√m', 'residual stress', 2),
    row('Reference stress', outcome.referenceStressMPa, 'MPa', outcome.solution.referenceStress, 1),
    row('Residual membrane', outcome.residualMembraneMPa, 'MPa', 'after relaxation', 1),
    row('Residual bending', outcome.residualBendingMPa, 'MPa', '', 1),
    row('Assessed height', outcome.assessed.heightMm, 'mm', 'measured and allowance', 2),
    row('Assessed c', outcome.assessed.cMm, 'mm', 'measured and allowance', 2),
    row('Ligament', outcome.assessed.ligamentMm, 'mm', 'sound metal left', 2),
    typeof outcome.limitingLengthMm === 'number'
      ? row('Limiting length', outcome.limitingLengthMm, 'mm', outcome.limitingBecause, 2)
      : row('Limiting height', outcome.limitingHeightMm, 'mm', outcome.limitingBecause, 2),
    row('Remaining life', outcome.life.years, 'years', outcome.life.because, 2),
    row('Remaining life', outcome.life.cycles, 'cycles', 'all blocks together', 0),
  ];
}
