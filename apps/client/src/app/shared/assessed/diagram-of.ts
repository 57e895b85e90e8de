import type { GrowthState } from '@ligament/domain/assessment/assessment-outcome';
import type { TwinTable } from '../drawing/twin-table';
import type { DiagramDrawing } from '../drawings/diagram-geometry';
import { dayText } from '../format/day-text';
import type { AssessedCase } from './assessed-case';
import { atLimit, atNextInspection } from './milestones';

/** The failure assessment diagram of an assessed flaw. */
export function diagramOf(each: AssessedCase): DiagramDrawing {
  const { outcome } = each;
  const next = atNextInspection(each);
  const end = atLimit(each);
  return {
    line: outcome.line,
    lrMax: outcome.lrMax,
    now: { lr: outcome.lr, kr: outcome.kr, label: 'now' },
    outside: outcome.verdict === 'not acceptable',
    path: outcome.path.map(ratios),
    next: next ? { ...ratios(next.state), label: 'next inspection' } : null,
    limit: end ? { ...ratios(end.state), label: dayText(end.on) } : null,
  };
}

const ratios = ({ lr, kr }: GrowthState) => ({ lr, kr });

/** The same numbers as a table: the flaw on its way, and the line it is held against. */
export function diagramTable({ outcome }: AssessedCase): TwinTable {
  return {
    columns: [
      { label: 'What' },
      { label: 'After', unit: 'years', digits: 2 },
      { label: 'Lr', digits: 4 },
      { label: 'Kr', digits: 4 },
      { label: 'Greatest K', unit: 'MPa√m', digits: 2 },
    ],
    rows: [
      ...outcome.path.map((state) => ['flaw', state.years, state.lr, state.kr, state.kMaxMPaSqrtM]),
      ...outcome.line.map(({ lr, kr }) => ['line, Option 1', null, lr, kr, null]),
    ],
  };
}

/** The outlines of the section view as a table. */
export function sectionTable(each: AssessedCase): TwinTable {
  const { input, outcome } = each;
  const [now, next, end] = [outcome.path[0], atNextInspection(each), atLimit(each)];
  const row = (what: string, on: string, state: GrowthState | null | undefined) =>
    state
      ? [[what, on, state.kind, state.heightMm, state.lengthMm, state.ligamentMm] as const]
      : [];
  const { kind, heightMm, lengthMm } = input.flaw;
  return {
    columns: [
      { label: 'Flaw' },
      { label: 'On' },
      { label: 'Kind' },
      { label: 'Height', unit: 'mm' },
      { label: 'Length', unit: 'mm' },
      { label: 'Ligament', unit: 'mm' },
    ],
    rows: [
      ['measured', each.inspectedOn, kind, heightMm.value, lengthMm.value, null],
      ...row('assessed', each.inspectedOn, now),
      ...row('expected at next inspection', next?.on ?? '', next?.state),
      ...row('end of growth', end?.on ?? '', end?.state),
    ],
  };
}
