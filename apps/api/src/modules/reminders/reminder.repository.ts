import type { listReminders } from '@ligament/domain/contract/reminders';
import { components } from '@ligament/domain/schema/components';
import { people } from '@ligament/domain/schema/people';
import { outgoingMails, reinspections, reminders } from '@ligament/domain/schema/schedule';
import { and, desc, eq, sql } from 'drizzle-orm';
import type { z } from 'zod';
import type { Database } from '../../db/database';
import { decodeCursor } from '../../http/cursor';

type Query = z.output<typeof listReminders.query>;

export const reminderRepository = (db: Database) => ({
  list(siteId: string, query: Query) {
    const [at, id] = query.cursor ? decodeCursor(query.cursor, ['string', 'string']) : [];
    return db
      .select({
        id: reminders.id,
        reinspectionId: reminders.reinspectionId,
        tag: components.tag,
        task: reinspections.task,
        dueOn: reminders.dueOn,
        leadDays: reminders.leadDays,
        recipientName: people.name,
        recipientEmail: reminders.recipientEmail,
        state: reminders.state,
        createdAt: reminders.createdAt,
        sentAt: reminders.sentAt,
        acknowledgedAt: reminders.acknowledgedAt,
        lastError: sql<string>`coalesce(${outgoingMails.lastError}, '')`,
      })
      .from(reminders)
      .innerJoin(reinspections, eq(reinspections.id, reminders.reinspectionId))
      .innerJoin(components, eq(components.id, reinspections.componentId))
      .innerJoin(people, eq(people.id, reminders.recipientId))
      .leftJoin(outgoingMails, eq(outgoingMails.id, reminders.mailId))
      .where(
        and(
          eq(reminders.siteId, siteId),
          query.state ? eq(reminders.state, query.state) : undefined,
          query.reinspection ? eq(reminders.reinspectionId, query.reinspection) : undefined,
          at === undefined
            ? undefined
            : sql`(${reminders.createdAt}, ${reminders.id}) < (${at}::timestamptz, ${id}::uuid)`,
        ),
      )
      .orderBy(desc(reminders.createdAt), desc(reminders.id))
      .limit(query.limit + 1);
  },

  of: (reinspectionId: string) =>
    db
      .select()
      .from(reminders)
      .where(eq(reminders.reinspectionId, reinspectionId))
      .orderBy(desc(reminders.createdAt)),

  async byId(siteId: string, id: string) {
    const [row] = await db
      .select()
      .from(reminders)
      .where(and(eq(reminders.siteId, siteId), eq(reminders.id, id)));
    return row;
  },

  async acknowledge(id: string, personId: string, now: Date): Promise<void> {
    await db
      .update(reminders)
      .set({ acknowledgedAt: now, acknowledgedBy: personId })
      .where(eq(reminders.id, id));
  },

  /** Adds a reminder unless this very one exists; says whether it was added. */
  async addOnce(values: typeof reminders.$inferInsert): Promise<boolean> {
    const rows = await db
      .insert(reminders)
      .values(values)
      .onConflictDoNothing()
      .returning({ id: reminders.id });
    return rows.length === 1;
  },
});
