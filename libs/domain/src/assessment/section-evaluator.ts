import { selectSolutions, type ChosenSolutions } from '../fracture/select-solutions';
import { interaction } from '../fracture/fad/interaction';
import { lrMax, optionOne } from '../fracture/fad/option-one';
import { heatTreatedResidual, relaxedResidual } from '../fracture/fad/residual-stress';
import { combine, type Influence } from '../fracture/stress-intensity/solution';
import type { Crack } from '../geometry/crack';
import type { Degrees, MPa } from '../units/quantity';
import type { FlawCase } from './flaw-case';

const ANGLE_STEP = 10;
/** Angles of the front that are assessed [°]; the last is the deepest point. */
export const FRONT_ANGLES: readonly Degrees[] = Array.from(
  { length: 90 / ANGLE_STEP + 1 },
  (_, i) => (i * ANGLE_STEP) as Degrees,
);
const LAST = FRONT_ANGLES.length - 1;

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

/** Evaluates one crack against the diagram, at any factor on the primary load. */
export interface SectionEvaluator {
  readonly solutions: ChosenSolutions;
  readonly lrMax: number;
  /** Takes up a crack: everything below speaks of it until the next one. */
  readonly take: (crack: Crack) => void;
  /** Takes up only the deepest point and the end, all that growth needs. */
  readonly takeEnds: (crack: Crack) => void;
  /** Point of the diagram at a factor on the primary load. */
  readonly point: (loadFactor: number) => DiagramPoint;
  /** One place of the front at a factor on the primary load. */
  readonly frontAt: (index: number, loadFactor: number) => FrontState;
  /** Room left to the line: above 0 inside, continuous but for the jump of a yield plateau. */
  readonly margin: (loadFactor: number) => number;
  /** K from a range of stress at the deepest point and at the end of the crack [MPa·√mm]. */
  readonly deepest: (membrane: number, bending: number) => number;
  readonly end: (membrane: number, bending: number) => number;
}

/** An evaluator for the kind of flaw the case names, with its own scratch room: calls allocate little. */
export function sectionEvaluator(flaw: FlawCase): SectionEvaluator {
  const solutions = selectSolutions(flaw.situation);
  const front = FRONT_ANGLES.map((): Influence => ({
    membrane: 0,
    bending: 0,
    reversedBending: 0,
  }));
  const at = (index: number) => front[index] as Influence;
  const surface = flaw.situation.kind === 'surface';
  const facePressure = surface ? flaw.facePressure : 0;
  const cutOff = lrMax(flaw.material);
  let unitReference = 0;
  let residualAtService = 0;

  const residualMembrane = (factor: number): number => {
    if (flaw.residual.state !== 'as-welded') return fixedResidual(flaw).membrane;
    // a load never seen relaxes nothing; a smaller one leaves more
    return factor >= 1 ? residualAtService : relaxed(flaw, factor * unitReference);
  };
  const { bending: residualBending } = fixedResidual(flaw);

  const fill = (crack: Crack, index: number) =>
    solutions.stressIntensity.influence(crack, FRONT_ANGLES[index] as Degrees, at(index));
  const takeEnds = (crack: Crack) => {
    fill(crack, 0);
    fill(crack, LAST);
  };
  const take = (crack: Crack) => {
    for (let i = 0; i <= LAST; i++) fill(crack, i);
    // pressure in a fully long crack adds p a/t to the force through the wall (equilibrium)
    const membrane = flaw.primaryMembrane + (facePressure * crack.a) / crack.thickness;
    unitReference = solutions.referenceStress.stress(
      crack,
      membrane as MPa,
      flaw.primaryBending as MPa,
    );
    residualAtService = relaxed(flaw, unitReference);
  };
  const frontAt = (index: number, factor: number): FrontState =>
    place(at(index), factor, residualMembrane(factor));
  const place = (influence: Influence, factor: number, residual: number): FrontState => {
    const membrane = flaw.primaryMembrane + facePressure;
    const kPrimary = factor * combine(influence, membrane, flaw.primaryBending);
    const kSecondary = combine(influence, residual, residualBending);
    const rho = interaction(
      kPrimary,
      kSecondary,
      (factor * unitReference) / flaw.material.yieldMPa,
    );
    return { kPrimary, kSecondary, rho, kr: (kPrimary + kSecondary) / flaw.toughness + rho };
  };
  const point = (factor: number): DiagramPoint => {
    const residual = residualMembrane(factor);
    let governing = LAST;
    let kr = 0;
    for (let i = 0; i <= LAST; i++) {
      const here = place(at(i), factor, residual).kr;
      if (here >= kr) [kr, governing] = [here, i];
    }
    const referenceStress = factor * unitReference;
    return {
      lr: referenceStress / flaw.material.yieldMPa,
      kr,
      referenceStress,
      residualMembrane: residual,
      residualBending,
      governing,
    };
  };
  const margin = (factor: number): number => {
    const { lr, kr } = point(factor);
    return Math.min(optionOne(lr, flaw.material) - kr, cutOff - lr);
  };
  return {
    solutions,
    lrMax: cutOff,
    take,
    takeEnds,
    point,
    frontAt,
    margin,
    deepest: (membrane, bending) => combine(at(LAST), membrane, bending),
    end: (membrane, bending) => combine(at(0), membrane, bending),
  };
}

const relaxed = ({ material }: FlawCase, reference: number) =>
  relaxedResidual(reference, material.yieldMPa, material.tensileMPa);

function fixedResidual({ residual, material }: FlawCase): { membrane: number; bending: number } {
  switch (residual.state) {
    case 'entered':
      return { membrane: residual.membraneMPa.value, bending: residual.bendingMPa.value };
    case 'heat-treated':
      return { membrane: heatTreatedResidual(residual.flawToWeld, material.yieldMPa), bending: 0 };
    default:
      return { membrane: 0, bending: 0 };
  }
}
