import type { changeImport as route, ImportView } from '@ligament/domain/contract/imports';
import type { z } from 'zod';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { conflict, notFound, staleVersion, unacceptable } from '../../http/failure';
import { writeHistory } from '../history/write-history';
import { todayAt } from '../site/site-clock';
import { importRepository, type Correction, type ImportRecord } from './import.repository';
import { readImportView } from './import-view';
import { readFile } from './read-file';

type Change = z.output<typeof route.body>;

/** Takes over what the inspector mapped, answered, corrected and decided; everything is checked again. */
export function changeImport(
  { db, clock }: Deps,
  actor: Actor,
  id: string,
  seen: number,
  change: Change,
): Promise<ImportView> {
  return db.transaction(async (tx) => {
    const repository = importRepository(tx);
    const found = await repository.byId(actor.siteId, id);
    if (!found) throw notFound('import');
    const { record, bytes, inspection } = found;
    if (record.state !== 'preview') {
      throw conflict(
        'import.closed',
        `This import is ${record.state}; it can no longer be changed.`,
      );
    }
    const today = await todayAt(tx, clock, actor.siteId);
    const now = clock.now();
    const corrections = newCorrections(change, record, bytes, actor.name);
    const kept = await repository.change(id, seen, {
      mapping: mappingOf(change, record),
      reading: { ...record.reading, answers: { ...record.reading.answers, ...change.answers } },
      corrections: [...withoutRepeats(record.corrections, corrections), ...corrections],
      decisions: decisionsOf(change, record),
      updatedAt: now,
    });
    if (!kept) throw staleVersion('import', await readImportView(tx, actor.siteId, id, today));
    if (corrections.length > 0) {
      await writeHistory(tx, actor, now, {
        action: 'import.corrected',
        entity: 'import',
        entityId: id,
        componentId: inspection.componentId,
        summary: `${corrections.length} ${corrections.length === 1 ? 'cell' : 'cells'} of the file for report ${inspection.reportNo} corrected`,
        after: { corrections },
        reason: corrections
          .map(({ reason }) => reason)
          .filter(Boolean)
          .join('; '),
      });
    }
    return readImportView(tx, actor.siteId, id, today);
  });
}

function mappingOf(change: Change, record: ImportRecord) {
  if (!change.mapping) return record.mapping;
  const taken = change.mapping.flatMap(({ field }) => field ?? []);
  const twice = taken.find((field, index) => taken.indexOf(field) !== index);
  if (twice)
    throw unacceptable(
      'import.mapping',
      `Two columns are mapped to “${twice}”: choose one.`,
      'mapping',
    );
  return record.mapping.map((column) => {
    const changed = change.mapping?.find(({ index }) => index === column.index);
    return changed ? { ...column, field: changed.field, unit: changed.unit } : column;
  });
}

/** The cell as it stood in the file is kept beside what was put in its place. */
function newCorrections(
  change: Change,
  record: ImportRecord,
  bytes: Uint8Array,
  by: string,
): Correction[] {
  if (!change.corrections?.length) return [];
  const { lines } = readFile(bytes);
  return change.corrections.map(({ row, column, value, reason }) => {
    if (row <= record.reading.headerRow || row > lines.length) {
      throw unacceptable(
        'import.correction',
        `The file has no line ${row} below its column names.`,
        'corrections',
      );
    }
    return { row, column, value, reason, by, from: lines[row - 1]?.[column] ?? '' };
  });
}

const withoutRepeats = (earlier: readonly Correction[], later: readonly Correction[]) =>
  earlier.filter(
    (each) => !later.some(({ row, column }) => row === each.row && column === each.column),
  );

/**
 * What was confirmed of a row, and that it is new, no longer holds once the row reads otherwise: one of its cells was
 * corrected, or the mapping or an answer for the whole file changed.
 */
function decisionsOf(change: Change, record: ImportRecord) {
  const decided = change.decisions ?? [];
  const wholeFile = change.mapping !== undefined || Object.keys(change.answers ?? {}).length > 0;
  const corrected = new Set(change.corrections?.map(({ row }) => row));
  const earlier = record.decisions
    .filter(({ row }) => !decided.some((each) => each.row === row))
    .map((each) => (wholeFile || corrected.has(each.row) ? askedAgain(each) : each));
  return [...earlier, ...decided];
}

const askedAgain = (decision: ImportRecord['decisions'][number]) => ({
  ...decision,
  confirmed: false,
  flaw: decision.flaw?.kind === 'new' ? null : decision.flaw,
});
