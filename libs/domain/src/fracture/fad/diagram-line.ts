import type { Refusal } from '../../geometry/refusal';
import type { DiagramMaterial } from './option-one';

/** One point of the drawn line. */
export interface LinePoint {
  readonly lr: number;
  readonly kr: number;
}

/** A place where the line drops at one load ratio. */
export interface DiagramJump {
  readonly lr: number;
  /** Height just below the load ratio. */
  readonly before: number;
  /** Height at it. */
  readonly after: number;
}

/** What a material must be for a line to hold, as data. */
export interface DiagramLimit {
  readonly name: string;
  readonly text: string;
  readonly min: number;
  readonly max: number;
  readonly measure: (material: DiagramMaterial) => number;
  readonly source: string;
  /** Path of the input that decides it. */
  readonly input: string;
  readonly instead: string;
}

/** One line of the diagram, whatever it is made from. */
export interface DiagramLine {
  readonly key: string;
  readonly title: string;
  readonly source: string;
  readonly limits: readonly DiagramLimit[];
  /** Cut-off: nothing is acceptable at or beyond it. */
  readonly lrMax: number;
  /** Every drop of the line below its cut-off, in order. */
  readonly jumps: readonly DiagramJump[];
  /** Height at a load ratio; it goes on beyond the cut-off, so that searches stay continuous. */
  readonly height: (lr: number) => number;
}

/** The line as points from no load to the cut-off and down to the axis, both ends of every jump among them. */
export function linePoints(
  { height, jumps, lrMax }: DiagramLine,
  intervals = 60,
): readonly LinePoint[] {
  const drawn = jumps.filter(({ lr }) => lr <= lrMax);
  const even = Array.from({ length: intervals + 1 }, (_, i) => (lrMax * i) / intervals);
  const curve = even
    .filter((lr) => drawn.every((jump) => jump.lr !== lr))
    .map((lr) => ({ lr, kr: height(lr) }));
  const ends = drawn.flatMap(({ lr, before, after }) => [
    { lr, kr: before },
    { lr, kr: after },
  ]);
  const points = [...curve, ...ends].sort((a, b) => a.lr - b.lr || b.kr - a.kr);
  return [...points, { lr: lrMax, kr: 0 }];
}

/** Which limits of a line a material breaks; a value that is not a number meets none. */
export function brokenLimits(line: DiagramLine, material: DiagramMaterial): readonly Refusal[] {
  return line.limits.flatMap(({ name, text, min, max, measure, input, instead }) => {
    const value = measure(material);
    if (value >= min && value <= max) return [];
    const shown = Number.isFinite(value) ? value : String(value);
    const message = `${name} is ${shown}; ${line.title} holds for ${text}.`;
    return [{ input, limit: text, value: shown, message, instead }];
  });
}
