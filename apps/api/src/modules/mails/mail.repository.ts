import { outgoingMails, receivedMails, reminders } from '@ligament/domain/schema/schedule';
import {
  and,
  asc,
  count,
  desc,
  eq,
  isNull,
  lt,
  lte,
  notIlike,
  or,
  sql,
  type SQL,
} from 'drizzle-orm';
import type { Database } from '../../db/database';
import { decodeCursor } from '../../http/cursor';

export type OutgoingMail = typeof outgoingMails.$inferSelect;

/** Mail with a one-time link is for the eyes of its recipient and, where there is no real mail, of an administrator. */
const withoutLinks: SQL | undefined = and(
  notIlike(receivedMails.text, '%/accept/%'),
  notIlike(receivedMails.text, '%/reset-password/%'),
);

export const mailRepository = (db: Database) => ({
  async queue(values: typeof outgoingMails.$inferInsert): Promise<void> {
    await db.insert(outgoingMails).values(values).onConflictDoNothing();
  },

  /** Takes one waiting mail for a while; nobody else sends it meanwhile. */
  async lease(now: Date, until: Date): Promise<OutgoingMail | undefined> {
    const [waiting] = await db
      .select({ id: outgoingMails.id, attempts: outgoingMails.attempts })
      .from(outgoingMails)
      .where(
        and(
          eq(outgoingMails.state, 'queued'),
          lte(outgoingMails.nextAttemptAt, now),
          or(isNull(outgoingMails.leasedUntil), lt(outgoingMails.leasedUntil, now)),
        ),
      )
      .orderBy(asc(outgoingMails.nextAttemptAt))
      .limit(1);
    if (!waiting) return undefined;
    const [leased] = await db
      .update(outgoingMails)
      .set({ leasedUntil: until, attempts: waiting.attempts + 1 })
      .where(
        and(
          eq(outgoingMails.id, waiting.id),
          eq(outgoingMails.attempts, waiting.attempts),
          eq(outgoingMails.state, 'queued'),
        ),
      )
      .returning();
    return leased;
  },

  async settle(id: string, values: Partial<typeof outgoingMails.$inferInsert>): Promise<void> {
    await db
      .update(outgoingMails)
      .set({ leasedUntil: null, ...values })
      .where(eq(outgoingMails.id, id));
  },

  /** State of the reminder a mail belongs to; undefined when it belongs to none. */
  async reminderState(mailId: string) {
    const [row] = await db
      .select({ state: reminders.state })
      .from(reminders)
      .where(eq(reminders.mailId, mailId));
    return row?.state;
  },

  async settleReminder(
    mailId: string,
    state: 'sent' | 'not delivered',
    sentAt: Date | null,
  ): Promise<void> {
    await db.update(reminders).set({ state, sentAt }).where(eq(reminders.mailId, mailId));
  },

  async keepReceived(values: typeof receivedMails.$inferInsert): Promise<void> {
    await db.insert(receivedMails).values(values);
  },

  received(siteId: string, cursor: string | undefined, limit: number, withLinks: boolean) {
    const [at, id] = cursor ? decodeCursor(cursor, ['string', 'string']) : [];
    return db
      .select()
      .from(receivedMails)
      .where(
        and(
          ofSite(siteId),
          withLinks ? undefined : withoutLinks,
          at === undefined
            ? undefined
            : sql`(${receivedMails.receivedAt}, ${receivedMails.id}) < (${at}::timestamptz, ${id}::uuid)`,
        ),
      )
      .orderBy(desc(receivedMails.receivedAt), desc(receivedMails.id))
      .limit(limit + 1);
  },

  async receivedById(siteId: string, id: string, withLinks: boolean) {
    const [row] = await db
      .select()
      .from(receivedMails)
      .where(and(eq(receivedMails.id, id), ofSite(siteId), withLinks ? undefined : withoutLinks));
    return row;
  },

  undelivered: (siteId: string) =>
    db
      .select()
      .from(outgoingMails)
      .where(and(eq(outgoingMails.siteId, siteId), undelivered))
      .orderBy(desc(outgoingMails.createdAt))
      .limit(200),

  async undeliveredCount(siteId: string): Promise<number> {
    const [row] = await db
      .select({ n: count() })
      .from(outgoingMails)
      .where(and(eq(outgoingMails.siteId, siteId), undelivered));
    return row?.n ?? 0;
  },
});

/** A received mail belongs to the site that sent it. */
const ofSite = (siteId: string): SQL =>
  sql`exists (select 1 from outgoing_mails o where o.message_id = ${receivedMails.messageId} and o.site_id = ${siteId})`;

/** Given up, or tried in vain at least twice. */
const undelivered = or(
  eq(outgoingMails.state, 'not delivered'),
  and(eq(outgoingMails.state, 'queued'), sql`${outgoingMails.attempts} >= 2`),
);
