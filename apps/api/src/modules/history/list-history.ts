import type { Database } from '../../db/database';
import { cutPage, decodeCursor } from '../../http/cursor';
import { notFound } from '../../http/failure';
import { historyRepository, type HistoryFilters } from './history.repository';
import { historyView } from './history-view';

type Query = HistoryFilters & { readonly cursor?: string | undefined; readonly limit: number };

/** One page of the history, newest first. */
export async function listHistory(db: Database, siteId: string, query: Query) {
  const { cursor, limit, ...filters } = query;
  const [before = null] = cursor === undefined ? [] : decodeCursor(cursor, ['number']);
  const found = await historyRepository(db).list(siteId, filters, {
    before: before === null ? null : Number(before),
    limit: limit + 1,
  });
  const { rows, nextCursor } = cutPage(found, limit, (row) => [row.entry.seq]);
  return { rows: rows.map(historyView), nextCursor };
}

/** One page of the life of a component. */
export async function listComponentHistory(
  db: Database,
  siteId: string,
  component: string,
  query: Query,
) {
  if (!(await historyRepository(db).componentExists(siteId, component))) {
    throw notFound('component');
  }
  return listHistory(db, siteId, { ...query, component });
}
