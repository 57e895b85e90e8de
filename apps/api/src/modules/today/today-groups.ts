import type { Role } from '@ligament/domain/contract/policy';
import type { TodayGroup, TodayItem } from '@ligament/domain/contract/today';
import { daysAfter, daysBetween } from '@ligament/domain/scheduling/calendar-date';
import type { Database } from '../../db/database';
import { countUndelivered } from '../mails/count-undelivered';
import { todayRepository } from './today.repository';

/** Who looks at the day, and which day it is. */
export interface Onlooker {
  readonly siteId: string;
  readonly personId: string;
  readonly role: Role;
  readonly today: string;
  readonly dueSoonDays: number;
}

type Builder = (db: Database, who: Onlooker) => Promise<TodayGroup>;

const FREEZE_NOTICE_DAYS = 60;

const group = (
  key: string,
  title: string,
  link: string,
  count: number,
  items: readonly TodayItem[],
): TodayGroup => ({
  key,
  title,
  link,
  count,
  items: [...items],
});

const overdue: Builder = async (db, { siteId, today }) => {
  const { rows, count } = await todayRepository(db, siteId).overdue(today);
  return group(
    'overdue',
    'Overdue re-inspections',
    '/schedule?urgency=overdue',
    count,
    rows.map((row) => ({
      title: row.tag,
      subtitle: row.task,
      why: `due on ${row.dueOn}, ${daysBetween(row.dueOn, today)} days ago${row.plannedOn ? `, planned on ${row.plannedOn}` : ', not planned'}`,
      link: `/schedule/${row.id}`,
      tone: 'bad',
    })),
  );
};

const dueUnplanned: Builder = async (db, { siteId, today, dueSoonDays }) => {
  const { rows, count } = await todayRepository(db, siteId).dueUnplanned(
    today,
    daysAfter(today, dueSoonDays),
  );
  return group(
    'due',
    'Due soon and not planned',
    '/schedule?urgency=due%20soon&state=unplanned',
    count,
    rows.map((row) => ({
      title: row.tag,
      subtitle: row.task,
      why: `due on ${row.dueOn}, in ${daysBetween(today, row.dueOn)} days`,
      link: `/schedule/${row.id}`,
      tone: 'warn',
    })),
  );
};

const comingUp: Builder = async (db, { siteId, today }) => {
  const { rows, count } = await todayRepository(db, siteId).planned(today, daysAfter(today, 90));
  return group(
    'planned',
    'Planned in the next 90 days',
    '/schedule?state=planned',
    count,
    rows.map((row) => ({
      title: row.tag,
      subtitle: row.task,
      why: `planned on ${row.plannedOn ?? ''}, due on ${row.dueOn}`,
      link: `/schedule/${row.id}`,
      tone: 'plain',
    })),
  );
};

const notAcceptable: Builder = async (db, { siteId }) => {
  const { rows, count } = await todayRepository(db, siteId).notAcceptable();
  return group(
    'not-acceptable',
    'Flaws that are not acceptable',
    '/flaws?state=not%20acceptable',
    count,
    rows.map((row) => ({
      title: row.number,
      subtitle: row.description,
      why: 'not acceptable: repair or re-assess before service',
      link: `/flaws/${row.id}`,
      tone: 'bad',
    })),
  );
};

const newFlaws: Builder = async (db, { siteId }) => {
  const { rows, count } = await todayRepository(db, siteId).newFlaws();
  return group(
    'new',
    'New flaws without an assessment',
    '/flaws?state=new',
    count,
    rows.map((row) => ({
      title: row.number,
      subtitle: row.description,
      why: `mechanism: ${row.mechanism}`,
      link: `/flaws/${row.id}`,
      tone: 'warn',
    })),
  );
};

const toCheck: Builder = async (db, { siteId, personId }) => {
  const { rows, count } = await todayRepository(db, siteId).toCheck(personId);
  return group(
    'to-check',
    'Waiting for your check',
    '/flaws?state=under%20assessment',
    count,
    rows.map((row) => ({
      title: `${row.number}, revision ${row.revision}`,
      subtitle: `by ${row.author}`,
      why: `sent on ${row.updatedAt.toISOString().slice(0, 10)}`,
      link: `/assessments/${row.id}`,
      tone: 'warn',
    })),
  );
};

const mine: Builder = async (db, { siteId, personId }) => {
  const { rows, count } = await todayRepository(db, siteId).mine(personId);
  return group(
    'mine',
    'Your drafts and what was returned to you',
    '/flaws?state=under%20assessment',
    count,
    rows.map((row) => ({
      title: `${row.number}, revision ${row.revision}`,
      subtitle: row.returnReason ? 'returned' : 'draft',
      why: row.returnReason || 'not sent for check yet',
      link: `/assessments/${row.id}`,
      tone: row.returnReason ? 'warn' : 'plain',
    })),
  );
};

const reports =
  (
    key: string,
    title: string,
    link: string,
    list: 'submittedReports' | 'openReports' | 'plannedInspections',
    tone: TodayItem['tone'],
  ): Builder =>
  async (db, { siteId }) => {
    const { rows, count } = await todayRepository(db, siteId)[list]();
    return group(
      key,
      title,
      link,
      count,
      rows.map((row) => ({
        title: `${row.reportNo}, ${row.tag}`,
        subtitle: row.technique,
        why: row.inspectedOn
          ? `examined on ${row.inspectedOn}, ${row.state}`
          : `planned for ${row.plannedOn ?? 'no day yet'}`,
        link: `/inspections/${row.id}`,
        tone,
      })),
    );
  };

const submittedReports = reports(
  'reports',
  'Reports to accept',
  '/inspections?state=submitted',
  'submittedReports',
  'warn',
);
const openReports = reports(
  'open-reports',
  'Reports to finish',
  '/inspections?state=in%20progress',
  'openReports',
  'warn',
);
const plannedInspections = reports(
  'planned-inspections',
  'Planned inspections',
  '/inspections?state=planned',
  'plannedInspections',
  'plain',
);

const previews: Builder = async (db, { siteId }) => {
  const { rows, count } = await todayRepository(db, siteId).previews();
  return group(
    'previews',
    'Files read but not committed',
    '/inspections',
    count,
    rows.map((row) => ({
      title: `${row.reportNo}, ${row.tag}`,
      subtitle: `uploaded on ${row.createdAt.toISOString().slice(0, 10)}`,
      why: 'nothing is stored as findings until it is committed',
      link: `/inspections/imports/${row.id}`,
      tone: 'warn',
    })),
  );
};

const windows: Builder = async (db, { siteId, today }) => {
  const rows = await todayRepository(db, siteId).freezes(
    today,
    daysAfter(today, FREEZE_NOTICE_DAYS),
  );
  return group(
    'windows',
    'Shutdown windows coming up',
    '/schedule/windows',
    rows.length,
    rows.map((row) => {
      const freeze =
        row.scopeFreezeOn && row.scopeFreezeOn >= today
          ? daysBetween(today, row.scopeFreezeOn)
          : null;
      return {
        title: row.code,
        subtitle: `starts on ${row.startsOn}`,
        why:
          freeze === null
            ? `scope is frozen; starts in ${daysBetween(today, row.startsOn)} days`
            : `scope freeze in ${freeze} days`,
        link: `/schedule/windows/${row.id}`,
        tone: freeze !== null && freeze <= 30 ? ('warn' as const) : ('plain' as const),
      };
    }),
  );
};

const undelivered: Builder = async (db, { siteId }) => {
  const count = await countUndelivered(db, siteId);
  return group(
    'undelivered',
    'Mail that could not be delivered',
    '/mailbox?show=undelivered',
    count,
    [],
  );
};

const invitations: Builder = async (db, { siteId }) => {
  const { rows, count } = await todayRepository(db, siteId).invitations();
  return group(
    'invitations',
    'Invitations not accepted yet',
    '/people',
    count,
    rows.map((row) => ({
      title: row.name,
      subtitle: row.email,
      why: 'has not chosen a password yet',
      link: `/people/${row.id}`,
      tone: 'plain',
    })),
  );
};

/** What each role is shown, the most pressing first. */
const BY_ROLE: Readonly<Record<Role, readonly Builder[]>> = {
  inspector: [openReports, previews, plannedInspections, overdue, comingUp],
  engineer: [notAcceptable, overdue, toCheck, mine, submittedReports, newFlaws, dueUnplanned],
  planner: [overdue, dueUnplanned, windows, undelivered, comingUp],
  operations: [notAcceptable, overdue, comingUp],
  auditor: [overdue, notAcceptable, newFlaws, undelivered],
  administrator: [invitations, undelivered, overdue],
};

/** Groups with something in them, in the order of the role. */
export async function todayGroups(db: Database, who: Onlooker): Promise<TodayGroup[]> {
  const groups: TodayGroup[] = [];
  for (const build of BY_ROLE[who.role]) groups.push(await build(db, who));
  return groups.filter(({ count }) => count > 0);
}
