import type { FlawKind } from '@ligament/domain/geometry/flaw-kind';

/** Shape of a flaw in the plane of the section, in millimetres of the wall. */
export interface Outline {
  readonly kind: FlawKind;
  /** Face a surface flaw opens to. */
  readonly face: 'inside' | 'outside';
  readonly heightMm: number;
  readonly lengthMm: number;
  /** Its length is measured from an edge or a hole, where the wall begins. */
  readonly oneSided: boolean;
  /** Middle of an embedded flaw, from the inside surface. */
  readonly middleMm: number | null;
}

/** An outline with the words that stand beside it. */
export interface NamedOutline extends Outline {
  readonly label: string;
}

/** What a section view draws: the wall, the flaw now and later, and what is left. */
export interface SectionDrawing {
  readonly wallMm: number;
  readonly measured: NamedOutline;
  /** Measured and sizing allowance. */
  readonly assessed: NamedOutline;
  readonly expected: NamedOutline | null;
  readonly limiting: NamedOutline | null;
}
