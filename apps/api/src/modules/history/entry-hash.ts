import { createHash } from 'node:crypto';
import { canonicalJson } from '@ligament/domain/records/canonical-json';

/** Everything of a history entry that its hash covers. */
export interface HashedEntry {
  readonly siteId: string;
  readonly at: string;
  readonly eventOn: string | null;
  readonly actorId: string | null;
  readonly actorName: string;
  readonly actorRole: string;
  readonly action: string;
  readonly entity: string;
  readonly entityId: string;
  readonly componentId: string | null;
  readonly flawId: string | null;
  readonly summary: string;
  readonly before: unknown;
  readonly after: unknown;
  readonly reason: string;
  readonly requestId: string;
}

/** Hash before the first entry of a site. */
export const FIRST_HASH = '0'.repeat(64);

/**
 * SHA-256 of an entry chained to the one before it. Leaf and chain carry different first bytes, as in RFC 6962 §2.1,
 * so that neither can be passed off as the other.
 */
export function entryHash(previousHash: string, entry: HashedEntry): string {
  const leaf = createHash('sha256')
    .update(Uint8Array.of(0x00))
    .update(canonicalJson(entry))
    .digest();
  return createHash('sha256')
    .update(Uint8Array.of(0x01))
    .update(Buffer.from(previousHash, 'hex'))
    .update(leaf)
    .digest('hex');
}
