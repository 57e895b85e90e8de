import { createHash } from 'node:crypto';
import type { Role } from '@ligament/domain/contract/policy';
import type { SiteRules } from '@ligament/domain/contract/site-rules';
import { daysAfter } from '@ligament/domain/scheduling/calendar-date';
import { reminderStage } from '@ligament/domain/scheduling/reminder-stage';
import type { Transaction } from '../../db/database';
import type { Deps } from '../../deps';
import { systemActor } from '../../http/actor';
import { siteDay } from '../../http/site-day';
import { queueMail } from '../mails/queue-mail';
import { writeHistory } from '../history/write-history';
import { reinspectionRow } from '../reinspections/reinspection-view';
import type { ReinspectionListRow } from '../reinspections/reinspection-list.repository';
import { openReinspectionsUntil } from '../reinspections/open-until';
import { currentSiteRules } from '../site-rules/current-site-rules';
import { reminderRecipients, type Recipient } from './reminder-recipients';
import { reminderRepository } from './reminder.repository';
import { reminderLetter } from './reminder-text';
import { allSites, type SiteRow } from '../site/all-sites';

/** Inspectors are told when the crew has to be booked, not before [day]. */
const INSPECTOR_LEAD_DAYS = 60;

/** Queues every reminder whose stage is reached; each exists once, whoever runs this and however often. */
export async function queueReminders(deps: Deps): Promise<number> {
  let queued = 0;
  for (const site of await allSites(deps.db)) queued += await queueForSite(deps, site);
  return queued;
}

async function queueForSite({ db, clock, config }: Deps, site: SiteRow): Promise<number> {
  const { rules } = await currentSiteRules(db, site.id);
  const now = clock.now();
  const today = siteDay(now, site.timeZone);
  const recipients = await reminderRecipients(db, site.id, today);
  const longest = Math.max(...rules.reminderLeadDays);
  let queued = 0;
  for (const task of await openReinspectionsUntil(db, site.id, daysAfter(today, longest))) {
    const stage = reminderStage(task.dueOn, today, rules);
    if (stage === null) continue;
    const concerned = recipients.filter(({ role }) => isConcerned(role, stage));
    queued += await db.transaction((tx) =>
      queueForTask(
        tx,
        { site, rules, now, today, publicUrl: config.publicUrl },
        task,
        stage,
        concerned,
      ),
    );
  }
  return queued;
}

const isConcerned = (role: Role, stage: number): boolean =>
  role !== 'inspector' || stage <= INSPECTOR_LEAD_DAYS;

interface Occasion {
  readonly site: SiteRow;
  readonly rules: SiteRules;
  readonly now: Date;
  readonly today: string;
  readonly publicUrl: string;
}

async function queueForTask(
  tx: Transaction,
  occasion: Occasion,
  task: ReinspectionListRow,
  stage: number,
  recipients: readonly Recipient[],
): Promise<number> {
  const { site, now } = occasion;
  const letter = letterAbout(task, occasion);
  const added: string[] = [];
  for (const person of recipients) {
    const key = `${task.id}:${task.dueOn}:${stage}:${person.id}`;
    const isNew = await reminderRepository(tx).addOnce({
      siteId: site.id,
      reinspectionId: task.id,
      dueOn: task.dueOn,
      leadDays: stage,
      recipientId: person.id,
      recipientEmail: person.email,
      state: 'queued',
      mailId: mailIdOf(key),
      createdAt: now,
    });
    if (!isNew) continue;
    await queueMail(tx, {
      ...letter,
      id: mailIdOf(key),
      siteId: site.id,
      messageId: `<reminder.${hash(key).slice(0, 24)}@ligament>`,
      kind: 'reminder',
      recipient: person.email,
      nextAttemptAt: now,
      createdAt: now,
    });
    added.push(person.name);
  }
  if (added.length > 0) {
    await writeHistory(tx, systemActor(site.id), now, {
      action: 'reminder.queued',
      entity: 'reminder',
      entityId: task.id,
      componentId: task.componentId,
      flawId: task.flawId,
      summary: `Reminder of ${task.task}, due on ${task.dueOn} (${stage < 0 ? `${-stage} days overdue` : `${stage} days before`}), to ${added.join(', ')}`,
    });
  }
  return added.length;
}

function letterAbout(task: ReinspectionListRow, { site, rules, today, publicUrl }: Occasion) {
  const row = reinspectionRow(task, today, rules.dueSoonDays);
  return reminderLetter({
    ...row,
    standing: row.fit,
    latestFinishOn: daysAfter(task.dueOn, -rules.reportingDays),
    siteName: site.name,
    link: `${publicUrl}/schedule/${task.id}`,
  });
}

const hash = (text: string): string => createHash('sha256').update(text).digest('hex');

/** Identifier of the mail of a reminder, derived from what it is about, so that a repeat is the same mail. */
function mailIdOf(key: string): string {
  const hex = hash(key);
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-4${hex.slice(13, 16)}-8${hex.slice(17, 20)}-${hex.slice(20, 32)}`;
}
