import { reserveOnLoad } from '../fracture/fad/reserve-on-load';
import { reserveOnToughness } from '../fracture/fad/reserve-on-toughness';
import { toMPaSqrtM } from '../units/convert';
import type { FrontPoint } from './assessment-outcome';
import type { CharacterisedFlaw } from './characterise';
import type { Section } from './section';
import type { DiagramPoint, FrontState } from './section-evaluator';

/** Where the assessed flaw stands on the diagram today, with its reserves. */
export interface Standing extends DiagramPoint {
  readonly reserveOnLoad: number;
  readonly reserveOnToughness: number | null;
  readonly front: readonly FrontPoint[];
  readonly angle: number;
  readonly at: FrontState;
  /** Height of the line at the load ratio. */
  readonly line: number;
}

/** Evaluates the assessed flaw once: diagram point, whole front and reserves. */
export function standing(section: Section, { a, c }: CharacterisedFlaw): Standing {
  const { evaluator, flaw } = section;
  evaluator.take(section.crackAt(a, c));
  const point = evaluator.point(1);
  const states = evaluator.angles.map((_, i) => evaluator.frontAt(i, 1));
  const line = flaw.line.height(point.lr);
  const collapsed = point.lr >= evaluator.lrMax;
  return {
    ...point,
    reserveOnLoad: reserveOnLoad((factor) => evaluator.margin(factor), evaluator.lrMax / point.lr),
    reserveOnToughness: collapsed ? null : leastReserve(states, line, flaw.toughness),
    front: states.map((state, i) => frontPoint(state, evaluator.angles[i] ?? 0)),
    angle: evaluator.angles[point.governing] ?? 0,
    at: evaluator.frontAt(point.governing, 1),
    line,
  };
}

const frontPoint = ({ kPrimary, kSecondary, kr }: FrontState, angleDeg: number): FrontPoint => ({
  angleDeg,
  kPrimaryMPaSqrtM: toMPaSqrtM(kPrimary),
  kSecondaryMPaSqrtM: toMPaSqrtM(kSecondary),
  kr,
});

function leastReserve(
  front: readonly FrontState[],
  line: number,
  toughness: number,
): number | null {
  let least = Infinity;
  for (const { kPrimary, kSecondary, rho } of front) {
    const reserve = reserveOnToughness(kPrimary + kSecondary, rho, line, toughness);
    if (reserve === null) return null;
    least = Math.min(least, reserve);
  }
  return Number.isFinite(least) ? least : null;
}
