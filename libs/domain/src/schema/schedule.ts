import { sql } from 'drizzle-orm';
import {
  boolean,
  date,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  unique,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import {
  MAIL_STATES,
  REINSPECTION_STATES,
  REMINDER_STATES,
  TECHNIQUES,
  WINDOW_KINDS,
  WINDOW_STATES,
  type MailState,
  type ReinspectionState,
  type ReminderState,
  type Technique,
  type WindowState,
} from '../contract/vocabulary';
import { assessments } from './assessments';
import { at, createdAt, key, oneOf, updatedAt, version } from './columns';
import { components } from './components';
import { flaws } from './flaws';
import { inspections } from './inspections';
import { people } from './people';
import { sites, units } from './sites';

export const shutdownWindows = pgTable(
  'shutdown_windows',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    code: text('code').notNull(),
    name: text('name').notNull().default(''),
    kind: text('kind').$type<(typeof WINDOW_KINDS)[number]>().notNull(),
    startsOn: date('starts_on', { mode: 'string' }).notNull(),
    endsOn: date('ends_on', { mode: 'string' }).notNull(),
    scopeFreezeOn: date('scope_freeze_on', { mode: 'string' }),
    state: text('state').$type<WindowState>().notNull().default('planned'),
    version: version(),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
  },
  (t) => [
    unique('shutdown_windows_code').on(t.siteId, t.code),
    oneOf('shutdown_windows_kind', t.kind, WINDOW_KINDS),
    oneOf('shutdown_windows_state', t.state, WINDOW_STATES),
  ],
);

export const shutdownWindowUnits = pgTable(
  'shutdown_window_units',
  {
    windowId: uuid('window_id')
      .notNull()
      .references(() => shutdownWindows.id),
    unitId: uuid('unit_id')
      .notNull()
      .references(() => units.id),
  },
  (t) => [primaryKey({ columns: [t.windowId, t.unitId] })],
);

/** When somebody must look again. Due dates come from signed assessments or a site rule, never from the planner. */
export const reinspections = pgTable(
  'reinspections',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    componentId: uuid('component_id')
      .notNull()
      .references(() => components.id),
    /** Null for a re-inspection of a component without a known flaw. */
    flawId: uuid('flaw_id').references(() => flaws.id),
    assessmentId: uuid('assessment_id').references(() => assessments.id),
    task: text('task').notNull(),
    technique: text('technique').$type<Technique>().notNull(),
    dueOn: date('due_on', { mode: 'string' }).notNull(),
    /** Predicted limit; no date may lie after it. */
    limitOn: date('limit_on', { mode: 'string' }),
    basis: text('basis').notNull(),
    candidates: jsonb('candidates').$type<unknown>().notNull(),
    state: text('state').$type<ReinspectionState>().notNull().default('open'),
    onStream: boolean('on_stream').notNull().default(false),
    windowId: uuid('window_id').references(() => shutdownWindows.id),
    plannedOn: date('planned_on', { mode: 'string' }),
    plannedBy: uuid('planned_by').references(() => people.id),
    planNote: text('plan_note').notNull().default(''),
    doneInspectionId: uuid('done_inspection_id').references(() => inspections.id),
    version: version(),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
  },
  (t) => [
    // partial: lists and reminders ask only for what is still to be done
    index('reinspections_due')
      .on(t.siteId, t.dueOn)
      .where(sql`${t.state} not in ('done', 'cancelled')`),
    uniqueIndex('reinspections_one_open_per_flaw')
      .on(t.flawId)
      .where(sql`${t.state} not in ('done', 'cancelled')`),
    index('reinspections_component').on(t.componentId),
    oneOf('reinspections_state', t.state, REINSPECTION_STATES),
    oneOf('reinspections_technique', t.technique, TECHNIQUES),
  ],
);

/** One reminder to one person at one stage of one due date; the key makes a second one impossible. */
export const reminders = pgTable(
  'reminders',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    reinspectionId: uuid('reinspection_id')
      .notNull()
      .references(() => reinspections.id),
    dueOn: date('due_on', { mode: 'string' }).notNull(),
    /** Days before the due date; negative when overdue. */
    leadDays: integer('lead_days').notNull(),
    recipientId: uuid('recipient_id')
      .notNull()
      .references(() => people.id),
    recipientEmail: text('recipient_email').notNull(),
    state: text('state').$type<ReminderState>().notNull(),
    mailId: uuid('mail_id'),
    sentAt: at('sent_at'),
    acknowledgedAt: at('acknowledged_at'),
    acknowledgedBy: uuid('acknowledged_by').references(() => people.id),
    createdAt: createdAt(),
  },
  (t) => [
    unique('reminders_once').on(t.reinspectionId, t.dueOn, t.leadDays, t.recipientId),
    index('reminders_recent').on(t.siteId, t.createdAt),
    oneOf('reminders_state', t.state, REMINDER_STATES),
  ],
);

/** Mail to be sent: written in the transaction of the business change, sent by the mail job. */
export const outgoingMails = pgTable(
  'outgoing_mails',
  {
    id: key(),
    siteId: uuid('site_id').references(() => sites.id),
    /** Derived from what the mail is about, so that a repeat carries the same identifier. */
    messageId: text('message_id').notNull().unique(),
    kind: text('kind').$type<'reminder' | 'invitation' | 'password reset' | 'notice'>().notNull(),
    recipient: text('recipient').notNull(),
    subject: text('subject').notNull(),
    text: text('text').notNull(),
    html: text('html').notNull(),
    state: text('state').$type<MailState>().notNull().default('queued'),
    attempts: integer('attempts').notNull().default(0),
    nextAttemptAt: at('next_attempt_at').notNull().defaultNow(),
    leasedUntil: at('leased_until'),
    lastError: text('last_error').notNull().default(''),
    sentAt: at('sent_at'),
    createdAt: createdAt(),
  },
  (t) => [
    index('outgoing_mails_queue')
      .on(t.nextAttemptAt)
      .where(sql`${t.state} = 'queued'`),
    oneOf('outgoing_mails_state', t.state, MAIL_STATES),
  ],
);

/** What the built-in SMTP server received when no real one is set: readable in the product. */
export const receivedMails = pgTable(
  'received_mails',
  {
    id: key(),
    messageId: text('message_id').notNull(),
    sender: text('sender').notNull(),
    recipients: text('recipients').notNull(),
    subject: text('subject').notNull(),
    text: text('text').notNull(),
    receivedAt: at('received_at').notNull(),
  },
  (t) => [index('received_mails_recent').on(t.receivedAt)],
);
