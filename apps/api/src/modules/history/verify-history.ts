import type { HistoryVerification } from '@ligament/domain/contract/history';
import type { Database } from '../../db/database';
import { entryHash, FIRST_HASH } from './entry-hash';
import { historyRepository, type HistoryRow } from './history.repository';

const CHUNK = 2000;

type Anchor = HistoryVerification['anchor'];

/**
 * Recomputes the chain of a site from its first entry, a chunk at a time, and names the first place where it does not
 * hold. Entries cut off the end leave a chain that holds: only a head noted earlier, elsewhere, shows that.
 */
export async function verifyHistory(
  db: Database,
  siteId: string,
  noted?: string,
): Promise<HistoryVerification> {
  const [notedSeq = 0, notedHash] = readNoted(noted);
  const repository = historyRepository(db);
  let anchor: Anchor = notedHash === undefined ? null : 'missing';
  let head: HistoryVerification['head'] = null;
  let firstBreak: HistoryVerification['firstBreak'] = null;
  let entries = 0;
  for (;;) {
    const rows = await repository.chain(siteId, head?.seq ?? 0, CHUNK);
    for (const row of rows) {
      const why: string | null = firstBreak ? null : breakOf(row, head?.hash ?? FIRST_HASH);
      if (why) firstBreak = { seq: row.seq, why };
      if (notedHash !== undefined && row.seq === notedSeq) {
        anchor = row.hash === notedHash ? 'stands' : 'differs';
      }
      head = { seq: row.seq, hash: row.hash };
      entries += 1;
    }
    if (rows.length < CHUNK) break;
  }
  return {
    entries,
    valid: firstBreak === null && anchor !== 'missing' && anchor !== 'differs',
    firstBreak,
    head,
    anchor,
  };
}

function readNoted(noted: string | undefined): [number?, string?] {
  const [seq, hash] = noted?.split(':') ?? [];
  return seq === undefined || hash === undefined ? [] : [Number(seq), hash];
}

/** Why an entry does not hold, given the hash of the one before it; null when it holds. */
export function breakOf(row: HistoryRow, previousHash: string): string | null {
  if (row.previousHash !== previousHash) {
    return 'This entry does not follow the one before it: an entry was removed, inserted or moved here.';
  }
  const { seq: _seq, hash, previousHash: _previous, at, ...rest } = row;
  const recomputed = entryHash(previousHash, {
    ...rest,
    before: rest.before ?? null,
    after: rest.after ?? null,
    at: at.toISOString(),
  });
  return recomputed === hash
    ? null
    : 'The content of this entry is not what was recorded: it was altered afterwards.';
}
