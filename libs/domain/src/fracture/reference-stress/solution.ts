import type { Crack } from '../../geometry/crack';
import type { Limit } from '../../geometry/limit';
import type { MPa } from '../../units/quantity';

/** One published limit-load solution, as the reference stress it gives. */
export interface ReferenceStressSolution {
  readonly key: string;
  readonly title: string;
  readonly source: string;
  /** Formula in words or symbols, for the calculation sheet. */
  readonly formula: string;
  /** What the reader must know about its basis. */
  readonly basis: string;
  /** What collapses: the ligament ahead of the flaw, or the whole section of the body. */
  readonly scope: 'local' | 'global';
  /** What a vanishing flaw gives: the load ratio of the sound wall, or that with a margin of the form's own. */
  readonly vanishing: 'exact' | 'margin';
  readonly limits: readonly Limit[];
  /** Reference stress from primary membrane and bending [MPa]; Infinity once the ligament has failed. */
  readonly stress: (crack: Crack, membrane: MPa, bending: MPa) => MPa;
}
