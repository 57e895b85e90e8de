import { growthLawBody, type GrowthLawView } from '@ligament/domain/contract/growth-laws';
import { number, type RecordField, text } from '../../shared/record-form/record-field';
import type { Checks, RecordValue } from '../../shared/record-form/record-group';

const stage = growthLawBody.shape.stages.element.shape;

const PIECES: readonly RecordField[] = [
  number('coefficient1', 'A of the first piece, mm/cycle with ΔK in MPa√mm'),
  number('exponent1', 'm of the first piece, which holds below the meeting point'),
  number('coefficient2', 'A of the second piece, which holds above it (empty: one piece only)'),
  number('exponent2', 'm of the second piece, smaller than the first'),
  number('thresholdMpaSqrtMm', 'Threshold, MPa√mm'),
];

const WORDS: readonly RecordField[] = [
  text('title', 'Title'),
  text('environment', 'Steel and environment'),
  { ...text('source', 'Source: standard, edition, table'), wide: true },
];

/** Fields of a law's form; its key is given once and stays. */
export const lawFields = (isNew: boolean): readonly RecordField[] => [
  ...(isNew ? [text('key', 'Key: lower-case letters, digits, hyphens')] : []),
  ...WORDS,
  ...PIECES,
];

export const LAW_CHECKS: Checks = {
  ...growthLawBody.shape,
  coefficient1: stage.coefficient,
  exponent1: stage.exponent,
  coefficient2: stage.coefficient.nullable(),
  exponent2: stage.exponent.nullable(),
};

/** A law as its form holds it: each piece in fields of its own. */
export function formValueOf(law: GrowthLawView): RecordValue {
  const [first, second] = law.stages;
  return {
    ...law,
    coefficient1: first?.coefficient ?? null,
    exponent1: first?.exponent ?? null,
    coefficient2: second?.coefficient ?? null,
    exponent2: second?.exponent ?? null,
  };
}

/** The pieces of a form's value put together as the contract wants them. */
export function lawBodyOf(value: RecordValue): RecordValue {
  const { coefficient1, exponent1, coefficient2, exponent2, ...rest } = value;
  const second =
    coefficient2 === null && exponent2 === null
      ? []
      : [{ coefficient: coefficient2, exponent: exponent2 }];
  return { ...rest, stages: [{ coefficient: coefficient1, exponent: exponent1 }, ...second] };
}
