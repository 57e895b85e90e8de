import type { Figure } from '../figure-strip/figure-strip';
import { numberText } from '../quantity/quantity-text';
import type { AssessedCase } from './assessed-case';
import { lifeAtMeasuredSize, lifeWords } from './life-words';

/** The five figures that a reader wants first, each with its unit and what it is uncertain by. */
export function figuresOf(each: AssessedCase): Figure[] {
  const { input, outcome, sizingError } = each;
  const { flaw } = input;
  const surface = flaw.kind === 'surface';
  const tone =
    outcome.verdict === 'not acceptable'
      ? ('bad' as const)
      : outcome.verdict === 'near the limit'
        ? ('warn' as const)
        : undefined;
  return [
    {
      label: surface ? 'Depth a, last measured' : 'Height 2a, last measured',
      value: numberText(flaw.heightMm.value),
      ...error(sizingError?.heightMm),
      unit: 'mm',
      note: `assessed at ${numberText(surface ? outcome.assessed.aMm : 2 * outcome.assessed.aMm)} mm`,
    },
    {
      label: 'Length 2c',
      value: numberText(flaw.lengthMm.value),
      ...error(sizingError?.lengthMm),
      unit: 'mm',
      note: `assessed at ${numberText(2 * outcome.assessed.cMm)} mm`,
    },
    {
      label: 'Load to reach the limit',
      value: outcome.reserveOnLoad.toFixed(2),
      unit: '× load',
      note: 'must stay above 1',
      ...(tone ? { tone } : {}),
    },
    {
      label: surface ? 'Limiting depth' : 'Limiting height',
      value: outcome.limitingHeightMm === null ? 'none' : numberText(outcome.limitingHeightMm),
      unit: outcome.limitingHeightMm === null ? '' : 'mm',
      note:
        outcome.limitingHeightMm === null
          ? 'inside the method’s range'
          : `at 2c = ${numberText(2 * outcome.assessed.cMm)} mm`,
    },
    lifeFigure(each),
  ];
}

const error = (mm: number | undefined) =>
  mm === undefined ? {} : { beside: `± ${numberText(mm)}` };

function lifeFigure({ input, outcome }: AssessedCase): Figure {
  const assessed = lifeWords(outcome.life);
  const measured = outcome.life.end === 'limit reached' ? lifeAtMeasuredSize(input) : null;
  return {
    label: 'Remaining life',
    value: assessed.value,
    unit: assessed.unit,
    note: measured
      ? `${lifeWords(measured).value} at the size measured`
      : 'from the inspection, upper growth law',
    ...(outcome.life.years === null ? { tone: 'bad' as const, note: 'not acceptable now' } : {}),
  };
}
