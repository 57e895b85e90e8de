import type { ImportRow, ImportView } from '@ligament/domain/contract/imports';
import type { Database } from '../../db/database';
import { notFound } from '../../http/failure';
import { checkImport } from './check-import';
import { importRepository } from './import.repository';

/** An import with every row, checked as it stands now. */
export async function readImportView(
  db: Database,
  siteId: string,
  id: string,
  today: string,
): Promise<ImportView> {
  const found = await importRepository(db).byId(siteId, id);
  if (!found) throw notFound('import');
  const { record, inspection, component, fileName } = found;
  const { rows, problems } = await checkImport(db, found, today);
  const { answers, ...reading } = record.reading;
  return {
    id,
    inspectionId: inspection.id,
    componentId: component.id,
    tag: component.tag,
    reportNo: inspection.reportNo,
    state: record.state,
    fileName,
    sha256: record.sha256,
    documentId: record.documentId,
    reading,
    mapping: [...record.mapping],
    answers,
    rows: [...rows],
    problems: [...problems],
    summary: summaryOf(rows),
    committedAt: record.committedAt?.toISOString() ?? null,
    version: record.version,
  };
}

function summaryOf(rows: readonly ImportRow[]): ImportView['summary'] {
  const taken = rows.filter(({ decision }) => decision.take);
  return {
    rows: rows.length,
    taken: taken.length,
    ready: taken.filter(({ ready }) => ready).length,
    stopped: taken.filter(
      ({ finding, problems }) => !finding || problems.some(({ level }) => level === 'stop'),
    ).length,
    toConfirm: taken.filter(({ finding, ready }) => finding !== null && !ready).length,
    leftOut: rows.length - taken.length,
  };
}
