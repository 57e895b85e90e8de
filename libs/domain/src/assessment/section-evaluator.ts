import { selectSolutions, type ChosenSolutions } from '../fracture/select-solutions';
import { interaction } from '../fracture/fad/interaction';
import { lrMax, optionOne } from '../fracture/fad/option-one';
import { combine, type Influence } from '../fracture/stress-intensity/solution';
import type { Crack } from '../geometry/crack';
import type { Degrees, MPa } from '../units/quantity';
import type { FlawCase } from './flaw-case';
import { fixedResidual, residualMembraneAt } from './residual-at';

const ANGLE_STEP = 10;
/** Angles of the front that are assessed [°]: from the end of the flaw to the deepest point. */
export const FRONT_ANGLES: readonly Degrees[] = Array.from(
  { length: 90 / ANGLE_STEP + 1 },
  (_, i) => (i * ANGLE_STEP) as Degrees,
);
const END = 0;
const DEEPEST = FRONT_ANGLES.length - 1;

/** One point of the diagram: the highest Kr of the front at one factor on the primary load. */
export interface DiagramPoint {
  readonly lr: number;
  readonly kr: number;
  readonly referenceStress: number;
  readonly residualMembrane: number;
  readonly residualBending: number;
  /** Index into FRONT_ANGLES of the governing point. */
  readonly governing: number;
}

/** K and ρ of one point of the front [MPa·√mm]. */
export interface FrontState {
  readonly kPrimary: number;
  readonly kSecondary: number;
  readonly rho: number;
  readonly kr: number;
}

/**
 * Evaluates one crack against the diagram, at any factor on the primary load. `take` a crack first: all
 * else speaks of it until the next one. The front is kept in room of its own, so that growth and root
 * searches allocate next to nothing.
 */
export class SectionEvaluator {
  readonly solutions: ChosenSolutions;
  readonly lrMax: number;
  private readonly front: readonly Influence[];
  private readonly facePressure: number;
  private reference = 0;

  constructor(private readonly flaw: FlawCase) {
    this.solutions = selectSolutions(flaw.situation);
    this.lrMax = lrMax(flaw.material);
    this.front = FRONT_ANGLES.map(() => ({ membrane: 0, bending: 0, reversedBending: 0 }));
    this.facePressure = flaw.situation.kind === 'surface' ? flaw.facePressure : 0;
  }

  /** Takes up a crack, its whole front and its reference stress. */
  take(crack: Crack): void {
    for (let i = 0; i <= DEEPEST; i++) this.fill(crack, i);
    // pressure in a fully long crack adds p a/t to the force through the wall (equilibrium)
    const membrane = this.flaw.primaryMembrane + (this.facePressure * crack.a) / crack.thickness;
    const { stress } = this.solutions.referenceStress;
    this.reference = stress(crack, membrane as MPa, this.flaw.primaryBending as MPa);
  }

  /** Takes up only the deepest point and the end, all that growth needs. */
  takeEnds(crack: Crack): void {
    this.fill(crack, END);
    this.fill(crack, DEEPEST);
  }

  /** Point of the diagram at a factor on the primary load. */
  point(factor: number): DiagramPoint {
    const { flaw } = this;
    let governing = DEEPEST;
    let kr = 0;
    for (let i = 0; i <= DEEPEST; i++) {
      const here = this.frontAt(i, factor).kr;
      if (here < kr) continue;
      kr = here;
      governing = i;
    }
    const referenceStress = factor * this.reference;
    return {
      lr: referenceStress / flaw.material.yieldMPa,
      kr,
      referenceStress,
      residualMembrane: residualMembraneAt(flaw, this.reference, factor),
      residualBending: fixedResidual(flaw).bending,
      governing,
    };
  }

  /** One place of the front at a factor on the primary load. */
  frontAt(index: number, factor: number): FrontState {
    const { flaw } = this;
    const influence = this.at(index);
    const membrane = flaw.primaryMembrane + this.facePressure;
    const kPrimary = factor * combine(influence, membrane, flaw.primaryBending);
    const residual = residualMembraneAt(flaw, this.reference, factor);
    const kSecondary = combine(influence, residual, fixedResidual(flaw).bending);
    const lr = (factor * this.reference) / flaw.material.yieldMPa;
    const rho = interaction(kPrimary, kSecondary, lr);
    return { kPrimary, kSecondary, rho, kr: (kPrimary + kSecondary) / flaw.toughness + rho };
  }

  /** Room left to the line: above 0 inside, continuous but for the jump of a yield plateau. */
  margin(factor: number): number {
    const { lr, kr } = this.point(factor);
    return Math.min(optionOne(lr, this.flaw.material) - kr, this.lrMax - lr);
  }

  /** K from a range of stress at the deepest point [MPa·√mm]. */
  deepest(membrane: number, bending: number): number {
    return combine(this.at(DEEPEST), membrane, bending);
  }

  /** K from a range of stress at the end of the flaw [MPa·√mm]. */
  end(membrane: number, bending: number): number {
    return combine(this.at(END), membrane, bending);
  }

  private fill(crack: Crack, index: number): void {
    const angle = FRONT_ANGLES[index] as Degrees;
    this.solutions.stressIntensity.influence(crack, angle, this.at(index));
  }

  private at(index: number): Influence {
    return this.front[index] as Influence;
  }
}
