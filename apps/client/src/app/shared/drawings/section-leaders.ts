import type { NamedOutline, Outline } from './section-drawing';
import { type Frame, goesThrough, reachOf, yOf } from './section-frame';
import { spreadLabels } from './spread-labels';

/** The part an outline plays in the drawing. */
export type Part = 'limiting' | 'expected' | 'assessed' | 'measured';

export interface LeaderLabel {
  readonly part: Part;
  readonly text: string;
  readonly fromX: number;
  readonly fromY: number;
  readonly x: number;
  readonly y: number;
}

/** Angles above the flaw's long axis at which a leader may leave its outline, the best first. */
const LEADER_ANGLES: Readonly<Record<Part, readonly number[]>> = {
  limiting: [40, 62, 20, 78, 8],
  expected: [34, 50, 20, 70, 8],
  assessed: [26, 14, 40, 60],
  measured: [14, 26, 6, 45],
};

/** Labels beside the drawing, each with a leader from a visible place of its outline. */
export function leaderLabels(
  parts: readonly (readonly [Part, NamedOutline])[],
  frame: Frame,
): LeaderLabel[] {
  const x = frame.edge + 12;
  const from = parts.map(([part, outline], i) => {
    const covering = parts.slice(i + 1).map(([, over]) => over);
    const place = leaderPlace(outline, LEADER_ANGLES[part], covering, frame.wallMm);
    return {
      part,
      text: outline.label,
      fromX: Math.min(frame.middleX + place.alongMm * frame.scale, frame.edge),
      fromY: yOf(place.upMm, frame),
      x,
    };
  });
  const rows = spreadLabels(
    from.map(({ fromY }) => fromY),
    18,
    { from: frame.wall.top + 12, to: frame.wall.bottom - 8 },
  );
  return from.map((label, i) => ({ ...label, y: rows[i] ?? label.fromY }));
}

/** A place of the outline that no other outline lies over, in millimetres from the middle and the inside surface. */
function leaderPlace(
  outline: Outline,
  angles: readonly number[],
  covering: readonly Outline[],
  wallMm: number,
) {
  const places = angles.map((angle) => {
    const radians = (angle * Math.PI) / 180;
    return {
      alongMm: reachOf(outline) * Math.cos(radians),
      upMm: heightAt(outline, Math.sin(radians), wallMm),
    };
  });
  const free = places.find((place) => !covering.some((over) => holds(over, place, wallMm)));
  return free ?? places[0] ?? { alongMm: 0, upMm: 0 };
}

function holds(
  outline: Outline,
  { alongMm, upMm }: { readonly alongMm: number; readonly upMm: number },
  wallMm: number,
): boolean {
  const { kind, face, heightMm, middleMm } = outline;
  const along = kind === 'extended surface' ? 0 : alongMm / reachOf(outline);
  if (goesThrough(outline)) return Math.abs(along) < 1;
  const [centre, radius] =
    kind === 'embedded'
      ? [middleMm ?? 0, heightMm / 2]
      : [face === 'inside' ? 0 : wallMm, heightMm];
  return along ** 2 + ((upMm - centre) / radius) ** 2 < 1;
}

/** Height above the inside surface of a point of the outline, by the sine of its angle [mm]. */
function heightAt(
  { kind, face, heightMm, middleMm }: Outline,
  sine: number,
  wallMm: number,
): number {
  if (kind === 'embedded') return (middleMm ?? 0) + (heightMm / 2) * sine;
  return face === 'outside' ? wallMm - heightMm * sine : heightMm * sine;
}
