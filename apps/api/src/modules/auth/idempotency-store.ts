import { idempotencyKeys } from '@ligament/domain/schema/people';
import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/database';
import type { IdempotencyStore } from '../../http/idempotency';

/** Answers to repeated requests, kept in the database so that they survive a restart. */
export const databaseIdempotency = (db: Database): IdempotencyStore => ({
  async find(personId, key) {
    const [kept] = await db
      .select()
      .from(idempotencyKeys)
      .where(and(eq(idempotencyKeys.personId, personId), eq(idempotencyKeys.key, key)));
    return kept;
  },
  async keep(personId, key, route, answer) {
    await db
      .insert(idempotencyKeys)
      .values({ personId, key, route, ...answer })
      .onConflictDoNothing();
  },
});
