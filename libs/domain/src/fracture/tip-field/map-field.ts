import { degrees, mm, mpa, mpaSqrtMm } from '../../units/quantity';
import type { StressField } from '../stress-state';
import { ellipseField } from '../stress-raisers/ellipse-field';
import { kirschField } from '../stress-raisers/kirsch-field';
import { nearTipField } from './near-tip-field';
import { nearTipShare } from './near-tip-ratio';
import { westergaardField } from './westergaard-field';

/** Stress far away: its size, the stress across it as a share of it, and its direction from the x axis. */
export interface MapLoad {
  readonly stressMPa: number;
  readonly ratio: number;
  readonly angleDegrees: number;
  readonly pressureMPa: number;
}

/** What a map shows. Crack, hole and ellipse have their middle at the origin, `near-tip` has the tip there. */
export type MapSubject =
  | {
      readonly kind: 'crack';
      readonly halfLengthMm: number;
      /** Across the crack, along y. */
      readonly stressMPa: number;
      readonly ratio: number;
    }
  | {
      readonly kind: 'near-tip';
      /** KI, KII [MPa·√mm] and T [MPa]. */
      readonly opening: number;
      readonly sliding: number;
      readonly alongMPa: number;
    }
  | ({ readonly kind: 'hole'; readonly radiusMm: number } & MapLoad)
  | ({
      readonly kind: 'ellipse';
      /** Half axes along x and y. */
      readonly halfWidthMm: number;
      readonly halfHeightMm: number;
    } & MapLoad);

/** A field with the part of the plane that holds no single stress: the hole, or the line of the crack. */
export interface MapField {
  readonly field: StressField;
  readonly absent: (x: number, y: number) => boolean;
  /** Near-tip over exact σyy; null where there is no exact crack to compare with. */
  readonly share: ((x: number, y: number) => number) | null;
}

// a grid point meant to lie on an edge may miss it by a rounding
const ON_EDGE = 1 - 1e-12;

/** The field of a subject whose numbers have been checked. */
export function mapFieldOf(subject: MapSubject): MapField {
  switch (subject.kind) {
    case 'crack':
      return crackMap(subject);
    case 'near-tip':
      return {
        field: nearTipField({
          opening: mpaSqrtMm(subject.opening),
          sliding: mpaSqrtMm(subject.sliding),
          along: mpa(subject.alongMPa),
        }),
        absent: (x, y) => y === 0 && x < 0,
        share: null,
      };
    case 'hole': {
      const inside = (subject.radiusMm * ON_EDGE) ** 2;
      return {
        field: kirschField(mm(subject.radiusMm), loadOf(subject)),
        absent: (x, y) => x * x + y * y < inside,
        share: null,
      };
    }
    case 'ellipse': {
      const [across, along] = [mm(subject.halfWidthMm), mm(subject.halfHeightMm)];
      return {
        field: ellipseField({ across, along }, loadOf(subject)),
        absent: (x, y) => (x / across) ** 2 + (y / along) ** 2 < ON_EDGE,
        share: null,
      };
    }
  }
}

function crackMap({
  halfLengthMm,
  stressMPa,
  ratio,
}: Extract<MapSubject, { kind: 'crack' }>): MapField {
  const crack = { halfLength: mm(halfLengthMm), stress: mpa(stressMPa), ratio };
  const share = nearTipShare(crack);
  return {
    field: westergaardField(crack),
    absent: (x, y) => y === 0 && Math.abs(x) < halfLengthMm * ON_EDGE,
    share: (x, y) => share(x - halfLengthMm, y),
  };
}

const loadOf = ({ stressMPa, ratio, angleDegrees, pressureMPa }: MapLoad) => ({
  stress: mpa(stressMPa),
  ratio,
  angle: degrees(angleDegrees),
  pressure: mpa(pressureMPa),
});
