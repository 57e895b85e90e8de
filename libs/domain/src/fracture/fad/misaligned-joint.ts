import { outOfBounds, refused, type NumberRule, type Refused } from '../../geometry/refusal';
import {
  angularMisalignment,
  axialMisalignment,
  misalignmentBending,
  ovalityMagnification,
  unequalMisalignment,
  type OvalCylinder,
} from './misalignment';

/** A misaligned butt joint as a user enters it. */
export interface MisalignedJoint {
  readonly membraneMPa: number;
  readonly thicknessMm: number;
  /** Thickness of the other wall where it is another [mm]. */
  readonly otherThicknessMm: number | null;
  /** Offset of the middle lines, 0 for none [mm]. */
  readonly offsetMm: number;
  /** An angle between the walls; null for none. */
  readonly angle: {
    readonly peakMm: number;
    readonly halfLengthMm: number;
    readonly ends: 'fixed' | 'pinned';
  } | null;
  /** A cylinder that is not round, for a seam along it; null for none. */
  readonly ovality: Omit<OvalCylinder, 'thicknessMm' | 'youngsModulusMPa'> | null;
  readonly youngsModulusMPa: number;
}

/** What the misalignment adds. */
export interface MisalignmentAnswer {
  readonly status: 'found';
  /** Magnification of the offset, of the angle and of the ovality. */
  readonly axial: number;
  readonly angular: number;
  readonly ovality: number;
  /** Bending stress to add to the primary bending [MPa]. */
  readonly bendingMPa: number;
}

const LENGTH = 'Give it in millimetres.';
const STRESS = 'Give it in MPa; steel has a modulus of about 207 000 MPa.';

/** Bending stress of a misaligned butt joint, or which input makes it impossible. */
export function misalignedJoint(joint: MisalignedJoint): MisalignmentAnswer | Refused {
  const refusals = outOfBounds(rulesOf(joint));
  if (refusals.length > 0) return refused(...refusals);
  const { membraneMPa, thicknessMm, otherThicknessMm, offsetMm, angle, youngsModulusMPa } = joint;
  const axial =
    otherThicknessMm === null
      ? axialMisalignment(offsetMm, thicknessMm)
      : unequalMisalignment(offsetMm, thicknessMm, otherThicknessMm);
  const angular = angle
    ? angularMisalignment({ ...angle, thicknessMm, membraneMPa, youngsModulusMPa })
    : 1;
  const ovality = joint.ovality
    ? ovalityMagnification({ ...joint.ovality, thicknessMm, youngsModulusMPa })
    : 1;
  const bendingMPa = misalignmentBending(membraneMPa, [axial, angular, ovality]);
  return { status: 'found', axial, angular, ovality, bendingMPa };
}

const length = (input: string, name: string, value: number, min: number, max: number) => ({
  input,
  name,
  unit: 'mm',
  value,
  min,
  max,
  instead: LENGTH,
});

function rulesOf(joint: MisalignedJoint): readonly NumberRule[] {
  const { membraneMPa, thicknessMm, otherThicknessMm, offsetMm, angle, youngsModulusMPa } = joint;
  const stress = { unit: 'MPa', instead: STRESS };
  return [
    {
      input: 'membraneMPa',
      name: 'Membrane stress',
      value: membraneMPa,
      min: 0,
      max: 2000,
      ...stress,
    },
    {
      input: 'youngsModulusMPa',
      name: 'Young’s modulus',
      value: youngsModulusMPa,
      min: 3e4,
      max: 4.5e5,
      ...stress,
    },
    length('thicknessMm', 'Wall thickness', thicknessMm, 1, 1000),
    // an offset of more than the wall is no joint any more
    length('offsetMm', 'Offset of the walls', offsetMm, 0, thicknessMm > 0 ? thicknessMm : 0),
    ...(otherThicknessMm === null
      ? []
      : [
          length(
            'otherThicknessMm',
            'Thickness of the thicker wall',
            otherThicknessMm,
            thicknessMm,
            1000,
          ),
        ]),
    ...(angle
      ? [
          length('angle.peakMm', 'Peak of the angle', angle.peakMm, 0, 100),
          length('angle.halfLengthMm', 'Distance to the support', angle.halfLengthMm, 1, 1e5),
        ]
      : []),
    ...(joint.ovality ? ovalityRules(joint.ovality) : []),
  ];
}

const ovalityRules = ({
  differenceMm,
  diameterMm,
  angleDeg,
  pressureMPa,
  poissonsRatio,
}: NonNullable<MisalignedJoint['ovality']>): readonly NumberRule[] => [
  length('ovality.diameterMm', 'Mean diameter', diameterMm, 10, 1e5),
  // beyond a tenth of the diameter the cylinder is no longer nearly round
  length('ovality.differenceMm', 'Difference of diameters', differenceMm, 0, diameterMm / 10),
  {
    input: 'ovality.angleDeg',
    name: 'Angle from the greatest diameter',
    unit: '°',
    value: angleDeg,
    min: 0,
    max: 360,
    instead: 'Give it in degrees.',
  },
  {
    input: 'ovality.pressureMPa',
    name: 'Internal pressure',
    unit: 'MPa',
    value: pressureMPa,
    min: 0,
    max: 200,
    instead: 'Give it in MPa; a value in bar is ten times too large.',
  },
  {
    input: 'ovality.poissonsRatio',
    name: 'Poisson’s ratio',
    unit: '',
    value: poissonsRatio,
    min: 0,
    max: 0.5,
    instead: 'Steel has about 0.3.',
  },
];
