import { linePoints } from '../fracture/fad/diagram-line';
import { toMPaSqrtM } from '../units/convert';
import type { AssessedFlaw } from './assessment-outcome';
import type { CharacterisedFlaw } from './characterise';
import type { Section } from './section';
import type { Standing } from './standing';

type StandingPart = Pick<
  AssessedFlaw,
  | 'assessed'
  | 'solution'
  | 'residualMembraneMPa'
  | 'residualBendingMPa'
  | 'referenceStressMPa'
  | 'front'
  | 'governingAngleDeg'
  | 'kPrimaryMPaSqrtM'
  | 'kSecondaryMPaSqrtM'
  | 'kr'
  | 'lr'
  | 'lrMax'
  | 'line'
  | 'diagram'
  | 'reserveOnLoad'
  | 'reserveOnToughness'
>;

/** The part of the outcome that speaks of today, in the units shown to people. */
export function describeStanding(
  section: Section,
  flaw: CharacterisedFlaw,
  point: Standing,
): StandingPart {
  const { solutions, lrMax } = section.evaluator;
  return {
    assessed: {
      heightMm: flaw.height,
      aMm: flaw.a,
      cMm: flaw.c,
      ligamentMm: section.ligament(flaw.a),
    },
    solution: {
      stressIntensity: solutions.stressIntensity.title,
      referenceStress: solutions.referenceStress.title,
    },
    residualMembraneMPa: point.residualMembrane,
    residualBendingMPa: point.residualBending,
    referenceStressMPa: point.referenceStress,
    front: point.front,
    governingAngleDeg: point.angle,
    kPrimaryMPaSqrtM: toMPaSqrtM(point.at.kPrimary),
    kSecondaryMPaSqrtM: toMPaSqrtM(point.at.kSecondary),
    kr: point.kr,
    lr: point.lr,
    lrMax,
    line: linePoints(section.flaw.line),
    diagram: section.flaw.line.title,
    reserveOnLoad: point.reserveOnLoad,
    reserveOnToughness: point.reserveOnToughness,
  };
}
