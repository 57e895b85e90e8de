import { type Box } from './place-labels';
import type { NamedOutline, Outline, SectionDrawing } from './section-drawing';
import { roundStep } from './axis-ticks';
import { type Frame, goesThrough, opensToFace, reachOf, yOf } from './section-frame';
import { leaderLabels, type LeaderLabel, type Part } from './section-leaders';

export interface DrawnOutline {
  readonly part: Part;
  readonly path: string;
  readonly label: string;
}

export interface Dimension {
  readonly x1: number;
  readonly y1: number;
  readonly x2: number;
  readonly y2: number;
  readonly text: string;
}

/** A section view in pixels: one scale for height and length. */
export interface SectionGeometry {
  readonly width: number;
  readonly height: number;
  /** Pixels for one millimetre, both ways. */
  readonly scale: number;
  readonly wall: Box;
  readonly middleX: number;
  /** From the widest to the smallest, so that each lies on the one before. */
  readonly outlines: readonly DrawnOutline[];
  /** Empty where the room is too small for words in the drawing. */
  readonly labels: readonly LeaderLabel[];
  readonly ligament: Dimension | null;
  readonly length: Dimension;
  readonly scaleBar: Dimension;
  /** Whether a long flaw runs out of the drawing at both sides. */
  readonly cut: boolean;
}

const TALLEST_WALL = 290;
/** A wall drawn thinner than this shows nothing: labels give way first, then a very long flaw is cut. */
const THINNEST_WALL = 64;
const LABEL_ROOM = 226;
const WIDE = 600;
const BAND = 44;
/** What is drawn beside an edge of the wall. */
const EDGE_ROOM = 46;

export function sectionGeometry(drawing: SectionDrawing, width: number): SectionGeometry {
  const parts = partsOf(drawing);
  const oneSided = drawing.measured.oneSided;
  const longest = Math.max(...parts.map(([, outline]) => drawnLength(outline, drawing.wallMm)));
  const { room, scale } = fit(longest, drawing.wallMm, width);
  const labelled = room < width;
  const left = oneSided ? EDGE_ROOM : 0;
  const wall = { left, right: width, top: BAND, bottom: BAND + drawing.wallMm * scale };
  const middleX = oneSided ? left : room / 2;
  const frame: Frame = { wallMm: drawing.wallMm, scale, wall, middleX, edge: room };
  return {
    width,
    height: wall.bottom + BAND + 26,
    scale,
    wall,
    middleX: frame.middleX,
    outlines: parts.map(([part, outline]) => ({
      part,
      path: outlinePath(outline, frame),
      label: outline.label,
    })),
    labels: labelled ? leaderLabels(parts, frame) : [],
    ligament: ligamentOf(drawing.assessed, drawing.wallMm, frame),
    length: lengthOf(drawing.measured, frame),
    scaleBar: scaleBarOf(drawing.wallMm, frame, width),
    cut: longest * scale > room - left,
  };
}

/** Length the drawing has to hold: of a flaw without end, what shows that it has none. */
const drawnLength = ({ kind, lengthMm }: Outline, wallMm: number): number =>
  kind === 'extended surface' ? 2 * wallMm : lengthMm;

/** Room for the flaw and the scale that fills it, with labels beside it where the wall stays thick enough. */
function fit(longestMm: number, wallMm: number, width: number) {
  const scaleIn = (room: number) => Math.min((room - 24) / longestMm, TALLEST_WALL / wallMm);
  const beside = width - LABEL_ROOM;
  if (width >= WIDE && scaleIn(beside) * wallMm >= THINNEST_WALL) {
    return { room: beside, scale: scaleIn(beside) };
  }
  return { room: width, scale: Math.max(scaleIn(width), THINNEST_WALL / wallMm) };
}

function partsOf(drawing: SectionDrawing): (readonly [Part, NamedOutline])[] {
  const all: (readonly [Part, NamedOutline | null])[] = [
    ['limiting', drawing.limiting],
    ['expected', drawing.expected],
    ['assessed', drawing.assessed],
    ['measured', drawing.measured],
  ];
  // the highest first: a limit that is already passed stays visible on the flaw
  return all
    .filter((each): each is readonly [Part, NamedOutline] => each[1] !== null)
    .sort(([, a], [, b]) => b.heightMm - a.heightMm);
}

/** Outline as an SVG path: half or a quarter of an ellipse on a face, a whole one in the wall, or a band. */
function outlinePath(outline: Outline, frame: Frame): string {
  const { scale, wall, middleX } = frame;
  const half = reachOf(outline) * scale;
  const [left, right] = [text(outline.oneSided ? middleX : middleX - half), text(middleX + half)];
  if (goesThrough(outline)) {
    return `M ${left} ${text(wall.top)} H ${right} V ${text(wall.bottom)} H ${left} Z`;
  }
  if (opensToFace(outline)) {
    const inside = outline.face === 'inside';
    const y = text(inside ? wall.bottom : wall.top);
    const deep = outline.heightMm * scale;
    const tip = text(inside ? wall.bottom - deep : wall.top + deep);
    if (outline.kind === 'extended surface') {
      return `M ${text(wall.left)} ${y} V ${tip} H ${text(wall.right)} V ${y} Z`;
    }
    const radii = `${text(half)} ${text(deep)}`;
    return outline.oneSided
      ? `M ${left} ${y} V ${tip} A ${radii} 0 0 ${inside ? 1 : 0} ${right} ${y} Z`
      : `M ${left} ${y} A ${radii} 0 0 ${inside ? 1 : 0} ${right} ${y} Z`;
  }
  const y = text(yOf(outline.middleMm ?? 0, frame));
  const radii = `${text(half)} ${text((outline.heightMm * scale) / 2)}`;
  return `M ${left} ${y} A ${radii} 0 0 1 ${right} ${y} A ${radii} 0 0 1 ${left} ${y} Z`;
}

const text = (value: number) => String(Math.round(value * 100) / 100);

/** What is left of the wall ahead of the assessed flaw, or between an embedded one and the nearer face. */
function ligamentOf(assessed: Outline, wallMm: number, frame: Frame): Dimension | null {
  const [from, to] = ligamentEnds(assessed, wallMm);
  const left = Math.abs(to - from);
  if (left <= 0) return null;
  // the ligament of a corner flaw is measured along the edge, drawn a little beside it
  const x = assessed.oneSided ? frame.middleX + 6 : frame.middleX;
  const words = `ligament ${Math.round(left * 10) / 10} mm`;
  return { x1: x, y1: yOf(from, frame), x2: x, y2: yOf(to, frame), text: words };
}

function ligamentEnds(outline: Outline, wallMm: number) {
  const { face, heightMm, middleMm } = outline;
  if (goesThrough(outline)) return [0, 0] as const;
  if (opensToFace(outline)) {
    return face === 'inside' ? ([heightMm, wallMm] as const) : ([wallMm - heightMm, 0] as const);
  }
  const [low, high] = [(middleMm ?? 0) - heightMm / 2, (middleMm ?? 0) + heightMm / 2];
  return low <= wallMm - high ? ([low, 0] as const) : ([high, wallMm] as const);
}

/** Length of the measured flaw, drawn outside the wall on the flaw's side. */
function lengthOf(measured: NamedOutline, frame: Frame): Dimension {
  const { kind, face, lengthMm, oneSided } = measured;
  const endless = kind === 'extended surface';
  const half = endless ? (frame.edge - 24) / 2 : reachOf(measured) * frame.scale;
  const above = opensToFace(measured) && face === 'outside';
  const y = above ? frame.wall.top - 26 : frame.wall.bottom + 29;
  const words = endless
    ? 'full length'
    : `${oneSided ? 'c' : '2c'} ${Math.round(lengthMm * 10) / 10} mm`;
  return {
    x1: oneSided ? frame.middleX : frame.middleX - half,
    x2: frame.middleX + half,
    y1: y,
    y2: y,
    text: words,
  };
}

function scaleBarOf(wallMm: number, { scale, wall }: Frame, width: number): Dimension {
  const bar = roundStep(Math.min(wallMm / 2, 120 / scale));
  const y = wall.bottom + BAND + 12;
  return { x1: width - 12 - bar * scale, x2: width - 12, y1: y, y2: y, text: `${bar} mm` };
}
