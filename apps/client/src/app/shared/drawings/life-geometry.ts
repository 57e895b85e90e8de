import { daysAfter, daysBetween } from '@ligament/domain/scheduling/calendar-date';
import type { Tick } from './diagram-geometry';
import { axisTicks, roundStep } from './axis-ticks';
import type { LifeDrawing, MeasuredSize } from './life-drawing';
import { textWidth } from './place-labels';

export interface Mark {
  readonly x: number;
  readonly label: string;
}

export interface LifeGeometry {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  readonly years: readonly Tick[];
  readonly sizes: readonly Tick[];
  readonly windows: readonly (Mark & { readonly width: number; readonly named: boolean })[];
  readonly measured: readonly (Mark & {
    readonly y: number;
    readonly low: number;
    readonly high: number;
  })[];
  readonly predicted: string;
  readonly limitY: number | null;
  readonly limit: (Mark & { readonly y: number; readonly flip: boolean }) | null;
  readonly due: (Mark & { readonly flip: boolean; readonly basis: string }) | null;
  readonly events: readonly (Mark & { readonly flip: boolean })[];
  readonly today: (Mark & { readonly flip: boolean }) | null;
  /** Whether the limit lies later than the axis shows. */
  readonly goesOn: boolean;
}

const HEIGHT = 264;
const MARGIN = { left: 52, right: 16, top: 64, bottom: 30 };
/** A life longer than this after the last inspection is not drawn to its end: the next years would be squeezed. */
const LONGEST_AHEAD_DAYS = 20 * 365.25;
const YEAR = 365.25;

export function lifeGeometry(drawing: LifeDrawing, width: number): LifeGeometry {
  const box = {
    left: MARGIN.left,
    right: width - MARGIN.right,
    top: MARGIN.top,
    bottom: HEIGHT - MARGIN.bottom,
  };
  const span = spanOf(drawing);
  const days = daysBetween(span.from, span.to);
  const x = (day: string) =>
    box.left + (daysBetween(span.from, day) / days) * (box.right - box.left);
  const seen = (day: string) => day >= span.from && day <= span.to;
  const tallest = tallestOf(drawing);
  const y = (mm: number) => box.bottom - (mm / tallest) * (box.bottom - box.top);
  const flips = (at: number, words: string) => at + textWidth(words) + 10 > box.right;
  const mark = (on: string, label: string) => ({ x: x(on), label, flip: flips(x(on), label) });
  const { limit, due, limitMm } = drawing;
  return {
    width,
    height: HEIGHT,
    ...box,
    years: yearTicks(span, width).map((on) => ({ at: x(on), text: on.slice(0, 4) })),
    sizes: axisTicks(tallest, 4).map((mm) => ({ at: y(mm), text: `${mm} mm` })),
    windows: windowsOf(drawing, span, x),
    measured: drawing.measured.map((each) => measuredMark(each, x, y, tallest)),
    predicted: predictedPath(drawing, span.to, x, y),
    limitY: limitMm === null ? null : y(limitMm),
    limit:
      limit && seen(limit.on)
        ? { ...mark(limit.on, limit.label), y: y(limitMm ?? lastHeight(drawing)) }
        : null,
    due: due && seen(due.on) ? { ...mark(due.on, due.label), basis: due.basis } : null,
    events: drawing.events.filter(({ on }) => seen(on)).map(({ on, label }) => mark(on, label)),
    today: seen(drawing.today) ? mark(drawing.today, 'today') : null,
    goesOn: limit !== null && !seen(limit.on),
  };
}

interface Span {
  readonly from: string;
  readonly to: string;
}

/** From before the first finding to after the last day that matters. */
function spanOf({ measured, limit, due, today, predicted }: LifeDrawing): Span {
  const inspected = measured.at(-1)?.on ?? today;
  const first = [measured[0]?.on ?? inspected, today].sort()[0] ?? today;
  const farthest = daysAfter(inspected, Math.round(LONGEST_AHEAD_DAYS));
  const ends = [inspected, today, due?.on, limit?.on, predicted.at(-1)?.on]
    .filter((day) => day !== undefined)
    .map((day) => (day > farthest ? farthest : day))
    .sort();
  const last = ends.at(-1) ?? today;
  const pad = Math.max(90, Math.round(daysBetween(first, last) * 0.05));
  return { from: daysAfter(first, -pad), to: daysAfter(last, pad) };
}

function tallestOf({ measured, limitMm, predicted, wallMm }: LifeDrawing): number {
  const sizes = [
    ...measured.map(({ heightMm, errorMm }) => heightMm + errorMm),
    ...predicted.map(({ heightMm }) => heightMm),
    limitMm ?? 0,
  ];
  return Math.min(Math.max(...sizes, 1) * 1.08, Math.max(wallMm, 1));
}

const lastHeight = ({ predicted }: LifeDrawing) => predicted.at(-1)?.heightMm ?? 0;

/** First days of years, as many as have room. */
function yearTicks({ from, to }: Span, width: number): string[] {
  const [first, last] = [Number(from.slice(0, 4)) + 1, Number(to.slice(0, 4))];
  const room = Math.max(2, Math.floor((width - MARGIN.left - MARGIN.right) / 56));
  const step = Math.max(1, roundStep(daysBetween(from, to) / YEAR / room));
  const start = Math.ceil(first / step) * step;
  const count = Math.max(0, Math.floor((last - start) / step) + 1);
  return Array.from({ length: count }, (_, i) => `${start + i * step}-01-01`);
}

function windowsOf({ windows }: LifeDrawing, { from, to }: Span, x: (day: string) => number) {
  let free = Number.NEGATIVE_INFINITY;
  return [...windows]
    .filter(({ startsOn, endsOn }) => endsOn >= from && startsOn <= to)
    .sort((a, b) => a.startsOn.localeCompare(b.startsOn))
    .map(({ startsOn, endsOn, label }) => {
      const left = x(startsOn < from ? from : startsOn);
      const width = Math.max(3, x(endsOn > to ? to : endsOn) - left);
      const half = textWidth(label) / 2;
      const named = left + width / 2 - half > free;
      if (named) free = left + width / 2 + half + 6;
      return { x: left, width, label, named };
    });
}

function measuredMark(
  { on, heightMm, errorMm, label }: MeasuredSize,
  x: (day: string) => number,
  y: (mm: number) => number,
  tallest: number,
) {
  return {
    x: x(on),
    label,
    y: y(heightMm),
    low: y(Math.max(0, heightMm - errorMm)),
    high: y(Math.min(tallest, heightMm + errorMm)),
  };
}

function predictedPath(
  { predicted }: LifeDrawing,
  to: string,
  x: (day: string) => number,
  y: (mm: number) => number,
): string {
  return predicted
    .filter(({ on }) => on <= to)
    .map(({ on, heightMm }, i) => `${i ? 'L' : 'M'} ${text(x(on))} ${text(y(heightMm))}`)
    .join(' ');
}

const text = (value: number) => String(Math.round(value * 100) / 100);
