import type { CalculationStep } from '../assessment-outcome';

/** How a step was computed. */
export interface StepBasis {
  readonly formula: string;
  readonly source: string;
  readonly inputs?: readonly string[];
}

/** Writes steps under one heading. */
export const stepIn =
  (group: string) =>
  (
    symbol: string,
    name: string,
    value: number | string,
    unit: string,
    { formula, source, inputs = [] }: StepBasis,
  ): CalculationStep => ({ group, symbol, name, value, unit, formula, source, inputs });
