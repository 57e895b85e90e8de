import { outOfBounds, type Refusal } from '../../geometry/refusal';

/** One sizing of a flaw. */
export interface SizedFinding {
  /** Time of the inspection [years], from any common day. */
  readonly years: number;
  readonly sizeMm: number;
  /** Standard deviation of the sizing error [mm]. */
  readonly sizingSdMm: number;
}

/** What forbids a comparison: impossible numbers, or findings that are not in the order of time. */
export function refusalsOfFindings(
  findings: readonly SizedFinding[],
  least: number,
): readonly Refusal[] {
  const numbers = outOfBounds(
    findings.flatMap(({ years, sizeMm, sizingSdMm }, i) => [
      {
        input: `findings.${i}.years`,
        name: 'Time of the inspection',
        unit: 'years',
        value: years,
        min: -200,
        max: 3000,
        instead: 'Give the time in years.',
      },
      {
        input: `findings.${i}.sizeMm`,
        name: 'Size',
        unit: 'mm',
        value: sizeMm,
        min: 0,
        max: 1e5,
        above: true,
        instead: 'Give it in millimetres.',
      },
      {
        input: `findings.${i}.sizingSdMm`,
        name: 'Sizing error',
        unit: 'mm',
        value: sizingSdMm,
        min: 0,
        max: 1000,
        above: true,
        instead: 'No technique sizes without error: give its standard deviation in millimetres.',
      },
    ]),
  );
  if (findings.length < least) return [...numbers, tooFew(findings.length, least)];
  return numbers.length > 0 ? numbers : outOfOrder(findings);
}

const outOfOrder = (findings: readonly SizedFinding[]): readonly Refusal[] =>
  findings.flatMap(({ years }, i) => {
    const before = findings[i - 1];
    return before && !(years > before.years) ? [notLater(i, years, before.years)] : [];
  });

const notLater = (i: number, years: number, before: number): Refusal => ({
  input: `findings.${i}.years`,
  limit: `later than ${before} years`,
  value: years,
  message: `The finding at ${years} years is not later than the one before it, at ${before} years.`,
  instead: 'Put the findings in the order of time, one for each inspection.',
});

const tooFew = (got: number, least: number): Refusal => ({
  input: 'findings',
  limit: `at least ${least} findings`,
  value: got,
  message: `${got} findings cannot show growth; ${least} are needed.`,
  instead: 'Compare once there is a further sizing of the same flaw.',
});
