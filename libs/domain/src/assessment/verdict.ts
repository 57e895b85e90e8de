import type { Verdict } from './assessment-outcome';
import { number } from './number-text';

/** Reserve on load below which an acceptable flaw is called near the limit; common practice. */
export const COMFORTABLE_RESERVE = 1.2;

export interface VerdictSubject {
  readonly reserveOnLoad: number;
  readonly lr: number;
  readonly lrMax: number;
  readonly kr: number;
  readonly heightMm: number;
  readonly limitingHeightMm: number | null;
  /** Sizing allowance on the height. */
  readonly allowanceMm: number;
}

export interface ReasonedVerdict {
  readonly verdict: Verdict;
  readonly reasons: readonly string[];
}

/** The verdict and why, the governing reason first. */
export function judge(subject: VerdictSubject): ReasonedVerdict {
  const { reserveOnLoad, lr, lrMax, kr, heightMm, limitingHeightMm, allowanceMm } = subject;
  const point = `Kr = ${number(kr)} at Lr = ${number(lr)} (Lr,max = ${number(lrMax)})`;
  if (reserveOnLoad < 1) {
    const collapse = lr >= lrMax;
    return {
      verdict: 'not acceptable',
      reasons: [
        collapse
          ? `The load ratio is beyond the cut-off: ${point}.`
          : `The assessed flaw is outside the failure assessment diagram: ${point}.`,
        `Reserve factor on load ${number(reserveOnLoad)}, below 1.`,
      ],
    };
  }
  const spare = limitingHeightMm === null ? 0 : limitingHeightMm - heightMm;
  const reasons = [
    reserveOnLoad < COMFORTABLE_RESERVE
      ? `Reserve factor on load ${number(reserveOnLoad)} is below ${COMFORTABLE_RESERVE} (common practice).`
      : null,
    spare < allowanceMm
      ? `Only ${number(spare)} mm are left to the limiting height, less than the sizing allowance of ${number(allowanceMm)} mm.`
      : null,
  ].filter((text) => text !== null);
  return reasons.length > 0
    ? { verdict: 'near the limit', reasons: [...reasons, `Inside the diagram: ${point}.`] }
    : {
        verdict: 'acceptable',
        reasons: [
          `Inside the diagram: ${point}.`,
          `Reserve factor on load ${number(reserveOnLoad)}.`,
        ],
      };
}
