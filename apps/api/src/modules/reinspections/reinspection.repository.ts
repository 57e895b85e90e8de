import { outgoingMails, reinspections, reminders } from '@ligament/domain/schema/schedule';
import { and, eq, inArray, isNull, notInArray, or, sql } from 'drizzle-orm';
import type { Database } from '../../db/database';

export type ReinspectionRecord = typeof reinspections.$inferSelect;

const stillOpen = notInArray(reinspections.state, ['done', 'cancelled']);

export const reinspectionRepository = (db: Database) => ({
  async add(values: typeof reinspections.$inferInsert): Promise<ReinspectionRecord | undefined> {
    const [row] = await db.insert(reinspections).values(values).returning();
    return row;
  },

  async byId(siteId: string, id: string): Promise<ReinspectionRecord | undefined> {
    const [row] = await db
      .select()
      .from(reinspections)
      .where(and(eq(reinspections.siteId, siteId), eq(reinspections.id, id)));
    return row;
  },

  /** Changes the plan of a task that is still open or planned, at the version seen. */
  async plan(
    id: string,
    seen: number,
    values: Partial<typeof reinspections.$inferInsert>,
  ): Promise<ReinspectionRecord | undefined> {
    const [row] = await db
      .update(reinspections)
      .set({ ...values, version: sql`${reinspections.version} + 1` })
      .where(
        and(
          eq(reinspections.id, id),
          eq(reinspections.version, seen),
          inArray(reinspections.state, ['open', 'planned']),
        ),
      )
      .returning();
    return row;
  },

  async openOfFlaw(flawId: string): Promise<ReinspectionRecord | undefined> {
    const [row] = await db
      .select()
      .from(reinspections)
      .where(and(eq(reinspections.flawId, flawId), stillOpen));
    return row;
  },

  /** Open tasks of some flaws, and those of the component that are about no flaw. */
  openOfComponent(componentId: string, flawIds: readonly string[]): Promise<ReinspectionRecord[]> {
    const about =
      flawIds.length > 0
        ? or(isNull(reinspections.flawId), inArray(reinspections.flawId, [...flawIds]))
        : isNull(reinspections.flawId);
    return db
      .select()
      .from(reinspections)
      .where(and(eq(reinspections.componentId, componentId), about, stillOpen));
  },

  /** Tasks that an inspection fulfilled. */
  doneBy(inspectionId: string): Promise<ReinspectionRecord[]> {
    return db
      .select()
      .from(reinspections)
      .where(
        and(eq(reinspections.doneInspectionId, inspectionId), eq(reinspections.state, 'done')),
      );
  },

  async setState(
    id: string,
    state: ReinspectionRecord['state'],
    now: Date,
    doneInspectionId: string | null = null,
  ): Promise<void> {
    await db
      .update(reinspections)
      .set({ state, doneInspectionId, updatedAt: now, version: sql`${reinspections.version} + 1` })
      .where(eq(reinspections.id, id));
  },

  /** Reminders not yet sent say nothing true any more. */
  async cancelQueuedReminders(id: string): Promise<void> {
    await db
      .update(reminders)
      .set({ state: 'cancelled' })
      .where(and(eq(reminders.reinspectionId, id), eq(reminders.state, 'queued')));
  },

  /** Reminders of a due date that were stopped before they were sent are to be sent after all. */
  async queueCancelledReminders(id: string, dueOn: string, now: Date): Promise<void> {
    const again = await db
      .update(reminders)
      .set({ state: 'queued' })
      .where(
        and(
          eq(reminders.reinspectionId, id),
          eq(reminders.dueOn, dueOn),
          eq(reminders.state, 'cancelled'),
        ),
      )
      .returning({ mailId: reminders.mailId });
    const mails = again.flatMap(({ mailId }) => mailId ?? []);
    if (mails.length === 0) return;
    await db
      .update(outgoingMails)
      .set({ state: 'queued', nextAttemptAt: now, lastError: '' })
      .where(inArray(outgoingMails.id, mails));
  },
});
