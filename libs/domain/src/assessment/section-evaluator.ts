import { interaction } from '../fracture/fad/interaction';
import type { ChosenSolutions } from '../fracture/select-solutions';
import {
  combine,
  type FrontShape,
  type HigherInfluence,
  type Influence,
} from '../fracture/stress-intensity/solution';
import {
  highestBetween,
  isCurved,
  kOfTerms,
  linearised,
  linearTerms,
  type StressTerms,
} from '../fracture/stress-intensity/stress-terms';
import type { Crack } from '../geometry/crack';
import type { Degrees, MPa } from '../units/quantity';
import type { FlawCase } from './flaw-case';
import { flawExtent } from './flaw-extent';
import { fixedResidual, isRelaxedByLoad, relaxedResidualAt } from './residual-at';

const ANGLE_STEP = 10;
const ELLIPSE: readonly Degrees[] = Array.from(
  { length: 90 / ANGLE_STEP + 1 },
  (_, i) => (i * ANGLE_STEP) as Degrees,
);

/** Angles of the front that are assessed [°]: from the end of the flaw to the deepest point. */
export const FRONT_ANGLES: Readonly<Record<FrontShape, readonly Degrees[]>> = {
  ellipse: ELLIPSE,
  straight: [90 as Degrees],
  through: [0 as Degrees],
};

/** One point of the diagram: the highest Kr of the front at one factor on the primary load. */
export interface DiagramPoint {
  readonly lr: number;
  readonly kr: number;
  readonly referenceStress: number;
  readonly residualMembrane: number;
  readonly residualBending: number;
  /** Index into the angles of the governing point. */
  readonly governing: number;
}

/** K and ρ of one point of the front [MPa·√mm]. */
export interface FrontState {
  readonly kPrimary: number;
  readonly kSecondary: number;
  readonly rho: number;
  readonly kr: number;
}

/** Influence of every stress term at one place of the front. */
interface Place {
  readonly linear: Influence;
  readonly higher: HigherInfluence;
}

/**
 * Evaluates one crack against the diagram, at any factor on the primary load. `take` a crack first: all
 * else speaks of it until the next one. The front is kept in room of its own, so that growth and root
 * searches allocate next to nothing.
 */
export class SectionEvaluator {
  readonly lrMax: number;
  readonly angles: readonly Degrees[];
  private readonly places: readonly Place[];
  private readonly facePressure: number;
  /** A stress with a curve, and a solution that takes its terms one by one. */
  private readonly termwise: boolean;
  /** A stress with a curve, and a solution that does not. */
  private readonly bounded: boolean;
  private readonly linearCollapse: StressTerms;
  private readonly fixed: StressTerms;
  private primary: StressTerms;
  private residual: StressTerms;
  private reference = 0;

  constructor(
    private readonly flaw: FlawCase,
    readonly solutions: ChosenSolutions,
  ) {
    const { stressIntensity } = solutions;
    this.lrMax = flaw.line.lrMax;
    this.angles = FRONT_ANGLES[stressIntensity.front];
    this.places = this.angles.map(emptyPlace);
    this.facePressure = flaw.situation.kind === 'embedded' ? 0 : flaw.facePressure;
    this.fixed = fixedResidual(flaw);
    this.residual = this.fixed;
    this.primary = flaw.primary;
    this.linearCollapse = linearised(flaw.collapse);
    const curved = isCurved(flaw.primary) || isCurved(this.fixed);
    this.termwise = curved && stressIntensity.higher !== null;
    this.bounded = curved && stressIntensity.higher === null;
  }

  /** Takes up a crack, its whole front and its reference stress. */
  take(crack: Crack): void {
    for (let i = 0; i < this.places.length; i++) this.fill(crack, i);
    if (this.bounded) this.boundStresses(crack);
    // pressure in a fully long crack adds p a/t to the force through the wall (equilibrium)
    const { membrane, bending } = this.linearCollapse;
    const force = membrane + this.facePressure * Math.min(crack.a / crack.thickness, 1);
    this.reference = this.solutions.referenceStress.stress(crack, force as MPa, bending as MPa);
  }

  /** Takes up only the deepest point and the end, all that growth by cycles needs. */
  takeEnds(crack: Crack): void {
    this.fill(crack, 0);
    this.fill(crack, this.places.length - 1);
  }

  /** K of primary and secondary stress together, which stays on: at the deepest point and at the end [MPa·√mm]. */
  sustained(factor: number): { readonly deepest: number; readonly end: number } {
    const [deepest, end] = [this.frontAt(this.places.length - 1, factor), this.frontAt(0, factor)];
    return {
      deepest: deepest.kPrimary + deepest.kSecondary,
      end: end.kPrimary + end.kSecondary,
    };
  }

  /** Point of the diagram at a factor on the primary load. */
  point(factor: number): DiagramPoint {
    let governing = this.places.length - 1;
    let kr = 0;
    for (let i = 0; i < this.places.length; i++) {
      const here = this.frontAt(i, factor).kr;
      if (here < kr) continue;
      kr = here;
      governing = i;
    }
    const referenceStress = factor * this.reference;
    const residual = linearised(this.residualAt(factor));
    return {
      lr: referenceStress / this.flaw.material.yieldMPa,
      kr,
      referenceStress,
      residualMembrane: residual.membrane,
      residualBending: residual.bending,
      governing,
    };
  }

  /** One place of the front at a factor on the primary load. */
  frontAt(index: number, factor: number): FrontState {
    const { flaw } = this;
    const kPrimary = factor * this.k(index, this.primary, this.facePressure);
    const kSecondary = this.k(index, this.residualAt(factor), 0);
    const lr = (factor * this.reference) / flaw.material.yieldMPa;
    const rho = interaction(kPrimary, kSecondary, lr);
    return { kPrimary, kSecondary, rho, kr: (kPrimary + kSecondary) / flaw.toughness + rho };
  }

  /** Room left to the line: above 0 inside, continuous but for the jump of a yield plateau. */
  margin(factor: number): number {
    const { lr, kr } = this.point(factor);
    return Math.min(this.flaw.line.height(lr) - kr, this.lrMax - lr);
  }

  /** K from a range of stress at the deepest point [MPa·√mm]. */
  deepest(membrane: number, bending: number): number {
    return combine(this.at(this.places.length - 1).linear, membrane, bending);
  }

  /** K from a range of stress at the end of the flaw [MPa·√mm]. */
  end(membrane: number, bending: number): number {
    return combine(this.at(0).linear, membrane, bending);
  }

  private residualAt(factor: number): StressTerms {
    return isRelaxedByLoad(this.flaw)
      ? linearTerms(relaxedResidualAt(this.flaw, this.reference, factor), 0)
      : this.residual;
  }

  private k(index: number, terms: StressTerms, pressure: number): number {
    const { linear, higher } = this.at(index);
    return this.termwise
      ? kOfTerms(linear, higher, { ...terms, membrane: terms.membrane + pressure })
      : combine(linear, terms.membrane + pressure, terms.bending);
  }

  // the highest stress over the flaw as if it were uniform: an upper estimate
  private boundStresses(crack: Crack): void {
    const [from, to] = flawExtent(this.flaw.situation.kind, crack);
    this.primary = linearTerms(highestBetween(this.flaw.primary, from, to), 0);
    this.residual = linearTerms(highestBetween(this.fixed, from, to), 0);
  }

  private fill(crack: Crack, index: number): void {
    const angle = this.angles[index] as Degrees;
    const { influence, higher } = this.solutions.stressIntensity;
    const place = this.at(index);
    influence(crack, angle, place.linear);
    if (this.termwise) higher?.(crack, angle, place.higher);
  }

  private at(index: number): Place {
    return this.places[index] as Place;
  }
}

const emptyPlace = (): Place => ({
  linear: { membrane: 0, bending: 0, reversedBending: 0 },
  higher: { quadratic: 0, cubic: 0, quartic: 0 },
});
