import type { GrowthEvent, GrowthState } from '@ligament/domain/assessment/assessment-outcome';
import { yearsAfter } from '@ligament/domain/scheduling/calendar-date';
import type { TwinTable } from '../drawing/twin-table';
import type { LifeDrawing, MeasuredSize, NamedSpan } from '../drawings/life-drawing';
import { dayText } from '../format/day-text';
import type { AssessedCase } from './assessed-case';
import { assessedSize } from './size-words';
import { atLimit, limitWord } from './milestones';

/** What surrounds an assessed flaw in time. */
export interface LifeSurroundings {
  readonly measured: readonly MeasuredSize[];
  readonly windows: readonly NamedSpan[];
  /** Where the date comes from, in a few words. */
  readonly basis: string;
  readonly today: string;
}

/** The life line of an assessed flaw among its findings and the shutdown windows. */
export function lifeOf(each: AssessedCase, around: LifeSurroundings): LifeDrawing {
  const { input, outcome, inspectedOn, dueOn } = each;
  const end = atLimit(each);
  const size = assessedSize(each);
  const extent = ({ heightMm, lengthMm }: GrowthState) => (size.byHeight ? heightMm : lengthMm);
  const limiting = size.byHeight ? outcome.limitingHeightMm : (outcome.limitingLengthMm ?? null);
  return {
    wallMm: input.wall.thicknessMm.value,
    quantity: size.byHeight ? size.heightWord : 'length',
    // findings are kept by their height: what only grows in length has none to show
    measured: size.byHeight ? around.measured : [],
    predicted: outcome.path.map((state) => ({
      on: yearsAfter(inspectedOn, state.years),
      heightMm: extent(state),
    })),
    limitMm: end ? extent(end.state) : limiting,
    limit: end ? { on: end.on, label: `${limitWord(outcome.life.end)}, ${dayText(end.on)}` } : null,
    due: dueOn ? { on: dueOn, label: `inspect by ${dayText(dueOn)}`, basis: around.basis } : null,
    windows: around.windows,
    events: outcome.events.map((event) => ({
      on: yearsAfter(inspectedOn, event.years),
      label: eventWords(event),
    })),
    today: around.today,
  };
}

const eventWords = ({ from, to }: GrowthEvent) => {
  if (to === 'through-wall') return 'through the wall';
  return from === to ? 'joins its neighbour' : 'breaks the surface';
};

const QUANTITY = { depth: 'Depth', height: 'Height', length: 'Length' } as const;

/** The life line as numbers. */
export function lifeTable(drawing: LifeDrawing): TwinTable {
  return {
    columns: [
      { label: 'Day' },
      { label: 'What' },
      { label: QUANTITY[drawing.quantity], unit: 'mm' },
      { label: 'Sizing error', unit: '± mm' },
    ],
    rows: [
      ...drawing.measured.map(({ on, label, heightMm, errorMm }) => [
        on,
        `measured, ${label}`,
        heightMm,
        errorMm,
      ]),
      ...drawing.predicted.map(({ on, heightMm }) => [on, 'predicted', heightMm, null]),
      ...drawing.events.map(({ on, label }) => [on, label, null, null]),
      ...(drawing.due ? [[drawing.due.on, drawing.due.label, null, null]] : []),
      ...(drawing.limit ? [[drawing.limit.on, drawing.limit.label, drawing.limitMm, null]] : []),
      ...drawing.windows.map(({ startsOn, endsOn, label }) => [
        startsOn,
        `shutdown window ${label}, until ${endsOn}`,
        null,
        null,
      ]),
    ],
  };
}
