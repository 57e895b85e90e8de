import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { conflict, notFound } from '../../http/failure';
import { writeHistory } from '../history/write-history';
import { importRepository } from './import.repository';

/** Gives up a preview; the file and the record of it stay. */
export function discardImport({ db, clock }: Deps, actor: Actor, id: string): Promise<void> {
  return db.transaction(async (tx) => {
    const repository = importRepository(tx);
    const found = await repository.byId(actor.siteId, id);
    if (!found) throw notFound('import');
    const { record, inspection, fileName } = found;
    const now = clock.now();
    const discarded = await repository.change(id, record.version, {
      state: 'discarded',
      updatedAt: now,
    });
    if (!discarded)
      throw conflict('import.closed', `This import is ${record.state}; it cannot be given up.`);
    await writeHistory(tx, actor, now, {
      action: 'import.discarded',
      entity: 'import',
      entityId: id,
      componentId: inspection.componentId,
      summary: `Import of ${fileName} for report ${inspection.reportNo} given up`,
      before: { state: 'preview' },
      after: { state: 'discarded' },
    });
  });
}
