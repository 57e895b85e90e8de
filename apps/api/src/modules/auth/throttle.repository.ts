import { createHash } from 'node:crypto';
import { throttles } from '@ligament/domain/schema/people';
import { eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/database';

/** Keys hold no address in clear: the table would otherwise list whom strangers have tried. */
export const throttleKey = (kind: 'address' | 'account' | 'reset', what: string): string =>
  `${kind}:${createHash('sha256').update(what).digest('hex')}`;

/** Failures counted per key; they survive a restart. */
export const throttleRepository = (db: Database) => ({
  async read(key: string) {
    const [row] = await db.select().from(throttles).where(eq(throttles.key, key));
    return row;
  },

  /** Counts one more within a window that began at the first; a window that is over begins anew. */
  async countInWindow(key: string, now: Date, windowMilliseconds: number): Promise<number> {
    const over = new Date(now.getTime() - windowMilliseconds);
    const [row] = await db
      .insert(throttles)
      .values({ key, failures: 1, windowStartedAt: now })
      .onConflictDoUpdate({
        target: throttles.key,
        set: {
          failures: sql`case when ${throttles.windowStartedAt} <= ${over.toISOString()} then 1 else ${throttles.failures} + 1 end`,
          windowStartedAt: sql`case when ${throttles.windowStartedAt} <= ${over.toISOString()} then ${now.toISOString()} else ${throttles.windowStartedAt} end`,
        },
      })
      .returning({ failures: throttles.failures });
    return row?.failures ?? 1;
  },

  /** Counts one more and remembers when it was. */
  async countInARow(key: string, now: Date, anew: boolean): Promise<number> {
    const [row] = await db
      .insert(throttles)
      .values({ key, failures: 1, windowStartedAt: now })
      .onConflictDoUpdate({
        target: throttles.key,
        set: { failures: anew ? 1 : sql`${throttles.failures} + 1`, windowStartedAt: now },
      })
      .returning({ failures: throttles.failures });
    return row?.failures ?? 1;
  },
});
