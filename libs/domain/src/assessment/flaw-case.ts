import type { DiagramLine } from '../fracture/fad/diagram-line';
import type { DiagramMaterial } from '../fracture/fad/option-one';
import type { FlawSituation, SolutionWish } from '../fracture/select-solutions';
import {
  linearised,
  linearTerms,
  scaled,
  termsOf,
} from '../fracture/stress-intensity/stress-terms';
import type { StressTerms } from '../fracture/stress-intensity/stress-terms';
import type { Crack } from '../geometry/crack';
import { MPA_SQRT_MM_PER } from '../units/exact-factors';
import type { Mm } from '../units/quantity';
import type {
  AssessmentInput,
  ResidualStressInput,
  StressInput,
  WallInput,
} from './assessment-input';
import { factorsOf } from './partial-factors';

/** The wall in plain numbers [mm]; what a body lacks is infinite, and the hole then has no radius. */
export interface Wall {
  readonly thickness: Mm;
  readonly width: Mm;
  readonly insideRadius: Mm;
  readonly holeRadius: Mm;
}

/** One assessment in plain numbers and one unit system, origins left behind. */
export interface FlawCase {
  readonly situation: FlawSituation;
  readonly wall: Wall;
  /** Primary stress at service load, from the face the flaw is measured from [MPa]. */
  readonly primary: StressTerms;
  /** The part of it that leads to collapse: without the peak of a nozzle [MPa]. */
  readonly collapse: StressTerms;
  readonly facePressure: number;
  readonly residual: ResidualStressInput;
  readonly material: DiagramMaterial;
  /** Line of the failure assessment diagram. */
  readonly line: DiagramLine;
  readonly poissonsRatio: number;
  /** Kmat [MPa·√mm]. */
  readonly toughness: number;
  /** What was asked of the choice of solutions. */
  readonly wish: SolutionWish;
}

/** What the choice of solutions depends on. */
export const situationOf = ({ wall, flaw }: AssessmentInput): FlawSituation => ({
  shape: wall.shape,
  kind: flaw.kind,
  face: flaw.face,
  orientation: flaw.orientation,
  flawedSides: wall.shape === 'hole edge' ? wall.flawedSides : 'one',
});

/** Strength and stiffness as the diagram takes them, partial factors applied. */
export function diagramMaterial(input: AssessmentInput): DiagramMaterial {
  const { material } = input;
  const factors = factorsOf(input);
  return {
    yieldMPa: material.yieldMPa.value / factors.yield,
    tensileMPa: material.tensileMPa.value / factors.yield,
    youngsModulusMPa: material.youngsModulusMPa.value,
    yieldPlateau: material.yieldPlateau,
  };
}

/** Strips origins, converts units and applies partial factors; the input has passed its checks. */
export function flawCase(input: AssessmentInput, line: DiagramLine): FlawCase {
  const { wall, flaw, stress, material } = input;
  const factors = factorsOf(input);
  return {
    situation: situationOf(input),
    wall: wallOf(wall, flaw.orientation),
    primary: scaled(
      stress.peakProfileMPa
        ? termsOf(stress.peakProfileMPa.value)
        : primaryTerms(stress, wall.thicknessMm.value),
      factors.stress,
    ),
    collapse: scaled(primaryTerms(stress, wall.thicknessMm.value), factors.stress),
    facePressure: factors.stress * (stress.crackFacePressureMPa?.value ?? 0),
    residual: stress.residual,
    material: diagramMaterial(input),
    line,
    poissonsRatio: material.poissonsRatio.value,
    toughness: (material.toughnessMPaSqrtM.value * MPA_SQRT_MM_PER['MPa·√m']) / factors.toughness,
    wish: {
      stressIntensity: input.stressIntensityChoice?.key ?? null,
      referenceStress: input.referenceStressChoice?.key ?? null,
      attachmentLength: stress.weldToe?.attachmentLengthMm.value ?? null,
    },
  };
}

/** Primary stress as entered, with the bending an offset of the walls adds: 3e/t of the membrane part. */
export function primaryTerms(stress: StressInput, thickness: number): StressTerms {
  const profile = stress.primaryProfileMPa;
  const entered = profile
    ? termsOf(profile.value)
    : linearTerms(stress.primaryMembraneMPa.value, stress.primaryBendingMPa.value);
  const offset = stress.offsetMm?.value ?? 0;
  if (offset === 0) return entered;
  const added = (3 * offset * linearised(entered).membrane) / thickness;
  return { ...entered, bending: entered.bending + added };
}

function wallOf(wall: WallInput, orientation: FlawSituation['orientation']): Wall {
  const round = wall.shape === 'cylinder' || wall.shape === 'sphere';
  const insideRadius = round ? wall.insideDiameterMm.value / 2 : Infinity;
  const flat = wall.shape === 'plate' || wall.shape === 'hole edge';
  const width = flat
    ? (wall.widthMm?.value ?? Infinity)
    : wall.shape === 'cylinder' && orientation === 'circumferential'
      ? 2 * Math.PI * insideRadius
      : Infinity;
  const holed = wall.shape === 'hole edge' || wall.shape === 'nozzle corner';
  return {
    thickness: wall.thicknessMm.value as Mm,
    width: width as Mm,
    insideRadius: insideRadius as Mm,
    holeRadius: (holed ? wall.holeRadiusMm.value : 0) as Mm,
  };
}

/** The crack of a given size in the wall of the case. */
export const crackIn = ({ wall }: FlawCase, a: number, c: number, ligament: number): Crack => ({
  a: a as Mm,
  c: c as Mm,
  ligament: ligament as Mm,
  thickness: wall.thickness,
  width: wall.width,
  insideRadius: wall.insideRadius,
  holeRadius: wall.holeRadius,
});
