import type { ReinspectionRow, ReinspectionView } from '@ligament/domain/contract/reinspections';
import { daysAfter, daysBetween } from '@ligament/domain/scheduling/calendar-date';
import { fitsWindow } from '@ligament/domain/scheduling/fit-to-window';
import { urgencyOf } from '@ligament/domain/scheduling/urgency';
import type { Clock } from '../../clock';
import type { Database } from '../../db/database';
import { notFound } from '../../http/failure';
import { remindersOf } from '../reminders/reminders-of';
import { windowsOfUnit } from '../shutdown-windows/windows-of-unit';
import { currentSiteRules } from '../site-rules/current-site-rules';
import { todayAt } from '../site/site-clock';
import {
  reinspectionListRepository,
  type ReinspectionListRow,
} from './reinspection-list.repository';

/** A row of the due list with its urgency and how it stands, in words. */
export function reinspectionRow(
  row: ReinspectionListRow,
  today: string,
  dueSoonDays: number,
): ReinspectionRow {
  const urgency = urgencyOf(row.dueOn, today, dueSoonDays);
  return {
    ...row,
    urgency,
    daysLeft: daysBetween(today, row.dueOn),
    fit: standing(row, urgency === 'overdue'),
  };
}

function standing(row: ReinspectionListRow, overdue: boolean): string {
  if (row.state === 'done') return 'done';
  if (row.state === 'cancelled') return 'cancelled';
  const late = overdue ? 'overdue, ' : '';
  if (row.plannedOn && row.onStream) return `${late}planned on-stream on ${row.plannedOn}`;
  if (row.plannedOn) return `${late}planned in ${row.windowCode ?? 'a window'} on ${row.plannedOn}`;
  if (row.nextWindow) return `${late}not planned; ${row.nextWindow} comes before the date`;
  return overdue ? 'overdue, no window' : 'no window before the date';
}

/** One re-inspection with the candidates of its date, the windows of its unit and its reminders. */
export async function readReinspectionView(
  db: Database,
  clock: Clock,
  siteId: string,
  id: string,
): Promise<ReinspectionView> {
  const row = await reinspectionListRepository(db).byId(siteId, id);
  if (!row) throw notFound('re-inspection');
  const { rules } = await currentSiteRules(db, siteId);
  const today = await todayAt(db, clock, siteId);
  const windows = await windowsOfUnit(db, siteId, row.unitId, today);
  return {
    ...reinspectionRow(row, today, rules.dueSoonDays),
    planNote: row.planNote,
    latestFinishOn: daysAfter(row.dueOn, -rules.reportingDays),
    candidates: row.candidates as ReinspectionView['candidates'],
    windows: windows.map((window) => {
      const { fit, finishBy } = fitsWindow(row.dueOn, window, rules.reportingDays);
      return {
        ...window,
        fit,
        words: fitWords(fit, finishBy),
        scopeFrozen: window.scopeFreezeOn !== null && window.scopeFreezeOn < today,
      };
    }),
    reminders: await remindersOf(db, id),
  };
}

const fitWords = (fit: 'fits' | 'partly' | 'too late', finishBy: string): string =>
  ({
    fits: 'the whole window lies before the latest finish',
    partly: `must be finished by ${finishBy}, so in its first days`,
    'too late': `starts after the latest finish on ${finishBy}`,
  })[fit];
