import type { PlaneCondition } from '../stress-state';
import type { MapSubject } from './map-field';

/** What is drawn: a component, a principal or equivalent stress [MPa], or near-tip over exact σyy [-]. */
export type MapComponent = 'xx' | 'yy' | 'xy' | 'von Mises' | 'first' | 'second' | 'near-tip share';

/** Points of the map: columns from left to right, rows from bottom to top, both edges included. */
export interface MapGrid {
  readonly leftMm: number;
  readonly rightMm: number;
  readonly bottomMm: number;
  readonly topMm: number;
  readonly columns: number;
  readonly rows: number;
}

export interface MapRequest {
  readonly subject: MapSubject;
  readonly component: MapComponent;
  readonly condition: PlaneCondition;
  readonly poisson: number;
  readonly grid: MapGrid;
  /** No value is drawn beyond ± this. */
  readonly cap: number;
  /** Filled row by row from the bottom. */
  readonly values: Float32Array | Float64Array;
  /** Filled with what each point is: see MASK. */
  readonly mask: Uint8Array;
}
