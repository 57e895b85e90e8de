import type { Entity } from '@ligament/domain/contract/vocabulary';
import { canonicalJson } from '@ligament/domain/records/canonical-json';
import { history } from '@ligament/domain/schema/history';
import { desc, eq, sql } from 'drizzle-orm';
import type { Transaction } from '../../db/database';
import type { HistoryActor } from '../../http/actor';
import { entryHash, FIRST_HASH } from './entry-hash';

type Snapshot = Readonly<Record<string, unknown>>;

/** One change as the history tells it. */
export interface HistoryEntry {
  /** Entity and verb, e.g. `assessment.approved`. */
  readonly action: string;
  readonly entity: Entity;
  readonly entityId: string;
  readonly componentId?: string | null;
  readonly flawId?: string | null;
  /** One sentence a stranger understands; the person and the time stand beside it. */
  readonly summary: string;
  readonly before?: Snapshot | null;
  readonly after?: Snapshot | null;
  readonly reason?: string;
  /** When it happened in the plant, where that is another day. */
  readonly eventOn?: string | null;
}

/** Members that change with every write and say nothing. */
const SILENT = new Set(['version', 'updatedAt', 'bytes', 'passwordHash']);

/**
 * Writes a history entry in the transaction of the change it tells of: either both are kept or neither.
 * Of `before` and `after` only what differs is kept. A change that changes nothing writes nothing.
 */
export async function writeHistory(
  tx: Transaction,
  actor: HistoryActor,
  now: Date,
  entry: HistoryEntry,
): Promise<void> {
  const { before, after } = difference(entry.before ?? null, entry.after ?? null);
  if (entry.before && entry.after && Object.keys(after ?? {}).length === 0) return;
  // one writer at a time per site, so that the chain never forks
  await tx.execute(sql`select pg_advisory_xact_lock(hashtext(${`history:${actor.siteId}`}))`);
  const [last] = await tx
    .select({ hash: history.hash })
    .from(history)
    .where(eq(history.siteId, actor.siteId))
    .orderBy(desc(history.seq))
    .limit(1);
  const previousHash = last?.hash ?? FIRST_HASH;
  const row = {
    siteId: actor.siteId,
    eventOn: entry.eventOn ?? null,
    actorId: actor.personId,
    actorName: actor.name,
    actorRole: actor.role,
    action: entry.action,
    entity: entry.entity,
    entityId: entry.entityId,
    componentId: entry.componentId ?? null,
    flawId: entry.flawId ?? null,
    summary: entry.summary,
    before,
    after,
    reason: entry.reason ?? '',
    requestId: actor.requestId,
  };
  const hash = entryHash(previousHash, { ...row, at: now.toISOString() });
  await tx.insert(history).values({ ...row, at: now, previousHash, hash });
}

/** Keeps of two snapshots only the members that differ, as plain JSON. */
function difference(before: Snapshot | null, after: Snapshot | null) {
  const plain = (snapshot: Snapshot | null): Record<string, unknown> | null =>
    snapshot === null
      ? null
      : Object.fromEntries(
          Object.entries(JSON.parse(canonicalJson(snapshot)) as Record<string, unknown>).filter(
            ([name]) => !SILENT.has(name),
          ),
        );
  const from = plain(before);
  const to = plain(after);
  if (!from || !to) return { before: from, after: to };
  const changed = Object.keys({ ...from, ...to }).filter(
    (name) => canonicalJson(from[name]) !== canonicalJson(to[name]),
  );
  const pick = (snapshot: Record<string, unknown>) =>
    Object.fromEntries(changed.map((name) => [name, snapshot[name] ?? null]));
  return { before: pick(from), after: pick(to) };
}
