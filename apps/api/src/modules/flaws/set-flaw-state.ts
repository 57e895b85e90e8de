import type { FlawState } from '@ligament/domain/contract/vocabulary';
import type { Transaction } from '../../db/database';
import type { HistoryActor } from '../../http/actor';
import { writeHistory } from '../history/write-history';
import { flawRepository } from './flaw.repository';

/** Moves a flaw to another state as the consequence of an assessment, and tells it in the history. */
export async function setFlawState(
  tx: Transaction,
  actor: HistoryActor,
  now: Date,
  flawId: string,
  state: FlawState,
): Promise<void> {
  const repository = flawRepository(tx);
  const found = await repository.byId(actor.siteId, flawId);
  if (!found || found.flaw.state === state) return;
  await repository.setState(flawId, state, now);
  await writeHistory(tx, actor, now, {
    action: 'flaw.state-changed',
    entity: 'flaw',
    entityId: flawId,
    componentId: found.component.id,
    flawId,
    summary: `Flaw ${found.flaw.number} is now ${state}`,
    before: { state: found.flaw.state },
    after: { state },
  });
}
