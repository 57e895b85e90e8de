import type { TipState } from '@ligament/domain/assessment/analyses/tip-state';
import { vonMises } from '@ligament/domain/fracture/principal-stress';
import { noStress } from '@ligament/domain/fracture/stress-state';
import { mapFieldOf } from '@ligament/domain/fracture/tip-field/map-field';
import type { MapComponent } from '@ligament/domain/fracture/tip-field/map-request';
import { MASK, stressMap } from '@ligament/domain/fracture/tip-field/stress-map';
import type { TwinTable } from '../../../shared/drawing/twin-table';
import { colourOf } from './map-colours';

export const COLUMNS = 200;
export const ROWS = 150;

/** Components a reader may choose, in words. */
export const COMPONENTS: readonly { readonly key: MapComponent; readonly words: string }[] = [
  { key: 'von Mises', words: 'von Mises' },
  { key: 'yy', words: 'opening, σyy' },
  { key: 'xx', words: 'along the crack, σxx' },
  { key: 'first', words: 'largest principal' },
];

/** Line around the place where the material would yield. */
const YIELD_LINE = [176, 48, 32] as const;

interface Grid {
  readonly values: Float32Array;
  readonly mask: Uint8Array;
}

/** One component over the map; empty when there is nothing to show. */
function gridOf(tip: TipState, component: MapComponent, reachMm: number): Grid | null {
  const values = new Float32Array(COLUMNS * ROWS);
  const mask = new Uint8Array(COLUMNS * ROWS);
  const filled = stressMap({
    subject: tip.subject,
    component,
    condition: tip.condition,
    poisson: tip.poissonsRatio,
    grid: {
      leftMm: -reachMm,
      rightMm: reachMm,
      bottomMm: -0.75 * reachMm,
      topMm: 0.75 * reachMm,
      columns: COLUMNS,
      rows: ROWS,
    },
    cap: 2 * tip.yieldMPa,
    values,
    mask,
  });
  return filled.status === 'filled' ? { values, mask } : null;
}

/**
 * Pixels of the map, top row first: the component from nothing to twice the yield strength, the line of the
 * crack white, and a line around the place where the material would yield.
 */
export function tipPixels(
  tip: TipState,
  component: MapComponent,
  reachMm: number,
): Uint8ClampedArray<ArrayBuffer> {
  const pixels = new Uint8ClampedArray(4 * COLUMNS * ROWS);
  const shown = gridOf(tip, component, reachMm);
  const equivalent = gridOf(tip, 'von Mises', reachMm);
  if (!shown || !equivalent) return pixels;
  const yields = (i: number) => (equivalent.values[i] ?? 0) >= tip.yieldMPa;
  for (let row = 0; row < ROWS; row++) {
    for (let column = 0; column < COLUMNS; column++) {
      const from = row * COLUMNS + column;
      const right = column + 1 < COLUMNS ? from + 1 : from;
      const above = row + 1 < ROWS ? from + COLUMNS : from;
      const onLine = yields(from) !== yields(right) || yields(from) !== yields(above);
      const share = Math.max(shown.values[from] ?? 0, 0) / (2 * tip.yieldMPa);
      const colour = onLine ? YIELD_LINE : colourOf(share);
      const absent = shown.mask[from] === MASK.absent;
      const to = 4 * ((ROWS - 1 - row) * COLUMNS + column);
      for (let i = 0; i < 3; i++) pixels[to + i] = absent ? 255 : (colour[i] ?? 0);
      pixels[to + 3] = 255;
    }
  }
  return pixels;
}

const READ_AT = [0.05, 0.1, 0.25, 0.5, 1] as const;
const ANGLES = [0, 45, 90, 135] as const;

/** Stresses of the map read off at a few distances and angles. */
export function tipTable(tip: TipState, reachMm: number): TwinTable {
  const { field } = mapFieldOf(tip.subject);
  const rows = READ_AT.flatMap((share) =>
    ANGLES.map((angle) => {
      const r = share * reachMm;
      const radians = (angle * Math.PI) / 180;
      const state = field(r * Math.cos(radians), r * Math.sin(radians), noStress());
      const equivalent = vonMises(state, tip.condition, tip.poissonsRatio);
      return [r, angle, state.xx, state.yy, state.xy, equivalent] as const;
    }),
  );
  return {
    columns: [
      { label: 'r', unit: 'mm', digits: 3 },
      { label: 'θ', unit: '°', digits: 0 },
      { label: 'σxx', unit: 'MPa', digits: 1 },
      { label: 'σyy', unit: 'MPa', digits: 1 },
      { label: 'τxy', unit: 'MPa', digits: 1 },
      { label: 'von Mises', unit: 'MPa', digits: 1 },
    ],
    rows: rows.map((row) => [...row]),
  };
}
