import { refused, type Refused } from '../../geometry/refusal';
import { firstPrincipal, secondPrincipal, vonMises } from '../principal-stress';
import { noStress, type PlaneCondition, type PlaneStress } from '../stress-state';
import { mapFieldOf } from './map-field';
import type { MapComponent, MapRequest } from './map-request';
import { mapRefusals } from './map-rules';

/** What a point of the map is: a value, no single value (hole, line of the crack), or a value cut at the cap. */
export const MASK = { valid: 0, absent: 1, capped: 2 } as const;

export interface FilledMap {
  readonly status: 'filled';
  /** Least and greatest value drawn; both 0 when the map shows nothing. */
  readonly least: number;
  readonly greatest: number;
  readonly absent: number;
  readonly capped: number;
}

/**
 * Fills a grid with one component of the stress around a crack, a tip, a hole or an ellipse. Every place
 * of `values` gets a finite number: 0 where `mask` says absent, ± the cap where it says capped.
 */
export function stressMap(request: MapRequest): FilledMap | Refused {
  const broken = mapRefusals(request);
  if (broken.length > 0) return refused(...broken);
  const { grid, cap, values, mask } = request;
  const { at, absent } = evaluatorOf(request);
  const stepX = (grid.rightMm - grid.leftMm) / (grid.columns - 1);
  const stepY = (grid.topMm - grid.bottomMm) / (grid.rows - 1);
  let [least, greatest, gone, cut] = [Infinity, -Infinity, 0, 0];
  for (let row = 0; row < grid.rows; row++) {
    const y = onAxis(grid.bottomMm + row * stepY, stepY);
    for (let column = 0; column < grid.columns; column++) {
      const x = onAxis(grid.leftMm + column * stepX, stepX);
      const i = row * grid.columns + column;
      if (absent(x, y)) {
        values[i] = 0;
        mask[i] = MASK.absent;
        gone++;
        continue;
      }
      const value = at(x, y);
      // written so that a value that is no number, as at the tip itself, is cut too
      const whole = Math.abs(value) <= cap;
      const drawn = whole ? value : value < 0 ? -cap : cap;
      values[i] = drawn;
      mask[i] = whole ? MASK.valid : MASK.capped;
      if (!whole) cut++;
      if (drawn < least) least = drawn;
      if (drawn > greatest) greatest = drawn;
    }
  }
  const empty = gone === values.length;
  return {
    status: 'filled',
    least: empty ? 0 : least,
    greatest: empty ? 0 : greatest,
    absent: gone,
    capped: cut,
  };
}

// a step that should land on an axis misses it by roundings
const onAxis = (position: number, step: number): number =>
  Math.abs(position) < 1e-9 * step ? 0 : position;

function evaluatorOf({ subject, component, condition, poisson }: MapRequest) {
  const { field, absent, share } = mapFieldOf(subject);
  const state = noStress();
  const pick = picker(component, condition, poisson);
  const at = share && component === 'near-tip share' ? share : null;
  return { absent, at: at ?? ((x: number, y: number) => pick(field(x, y, state))) };
}

function picker(
  component: MapComponent,
  condition: PlaneCondition,
  poisson: number,
): (state: PlaneStress) => number {
  switch (component) {
    case 'xx':
      return ({ xx }) => xx;
    case 'xy':
      return ({ xy }) => xy;
    case 'first':
      return firstPrincipal;
    case 'second':
      return secondPrincipal;
    case 'von Mises':
      return (state) => vonMises(state, condition, poisson);
    default:
      return ({ yy }) => yy;
  }
}
