import { canonicalJson } from '@ligament/domain/records/canonical-json';
import type { Database } from '../../db/database';
import type { CsvCell } from '../../http/csv-answer';
import { historyRepository, type HistoryFilters, type NamedHistoryRow } from './history.repository';

const CHUNK = 1000;

export const HISTORY_COLUMNS = [
  'number',
  'recorded_at_utc',
  'event_on',
  'person',
  'role',
  'action',
  'record',
  'record_id',
  'component',
  'flaw',
  'summary',
  'reason',
  'before',
  'after',
  'request_id',
  'previous_hash_sha256',
  'hash_sha256',
] as const;

/** Every entry that matches, newest first, read a chunk at a time. */
export async function* historyRows(
  db: Database,
  siteId: string,
  filters: HistoryFilters,
): AsyncGenerator<readonly CsvCell[]> {
  const repository = historyRepository(db);
  let before: number | null = null;
  for (;;) {
    const rows: NamedHistoryRow[] = await repository.list(siteId, filters, {
      before,
      limit: CHUNK,
    });
    for (const row of rows) yield cells(row);
    before = rows.at(-1)?.entry.seq ?? null;
    if (rows.length < CHUNK) return;
  }
}

const cells = ({ entry, componentTag, flawNo }: NamedHistoryRow): readonly CsvCell[] => [
  entry.seq,
  entry.at.toISOString(),
  entry.eventOn,
  entry.actorName,
  entry.actorRole,
  entry.action,
  entry.entity,
  entry.entityId,
  componentTag,
  flawNo,
  entry.summary,
  entry.reason,
  entry.before ? canonicalJson(entry.before) : null,
  entry.after ? canonicalJson(entry.after) : null,
  entry.requestId,
  entry.previousHash,
  entry.hash,
];
