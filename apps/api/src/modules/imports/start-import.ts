import type { ImportView } from '@ligament/domain/contract/imports';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { conflict, notFound } from '../../http/failure';
import type { Database } from '../../db/database';
import { keepDocument, sha256Of, type ReceivedFile } from '../documents/keep-document';
import { refuseClosedInspection } from '../findings/record-finding';
import { writeHistory } from '../history/write-history';
import { inspectionOfSite } from '../inspections/inspection-of-site';
import { todayAt } from '../site/site-clock';
import { importRepository } from './import.repository';
import { readImportView } from './import-view';
import { readFile } from './read-file';

/** Reads an uploaded file and keeps it with what was recognised; no finding is stored. */
export function startImport(
  { db, clock }: Deps,
  actor: Actor,
  inspectionId: string,
  file: ReceivedFile,
): Promise<ImportView> {
  const read = readFile(file.bytes);
  return db.transaction(async (tx) => {
    const inspection = await inspectionOfSite(tx, actor.siteId, inspectionId);
    if (!inspection) throw notFound('inspection');
    refuseClosedInspection(inspection);
    const sha256 = sha256Of(file.bytes);
    await refuseSameFile(tx, actor.siteId, sha256);
    const now = clock.now();
    const owner = { entity: 'import', entityId: inspectionId, mediaType: 'text/csv' };
    const documentId = await keepDocument(tx, actor, now, owner, file);
    const added = await importRepository(tx).add({
      siteId: actor.siteId,
      inspectionId,
      documentId,
      sha256,
      state: 'preview',
      reading: { ...read.reading, answers: firstAnswers(read.decimalMark) },
      mapping: read.columns,
      corrections: [],
      decisions: [],
      createdBy: actor.personId,
      createdAt: now,
      updatedAt: now,
    });
    if (!added) throw notFound('import');
    await writeHistory(tx, actor, now, {
      action: 'import.started',
      entity: 'import',
      entityId: added.id,
      componentId: inspection.componentId,
      summary: `File ${file.name} uploaded for report ${inspection.reportNo}; nothing stored as findings yet`,
      after: { fileName: file.name, sha256, lines: read.reading.lines },
    });
    return readImportView(tx, actor.siteId, added.id, await todayAt(tx, clock, actor.siteId));
  });
}

/** Nothing is answered in the inspector's place but the decimal mark, which the file itself shows. */
const firstAnswers = (decimalMark: '.' | ',') => ({
  lengthUnit: null,
  decimalMark,
  positionIs: 'centre' as const,
  kind: null,
  face: null,
  orientation: null,
  indicationType: null,
});

/** A file makes findings once; a second upload points to the first. */
export async function refuseSameFile(db: Database, siteId: string, sha256: string): Promise<void> {
  const earlier = await importRepository(db).committedWith(siteId, sha256);
  if (!earlier) return;
  const day = earlier.committedAt?.toISOString().slice(0, 10) ?? 'an earlier day';
  throw conflict(
    'import.same-file',
    `This very file was imported on ${day} by ${earlier.by ?? 'somebody'} for report ${earlier.reportNo} of ${earlier.tag}.`,
    'file',
  );
}
