import type { HistoryEntry } from '@ligament/domain/contract/history';
import type { NamedHistoryRow } from './history.repository';

/** A history entry as it leaves the server. */
export const historyView = ({ entry, componentTag, flawNo }: NamedHistoryRow): HistoryEntry => ({
  seq: entry.seq,
  at: entry.at.toISOString(),
  eventOn: entry.eventOn,
  actor: { id: entry.actorId, name: entry.actorName, role: entry.actorRole },
  action: entry.action,
  entity: entry.entity,
  entityId: entry.entityId,
  componentId: entry.componentId,
  componentTag,
  flawId: entry.flawId,
  flawNo,
  summary: entry.summary,
  before: entry.before ?? null,
  after: entry.after ?? null,
  reason: entry.reason,
  requestId: entry.requestId,
  hash: entry.hash,
});
