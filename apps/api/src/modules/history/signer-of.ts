import { history } from '@ligament/domain/schema/history';
import { and, desc, eq } from 'drizzle-orm';
import type { Database } from '../../db/database';

/** Who last did an action on a record, by the history; null when nobody did. */
export async function signerOf(
  db: Database,
  entityId: string,
  action: string,
): Promise<string | null> {
  const [row] = await db
    .select({ actorId: history.actorId })
    .from(history)
    .where(and(eq(history.entityId, entityId), eq(history.action, action)))
    .orderBy(desc(history.seq))
    .limit(1);
  return row?.actorId ?? null;
}
