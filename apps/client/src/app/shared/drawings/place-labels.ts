/** A point of a drawing with the words that belong to it. */
export interface LabelledPoint {
  readonly x: number;
  readonly y: number;
  readonly text: string;
}

export interface PlacedLabel extends LabelledPoint {
  readonly anchor: 'start' | 'middle' | 'end';
  readonly labelX: number;
  readonly labelY: number;
}

export interface Box {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

/** Width of an average letter and height of a line at the drawings' lettering of 11 px. */
export const LETTER = 6.1;
export const LINE = 14;
const GAP = 9;

/**
 * Sets each label beside its point: to the right, left, below or above, wherever it stays inside and covers neither a
 * label already set nor a point. Where all is taken it goes to the side with the least cover.
 */
export function placeLabels(points: readonly LabelledPoint[], inside: Box): PlacedLabel[] {
  const taken: Box[] = points.map(({ x, y }) => ({
    left: x - 6,
    right: x + 6,
    top: y - 6,
    bottom: y + 6,
  }));
  return points.map((point, own) => {
    const choices = sides(point).map((label) => {
      const box = boxOf(label);
      const cover = taken.reduce((sum, other, i) => sum + (i === own ? 0 : overlap(box, other)), 0);
      return { label, box, cover: cover + outside(box, inside) };
    });
    const best = choices.reduce((low, each) => (each.cover < low.cover ? each : low));
    taken.push(best.box);
    return best.label;
  });
}

function sides(point: LabelledPoint): PlacedLabel[] {
  const { x, y } = point;
  const middle = y + 4;
  return [
    { ...point, anchor: 'start', labelX: x + GAP, labelY: middle },
    { ...point, anchor: 'end', labelX: x - GAP, labelY: middle },
    { ...point, anchor: 'middle', labelX: x, labelY: y + GAP + LINE - 4 },
    { ...point, anchor: 'middle', labelX: x, labelY: y - GAP },
    { ...point, anchor: 'start', labelX: x + GAP, labelY: middle + LINE },
    { ...point, anchor: 'end', labelX: x - GAP, labelY: middle - LINE },
  ];
}

function boxOf({ anchor, labelX, labelY, text }: PlacedLabel): Box {
  const width = textWidth(text);
  const left = anchor === 'start' ? labelX : anchor === 'end' ? labelX - width : labelX - width / 2;
  return { left, right: left + width, top: labelY - LINE + 3, bottom: labelY + 3 };
}

/** About how wide a text stands at 11 px. */
export const textWidth = (text: string): number => text.length * LETTER;

function overlap(one: Box, other: Box): number {
  const width = Math.min(one.right, other.right) - Math.max(one.left, other.left);
  const height = Math.min(one.bottom, other.bottom) - Math.max(one.top, other.top);
  return width > 0 && height > 0 ? width * height : 0;
}

/** Area of a box that lies outside another. */
function outside(box: Box, inside: Box): number {
  const area = (box.right - box.left) * (box.bottom - box.top);
  return area - overlap(box, inside);
}
