import type { DocumentView } from '@ligament/domain/contract/inspections';
import type { Database } from '../../db/database';
import { documentRepository } from './document.repository';

/** Files attached to a record, in short. */
export async function documentsOf(
  db: Database,
  entity: string,
  entityId: string,
): Promise<DocumentView[]> {
  const rows = await documentRepository(db).of(entity, entityId);
  return rows.map((row) => ({ ...row, createdAt: row.createdAt.toISOString() }));
}
