import {
  selectSolutions,
  type FlawSituation,
  type SolutionWish,
} from '../fracture/select-solutions';
import {
  fromOtherFace,
  isCurved,
  profileOf,
  termsOf,
} from '../fracture/stress-intensity/stress-terms';
import type { Crack } from '../geometry/crack';
import { lengthIsOneSided, type FlawKind } from '../geometry/flaw-kind';
import { roomToUpperBounds, type Limit, type Room } from '../geometry/limit';
import type { ResidualStressInput } from './assessment-input';
import { OTHER_FACE, type CharacterisedFlaw } from './characterise';
import { crackIn, type FlawCase } from './flaw-case';
import type { Thinning } from '../growth/with-time/thinning';
import { thinningWall } from './thinning-wall';
import { SectionEvaluator } from './section-evaluator';

/** A flaw in its category, ready to be evaluated at any size. */
export interface Section {
  readonly flaw: FlawCase;
  readonly kind: FlawKind;
  readonly face: 'inside' | 'outside';
  readonly evaluator: SectionEvaluator;
  readonly limits: readonly Limit[];
  /** The crack of this size after so many years; an embedded one keeps its centre where it is. */
  readonly crackAt: (a: number, c: number, years?: number) => Crack;
  /** Factor on every stress of the load as the wall thins; 1 when it does not. */
  readonly rise: (years?: number) => number;
  /** Room to the line of the diagram at service load. */
  readonly margin: (a: number, c: number, years?: number) => number;
  readonly validity: (a: number, c: number, years?: number) => Room;
  /** Ligament to the nearer face of an embedded flaw; the wall ahead of a surface flaw [mm]. */
  readonly ligament: (a: number, years?: number) => number;
  /** Face an embedded flaw of this half height is nearest to. */
  readonly nearestFace: (a: number) => 'inside' | 'outside';
  /** Height and length of the flaw as they are measured [mm]. */
  readonly shown: (
    a: number,
    c: number,
  ) => { readonly heightMm: number; readonly lengthMm: number };
}

/** Where a flaw starts in its wall. */
export type PlacedStart = Pick<CharacterisedFlaw, 'kind' | 'face' | 'a' | 'c' | 'ligament'>;

/** Sets a characterised flaw into its case: kind and face decide the solutions, the face the sign of bending. */
export function sectionOf(
  flaw: FlawCase,
  { kind, face, a: startA, ligament: startLigament }: PlacedStart,
  thinning: Thinning | null = null,
): Section {
  const turned = face === flaw.situation.face ? flaw : turnedOver(flaw);
  const placed: FlawCase = {
    ...turned,
    situation: { ...turned.situation, kind, face },
    facePressure: pressureOnFaces(flaw, kind, face),
  };
  const evaluator = new SectionEvaluator(
    placed,
    selectSolutions(placed.situation, wishOf(placed, flaw)),
  );
  const { stressIntensity, referenceStress } = evaluator.solutions;
  const limits = [...stressIntensity.limits, ...referenceStress.limits];
  const { thickness } = placed.wall;
  const wall = thinningWall(thickness, thinning, isBent(placed));
  // from the face that is measured to: it moves when that face corrodes
  const centre = (years: number) => startLigament + startA - wall.lostAtFace(years);
  const toFace = (a: number, years: number) => (kind === 'embedded' ? centre(years) - a : 0);
  const crackAt = (a: number, c: number, years = 0): Crack => ({
    ...crackIn(placed, a, c, Math.max(toFace(a, years), 0)),
    thickness: wall.thickness(years),
  });
  return {
    flaw: placed,
    kind,
    face,
    evaluator,
    limits,
    crackAt,
    rise: (years = 0) => wall.rise(years),
    margin: (a, c, years = 0) => {
      evaluator.take(crackAt(a, c, years));
      return evaluator.margin(wall.rise(years));
    },
    validity: (a, c, years = 0) => roomToUpperBounds(limits, crackAt(a, c, years)),
    ligament: (a, years = 0) => ligamentAhead(kind, a, centre(years), wall.thickness(years)),
    nearestFace: (a) => (toFace(a, 0) <= thickness - a - centre(0) ? face : OTHER_FACE[face]),
    shown: (a, c) => shownSize(placed.situation, a, c, thickness),
  };
}

/** What was chosen by hand holds for the flaw as given; one that has changed its kind takes what governs. */
const wishOf = (placed: FlawCase, given: FlawCase): SolutionWish =>
  placed.situation.kind === given.situation.kind
    ? given.wish
    : { ...given.wish, stressIntensity: null, referenceStress: null };

const isBent = ({ primary }: FlawCase): boolean => primary.bending !== 0 || isCurved(primary);

/** Wall left ahead of the flaw: to the nearer face when it is embedded, none when it goes through. */
function ligamentAhead(kind: FlawKind, a: number, centre: number, thickness: number): number {
  if (kind === 'through-wall' || kind === 'edge') return 0;
  return kind === 'embedded' ? Math.min(centre - a, thickness - a - centre) : thickness - a;
}

/** Height and length as they are measured, from the symbols of the solutions. */
function shownSize({ kind, shape }: FlawSituation, a: number, c: number, thickness: number) {
  if (kind === 'edge') return { heightMm: thickness, lengthMm: a };
  const lengthMm = lengthIsOneSided(kind, shape) ? c : 2 * c;
  if (kind === 'through-wall') return { heightMm: thickness, lengthMm };
  return { heightMm: kind === 'embedded' ? 2 * a : a, lengthMm };
}

/** The medium reaches an embedded flaw once it breaks through to the bore, and not through the outside. */
function pressureOnFaces(flaw: FlawCase, kind: Section['kind'], face: Section['face']): number {
  const breaksOutside =
    flaw.situation.kind === 'embedded' && kind === 'surface' && face === 'outside';
  return breaksOutside ? 0 : flaw.facePressure;
}

// seen from the other face, what was tension by bending is compression
const turnedOver = (flaw: FlawCase): FlawCase => ({
  ...flaw,
  primary: fromOtherFace(flaw.primary),
  collapse: fromOtherFace(flaw.collapse),
  residual: turnedResidual(flaw.residual),
});

function turnedResidual(residual: ResidualStressInput): ResidualStressInput {
  switch (residual.state) {
    case 'entered':
      return {
        ...residual,
        bendingMPa: { ...residual.bendingMPa, value: -residual.bendingMPa.value },
      };
    case 'profile': {
      const value = profileOf(fromOtherFace(termsOf(residual.profileMPa.value)));
      return { ...residual, profileMPa: { ...residual.profileMPa, value } };
    }
    default:
      return residual;
  }
}
