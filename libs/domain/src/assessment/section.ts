import type { Crack } from '../geometry/crack';
import { roomToUpperBounds, type Limit, type Room } from '../geometry/limit';
import { OTHER_FACE, type CharacterisedFlaw } from './characterise';
import { crackIn, type FlawCase } from './flaw-case';
import { SectionEvaluator } from './section-evaluator';

/** A flaw in its category, ready to be evaluated at any size. */
export interface Section {
  readonly flaw: FlawCase;
  readonly kind: 'surface' | 'embedded';
  readonly face: 'inside' | 'outside';
  readonly evaluator: SectionEvaluator;
  readonly limits: readonly Limit[];
  /** The crack of this size; an embedded one keeps its centre where it is. */
  readonly crackAt: (a: number, c: number) => Crack;
  /** Room to the line of the diagram at service load. */
  readonly margin: (a: number, c: number) => number;
  readonly validity: (a: number, c: number) => Room;
  /** Ligament to the nearer face of an embedded flaw; the wall ahead of a surface flaw [mm]. */
  readonly ligament: (a: number) => number;
  /** Face an embedded flaw of this half height is nearest to. */
  readonly nearestFace: (a: number) => 'inside' | 'outside';
}

/** Sets a characterised flaw into its case: kind and face decide the solutions, the face the sign of bending. */
export function sectionOf(
  flaw: FlawCase,
  { kind, face, a: startA, ligament: startLigament }: CharacterisedFlaw,
): Section {
  const turned = face === flaw.situation.face ? flaw : turnedOver(flaw);
  const placed: FlawCase = {
    ...turned,
    situation: { ...turned.situation, kind, face },
    facePressure: pressureOnFaces(flaw, kind, face),
  };
  const evaluator = new SectionEvaluator(placed);
  const { stressIntensity, referenceStress } = evaluator.solutions;
  const limits = [...stressIntensity.limits, ...referenceStress.limits];
  const { thickness } = placed.wall;
  const centre = startLigament + startA;
  const toFace = (a: number) => (kind === 'surface' ? 0 : centre - a);
  const crackAt = (a: number, c: number) => crackIn(placed, a, c, Math.max(toFace(a), 0));
  return {
    flaw: placed,
    kind,
    face,
    evaluator,
    limits,
    crackAt,
    margin: (a, c) => {
      evaluator.take(crackAt(a, c));
      return evaluator.margin(1);
    },
    validity: (a, c) => roomToUpperBounds(limits, crackAt(a, c)),
    ligament: (a) =>
      kind === 'surface' ? thickness - a : Math.min(toFace(a), thickness - a - centre),
    nearestFace: (a) => (toFace(a) <= thickness - a - centre ? face : OTHER_FACE[face]),
  };
}

/** The medium reaches an embedded flaw once it breaks through to the bore, and not through the outside. */
function pressureOnFaces(flaw: FlawCase, kind: Section['kind'], face: Section['face']): number {
  const breaksOutside =
    flaw.situation.kind === 'embedded' && kind === 'surface' && face === 'outside';
  return breaksOutside ? 0 : flaw.facePressure;
}

// seen from the other face, what was tension by bending is compression
function turnedOver(flaw: FlawCase): FlawCase {
  const { residual } = flaw;
  return {
    ...flaw,
    primaryBending: -flaw.primaryBending,
    residual:
      residual.state === 'entered'
        ? { ...residual, bendingMPa: { ...residual.bendingMPa, value: -residual.bendingMPa.value } }
        : residual,
  };
}
