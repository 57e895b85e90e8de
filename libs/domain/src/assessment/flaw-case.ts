import type { FlawSituation } from '../fracture/select-solutions';
import type { DiagramMaterial } from '../fracture/fad/option-one';
import type { Crack } from '../geometry/crack';
import { MPA_SQRT_MM_PER } from '../units/exact-factors';
import type { Mm } from '../units/quantity';
import type { AssessmentInput, ResidualStressInput } from './assessment-input';

/** The wall in plain numbers [mm]; what a plate lacks is infinite. */
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
  readonly primaryMembrane: number;
  /** Positive when the face the flaw is measured from is in tension [MPa]. */
  readonly primaryBending: number;
  readonly facePressure: number;
  readonly residual: ResidualStressInput;
  readonly material: DiagramMaterial;
  readonly poissonsRatio: number;
  /** Kmat [MPa·√mm]. */
  readonly toughness: number;
}

/** Strips origins and converts units; the input has passed its checks. */
export function flawCase({ wall, flaw, stress, material }: AssessmentInput): FlawCase {
  const cylinder = wall.shape === 'cylinder';
  const insideRadius = cylinder ? wall.insideDiameterMm.value / 2 : Infinity;
  const width = cylinder
    ? cylinderWidth(flaw.orientation, insideRadius)
    : (wall.widthMm?.value ?? Infinity);
  return {
    situation: {
      shape: wall.shape,
      kind: flaw.kind,
      face: flaw.face,
      orientation: flaw.orientation,
    },
    wall: {
      thickness: wall.thicknessMm.value as Mm,
      width: width as Mm,
      insideRadius: insideRadius as Mm,
      holeRadius: 0 as Mm,
    },
    primaryMembrane: stress.primaryMembraneMPa.value,
    primaryBending: stress.primaryBendingMPa.value,
    facePressure: stress.crackFacePressureMPa?.value ?? 0,
    residual: stress.residual,
    material: {
      yieldMPa: material.yieldMPa.value,
      tensileMPa: material.tensileMPa.value,
      youngsModulusMPa: material.youngsModulusMPa.value,
      yieldPlateau: material.yieldPlateau,
    },
    poissonsRatio: material.poissonsRatio.value,
    toughness: material.toughnessMPaSqrtM.value * MPA_SQRT_MM_PER['MPa·√m'],
  };
}

// a circumferential flaw can be no wider than the bore's circumference; an axial one has the shell's length
const cylinderWidth = (orientation: FlawSituation['orientation'], insideRadius: number) =>
  orientation === 'circumferential' ? 2 * Math.PI * insideRadius : Infinity;

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
