import type { commitImport as route, ImportRow } from '@ligament/domain/contract/imports';
import type { z } from 'zod';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { conflict, Failure, notFound } from '../../http/failure';
import { refuseRepeat } from '../../http/refuse-repeat';
import { recordFinding, refuseClosedInspection } from '../findings/record-finding';
import { writeHistory } from '../history/write-history';
import { todayAt } from '../site/site-clock';
import { checkImport } from './check-import';
import { importRepository, type ImportRecord } from './import.repository';
import { refuseSameFile } from './start-import';

type Answer = z.output<typeof route.response>;

/** Stores every taken row as a finding with its flaw, in one transaction: all of them or none. */
export function commitImport({ db, clock }: Deps, actor: Actor, id: string): Promise<Answer> {
  return refuseRepeat(
    'findings_indication',
    'indicationNo',
    'This report already has one of these indication numbers in the same weld.',
    () =>
      db.transaction(async (tx) => {
        const repository = importRepository(tx);
        const found = await repository.byId(actor.siteId, id);
        if (!found) throw notFound('import');
        const { record, inspection, component, fileName } = found;
        if (record.state !== 'preview') {
          throw conflict('import.closed', `This import is already ${record.state}.`);
        }
        refuseClosedInspection(inspection);
        await refuseSameFile(tx, actor.siteId, record.sha256);
        const today = await todayAt(tx, clock, actor.siteId);
        const { rows } = await checkImport(tx, found, today);
        const taken = rows.filter(({ decision }) => decision.take);
        refuseUnready(taken);
        const now = clock.now();
        const committed = await repository.change(id, record.version, {
          state: 'committed',
          committedBy: actor.personId,
          committedAt: now,
          updatedAt: now,
        });
        if (!committed)
          throw conflict('import.closed', 'Somebody else has just committed this import.');
        const findings: Answer['findings'] = [];
        for (const row of taken) {
          if (!row.finding || !row.decision.flaw) continue;
          const recorded = await recordFinding(tx, actor, now, inspection, component, {
            finding: row.finding,
            flaw: row.decision.flaw,
            importId: id,
            rowNo: row.row,
            original: originalCells(row, record),
          });
          findings.push({ row: row.row, ...recorded });
        }
        await writeHistory(tx, actor, now, {
          action: 'import.committed',
          entity: 'import',
          entityId: id,
          componentId: component.id,
          summary: `File ${fileName} committed for report ${inspection.reportNo}: ${findings.length} findings, ${findings.filter(({ isNew }) => isNew).length} of them new flaws`,
          before: { state: 'preview' },
          after: { state: 'committed', findings: findings.map(({ flawNumber }) => flawNumber) },
          eventOn: inspection.inspectedOn,
        });
        return { importId: id, findings };
      }),
  );
}

function refuseUnready(taken: readonly ImportRow[]): void {
  const errors = taken
    .filter(({ ready }) => !ready)
    .map((row) => ({ field: `row ${row.row}`, message: whyNot(row) }));
  if (taken.length === 0) errors.push({ field: 'rows', message: 'No row is taken.' });
  if (errors.length === 0) return;
  throw new Failure(
    'import.not-ready',
    422,
    'Not ready to commit',
    'Some rows are not ready. Correct them, confirm what has to be confirmed, or leave them out; nothing was stored.',
    { errors },
  );
}

function whyNot({ finding, problems, decision }: ImportRow): string {
  const stop = problems.find(({ level }) => level === 'stop');
  if (stop || !finding) return stop?.message ?? 'This row is no finding: leave it out.';
  if (decision.flaw === null)
    return 'Known flaws lie near: say whether it is new or continues one of them.';
  return 'Something has to be confirmed first.';
}

/** The cells of the file as they were, by the name of their column. */
function originalCells(row: ImportRow, record: ImportRecord): Record<string, string> {
  return Object.fromEntries(
    record.mapping.map(({ index, header }) => {
      const corrected = record.corrections.find(
        (each) => each.row === row.row && each.column === index,
      );
      return [header || `column ${index + 1}`, corrected?.from ?? row.cells[index] ?? ''];
    }),
  );
}
