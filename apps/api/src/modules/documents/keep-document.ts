import { createHash } from 'node:crypto';
import type { Transaction } from '../../db/database';
import type { Actor } from '../../http/actor';
import { notFound } from '../../http/failure';
import { documentRepository } from './document.repository';

export interface ReceivedFile {
  readonly name: string;
  readonly bytes: Uint8Array;
}

export const sha256Of = (bytes: Uint8Array): string =>
  createHash('sha256').update(bytes).digest('hex');

/** Keeps a file byte for byte in the transaction of what it belongs to. */
export async function keepDocument(
  tx: Transaction,
  actor: Actor,
  now: Date,
  owner: { readonly entity: string; readonly entityId: string; readonly mediaType: string },
  file: ReceivedFile,
): Promise<string> {
  const kept = await documentRepository(tx).add({
    ...owner,
    siteId: actor.siteId,
    sha256: sha256Of(file.bytes),
    fileName: file.name,
    byteLength: file.bytes.byteLength,
    bytes: file.bytes,
    uploadedBy: actor.personId,
    createdAt: now,
  });
  if (!kept) throw notFound('document');
  return kept.id;
}
