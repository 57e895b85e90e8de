import { type Box } from './place-labels';
import type { NamedOutline, Outline, SectionDrawing } from './section-drawing';
import { roundStep } from './axis-ticks';
import { type Frame, yOf } from './section-frame';
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

export function sectionGeometry(drawing: SectionDrawing, width: number): SectionGeometry {
  const parts = partsOf(drawing);
  const longest = Math.max(...parts.map(([, { lengthMm }]) => lengthMm));
  const { room, scale } = fit(longest, drawing.wallMm, width);
  const labelled = room < width;
  const wall = { left: 0, right: width, top: BAND, bottom: BAND + drawing.wallMm * scale };
  const frame: Frame = { wallMm: drawing.wallMm, scale, wall, middleX: room / 2, edge: room };
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
    cut: longest * scale > room,
  };
}

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

/** Outline as an SVG path: half an ellipse on a face, a whole one in the wall, or the wall's full height. */
function outlinePath(outline: Outline, frame: Frame): string {
  const { scale, wall, middleX } = frame;
  const half = (outline.lengthMm * scale) / 2;
  const [left, right] = [text(middleX - half), text(middleX + half)];
  if (outline.kind === 'through-wall') {
    return `M ${left} ${text(wall.top)} H ${right} V ${text(wall.bottom)} H ${left} Z`;
  }
  if (outline.kind === 'surface') {
    const inside = outline.face === 'inside';
    const y = text(inside ? wall.bottom : wall.top);
    const radii = `${text(half)} ${text(outline.heightMm * scale)}`;
    return `M ${left} ${y} A ${radii} 0 0 ${inside ? 1 : 0} ${right} ${y} Z`;
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
  const { middleX: x } = frame;
  const words = `ligament ${Math.round(left * 10) / 10} mm`;
  return { x1: x, y1: yOf(from, frame), x2: x, y2: yOf(to, frame), text: words };
}

function ligamentEnds({ kind, face, heightMm, middleMm }: Outline, wallMm: number) {
  if (kind === 'through-wall') return [0, 0] as const;
  if (kind === 'surface') {
    return face === 'inside' ? ([heightMm, wallMm] as const) : ([wallMm - heightMm, 0] as const);
  }
  const [low, high] = [(middleMm ?? 0) - heightMm / 2, (middleMm ?? 0) + heightMm / 2];
  return low <= wallMm - high ? ([low, 0] as const) : ([high, wallMm] as const);
}

/** Length of the measured flaw, drawn outside the wall on the flaw's side. */
function lengthOf({ kind, face, lengthMm }: NamedOutline, frame: Frame): Dimension {
  const half = (lengthMm * frame.scale) / 2;
  const above = kind === 'surface' && face === 'outside';
  const y = above ? frame.wall.top - 26 : frame.wall.bottom + 29;
  return {
    x1: frame.middleX - half,
    x2: frame.middleX + half,
    y1: y,
    y2: y,
    text: `2c ${Math.round(lengthMm * 10) / 10} mm`,
  };
}

function scaleBarOf(wallMm: number, { scale, wall }: Frame, width: number): Dimension {
  const bar = roundStep(Math.min(wallMm / 2, 120 / scale));
  const y = wall.bottom + BAND + 12;
  return { x1: width - 12 - bar * scale, x2: width - 12, y1: y, y2: y, text: `${bar} mm` };
}
