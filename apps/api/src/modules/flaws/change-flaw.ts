import type { changeFlaw as route, FlawView } from '@ligament/domain/contract/flaws';
import type { z } from 'zod';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { notFound, staleVersion, unacceptable } from '../../http/failure';
import { writeHistory } from '../history/write-history';
import { flawRepository } from './flaw.repository';
import { readFlawView } from './flaw-view';

/** Changes what is known of a flaw, with a reason. */
export function changeFlaw(
  { db, clock }: Deps,
  actor: Actor,
  id: string,
  seen: number,
  { reason, ...change }: z.output<typeof route.body>,
): Promise<FlawView> {
  return db.transaction(async (tx) => {
    const repository = flawRepository(tx);
    const before = await repository.byId(actor.siteId, id);
    if (!before) throw notFound('flaw');
    if (change.state === 'closed' && (await repository.openReinspection(id))) {
      throw unacceptable(
        'flaw.still-due',
        'A re-inspection of this flaw is still open; a flaw is closed when nothing of it is left to do.',
        'state',
      );
    }
    const now = clock.now();
    const after = await repository.change(actor.siteId, id, seen, { ...change, updatedAt: now });
    if (!after) throw staleVersion('flaw', await readFlawView(tx, clock, actor.siteId, id));
    await writeHistory(tx, actor, now, {
      action: 'flaw.changed',
      entity: 'flaw',
      entityId: id,
      componentId: after.componentId,
      flawId: id,
      summary: `Flaw ${after.number} changed`,
      before: before.flaw,
      after,
      reason,
    });
    return readFlawView(tx, clock, actor.siteId, id);
  });
}
