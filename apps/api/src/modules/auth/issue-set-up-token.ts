import type { Deps } from '../../deps';
import { accountRepository } from './account.repository';
import { issueToken } from './one-time-token';

/** A token with which the first administrator is created, within 24 hours and once; null when there are people already. */
export function issueSetUpToken({ db, clock }: Pick<Deps, 'db' | 'clock'>): Promise<string | null> {
  return db.transaction(async (tx) => {
    if (await accountRepository(tx).anybody()) return null;
    return issueToken(tx, 'set-up', null, clock.now());
  });
}
