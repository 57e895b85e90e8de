import type { Figure } from '../figure-strip/figure-strip';
import { numberText } from '../quantity/quantity-text';
import type { AssessedCase } from './assessed-case';
import { assessedSize } from './size-words';
import { lifeAtMeasuredSize, lifeWords } from './life-words';

/** The five figures that a reader wants first, each with its unit and what it is uncertain by. */
export function figuresOf(each: AssessedCase): Figure[] {
  const { outcome } = each;
  const tone =
    outcome.verdict === 'not acceptable'
      ? ('bad' as const)
      : outcome.verdict === 'near the limit'
        ? ('warn' as const)
        : undefined;
  return [
    ...sizeFigures(each),
    {
      label: 'Load to reach the limit',
      value: outcome.reserveOnLoad.toFixed(2),
      unit: '× load',
      note: 'must stay above 1',
      ...(tone ? { tone } : {}),
    },
    limitFigure(each),
    lifeFigure(each),
  ];
}

/** Height and length as measured; the wall in place of a height that goes through it. */
function sizeFigures(each: AssessedCase): Figure[] {
  const { input, sizingError } = each;
  const { flaw, wall } = input;
  const size = assessedSize(each);
  const height: Figure = size.byHeight
    ? {
        label: `${size.heightWord === 'depth' ? 'Depth' : 'Height'} ${size.heightSymbol}, last measured`,
        value: numberText(flaw.heightMm.value),
        ...error(sizingError?.heightMm),
        unit: 'mm',
        note: `assessed at ${numberText(size.heightMm)} mm`,
      }
    : {
        label: 'Through the wall',
        value: numberText(wall.thicknessMm.value),
        unit: 'mm',
        note: flaw.kind,
      };
  const length: Figure = {
    label: `Length ${size.lengthSymbol}`,
    value: numberText(flaw.lengthMm.value),
    ...error(sizingError?.lengthMm),
    unit: 'mm',
    note: `assessed at ${numberText(size.lengthMm)} mm`,
  };
  return [height, length];
}

/** Limiting height at the present length, or the limiting length. */
function limitFigure(each: AssessedCase): Figure {
  const { outcome } = each;
  const size = assessedSize(each);
  const limit = size.byHeight ? outcome.limitingHeightMm : (outcome.limitingLengthMm ?? null);
  const here = `at ${size.lengthSymbol} = ${numberText(size.lengthMm)} mm`;
  return {
    label: `Limiting ${size.byHeight ? size.heightWord : 'length'}`,
    value: limit === null ? 'none' : numberText(limit),
    unit: limit === null ? '' : 'mm',
    note: limit === null ? 'inside the method’s range' : size.byHeight ? here : 'through the wall',
  };
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
