import { axisTicks } from './axis-ticks';
import { placeLabels, type PlacedLabel } from './place-labels';

export interface Ratios {
  readonly lr: number;
  readonly kr: number;
}

export interface NamedRatios extends Ratios {
  readonly label: string;
}

/** What a failure assessment diagram draws. */
export interface DiagramDrawing {
  /** The line from Lr = 0 to the cut-off and down to the axis. */
  readonly line: readonly Ratios[];
  readonly lrMax: number;
  readonly now: NamedRatios;
  readonly outside: boolean;
  readonly path: readonly Ratios[];
  readonly next: NamedRatios | null;
  readonly limit: NamedRatios | null;
}

export interface Tick {
  readonly at: number;
  readonly text: string;
}

export type PointPart = 'now' | 'next' | 'limit';

export interface DiagramGeometry {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  readonly xTicks: readonly Tick[];
  readonly yTicks: readonly Tick[];
  /** The line, and the area of acceptable points under it. */
  readonly line: string;
  readonly area: string;
  readonly path: string;
  readonly points: readonly (PlacedLabel & { readonly part: PointPart })[];
  readonly cutOff: Tick;
  /** Whether the point lies so far outside that it is set on the edge. */
  readonly clamped: boolean;
}

const HEIGHT = 330;
const MARGIN = { left: 40, right: 14, top: 26, bottom: 40 };
/** A point beyond so many times the diagram is set on its edge. */
const FARTHEST = 2.2;

export function diagramGeometry(drawing: DiagramDrawing, width: number): DiagramGeometry {
  const box = {
    left: MARGIN.left,
    right: width - MARGIN.right,
    top: MARGIN.top,
    bottom: HEIGHT - MARGIN.bottom,
  };
  const ends = axisEnds(drawing);
  const x = (lr: number) => box.left + (Math.min(lr, ends.lr) / ends.lr) * (box.right - box.left);
  const y = (kr: number) => box.bottom - (Math.min(kr, ends.kr) / ends.kr) * (box.bottom - box.top);
  const trace = (points: readonly Ratios[]) =>
    points.map(({ lr, kr }, i) => `${i ? 'L' : 'M'} ${round(x(lr))} ${round(y(kr))}`).join(' ');
  const line = trace(drawing.line);
  const named = pointsOf(drawing);
  const placed = placeLabels(
    named.map(([, { lr, kr, label }]) => ({ x: x(lr), y: y(kr), text: label })),
    { ...box, top: 4 },
  );
  return {
    width,
    height: HEIGHT,
    ...box,
    xTicks: axisTicks(ends.lr, width < 320 ? 4 : 8).map((at) => ({ at: x(at), text: String(at) })),
    yTicks: axisTicks(ends.kr, 7).map((at) => ({ at: y(at), text: String(at) })),
    line,
    area: `${line} L ${round(x(0))} ${round(y(0))} Z`,
    path: trace(drawing.path.filter(({ lr, kr }) => lr <= ends.lr && kr <= ends.kr)),
    points: placed.map((label, i) => ({ ...label, part: named[i]?.[0] ?? 'now' })),
    cutOff: { at: x(drawing.lrMax), text: `Lr,max ${round(drawing.lrMax)}` },
    clamped: drawing.now.lr > ends.lr || drawing.now.kr > ends.kr,
  };
}

function pointsOf(drawing: DiagramDrawing): (readonly [PointPart, NamedRatios])[] {
  const all: (readonly [PointPart, NamedRatios | null])[] = [
    ['now', drawing.now],
    ['next', drawing.next],
    ['limit', drawing.limit],
  ];
  return all.filter((each): each is readonly [PointPart, NamedRatios] => each[1] !== null);
}

/** Axes reach a little beyond the line and every point, within reason. */
function axisEnds(drawing: DiagramDrawing): Ratios {
  const points = [drawing.now, ...drawing.path];
  const reach = (line: number, values: readonly number[]) =>
    Math.min(Math.max(line, ...values.filter(Number.isFinite)) * 1.1, line * FARTHEST);
  return {
    lr: reach(
      drawing.lrMax,
      points.map(({ lr }) => lr),
    ),
    kr: reach(
      1.05,
      points.map(({ kr }) => kr),
    ),
  };
}

const round = (value: number) => Math.round(value * 100) / 100;
