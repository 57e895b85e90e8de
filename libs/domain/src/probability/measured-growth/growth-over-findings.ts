import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import { upperGammaShare } from '../../numerics/incomplete-gamma';
import { LEVEL, levelRule } from './growth-between';
import { judgeRate, type JudgedRate } from './judge-growth';
import { refusalsOfFindings, type SizedFinding } from './sized-finding';

/** Growth over three or more findings: a straight line weighted by the sizing errors. */
export interface GrowthOverFindings extends JudgedRate {
  readonly status: 'measured';
  /** Size the line gives at the last finding [mm]. */
  readonly sizeNowMm: number;
  readonly sizeNowSdMm: number;
  /** Chance of scatter like this about one constant size; small when the size did change. */
  readonly chanceOfConstantSize: number;
  /** Chance of scatter like this about the line; small when growth is not steady or the errors are understated. */
  readonly chanceOfStraightLine: number;
  readonly caution: string | null;
}

const UNLIKELY = 0.05;
const NOT_STRAIGHT =
  'The findings scatter about the line more than their sizing errors allow: growth is not steady, or the errors are understated.';

/** Weighted straight line through the findings in the order of time. */
export function growthOverFindings(
  findings: readonly SizedFinding[],
  level: number = LEVEL,
): GrowthOverFindings | Refused {
  const refusals = [...refusalsOfFindings(findings, 3), ...outOfBounds([levelRule(level)])];
  if (refusals.length > 0) return refused(...refusals);
  const weight = ({ sizingSdMm }: SizedFinding) => 1 / (sizingSdMm * sizingSdMm);
  const total = (value: (finding: SizedFinding) => number) =>
    findings.reduce((sum, finding) => sum + weight(finding) * value(finding), 0);
  const all = total(() => 1);
  const meanYears = total(({ years }) => years) / all;
  const meanSize = total(({ sizeMm }) => sizeMm) / all;
  const spread = total(({ years }) => (years - meanYears) ** 2);
  const rate = total(({ years, sizeMm }) => (years - meanYears) * (sizeMm - meanSize)) / spread;
  const line = (years: number) => meanSize + rate * (years - meanYears);
  const aboutMean = total(({ sizeMm }) => (sizeMm - meanSize) ** 2);
  const aboutLine = total(({ years, sizeMm }) => (sizeMm - line(years)) ** 2);
  const chanceOfStraightLine = chanceAbove(aboutLine, findings.length - 2);
  const last = findings[findings.length - 1]?.years ?? meanYears;
  return {
    status: 'measured',
    ...judgeRate(rate, 1 / Math.sqrt(spread), level),
    sizeNowMm: line(last),
    sizeNowSdMm: Math.sqrt(1 / all + (last - meanYears) ** 2 / spread),
    chanceOfConstantSize: chanceAbove(aboutMean, findings.length - 1),
    chanceOfStraightLine,
    caution: chanceOfStraightLine < UNLIKELY ? NOT_STRAIGHT : null,
  };
}

const chanceAbove = (chiSquare: number, degrees: number) =>
  upperGammaShare(degrees / 2, chiSquare / 2);
