import { addDocument, downloadDocument } from '@ligament/domain/contract/inspections';
import { knownContent } from '@ligament/domain/inspection/decode-text';
import type { Deps } from '../../deps';
import { notFound, unacceptable } from '../../http/failure';
import type { Api } from '../../http/serve';
import { receivedFile, receiveFile } from '../../http/upload';
import { writeHistory } from '../history/write-history';
import { inspectionOfSite } from '../inspections/inspection-of-site';
import { documentRepository } from './document.repository';
import { keepDocument } from './keep-document';

/** Types that are served under their own name; everything else leaves as plain bytes. */
const TYPES: readonly (readonly [RegExp, string])[] = [
  [/\.pdf$/i, 'application/pdf'],
  [/\.png$/i, 'image/png'],
  [/\.jpe?g$/i, 'image/jpeg'],
  [/\.csv$/i, 'text/csv'],
  [/\.txt$/i, 'text/plain'],
];
const mediaTypeOf = (name: string) =>
  TYPES.find(([pattern]) => pattern.test(name))?.[1] ?? 'application/octet-stream';

/** Files attached to inspections. */
export function serveDocuments(api: Api, deps: Deps): void {
  const { db, clock, config } = deps;

  api.serve(
    addDocument,
    ({ actor, params, request }) => {
      const file = receivedFile(request);
      refusePrograms(file.bytes);
      return db.transaction(async (tx) => {
        const inspection = await inspectionOfSite(tx, actor.siteId, params.id);
        if (!inspection) throw notFound('inspection');
        const now = clock.now();
        const owner = {
          entity: 'inspection',
          entityId: params.id,
          mediaType: mediaTypeOf(file.name),
        };
        const id = await keepDocument(tx, actor, now, owner, file);
        const kept = await documentRepository(tx).short(id);
        if (!kept) throw notFound('document');
        await writeHistory(tx, actor, now, {
          action: 'document.added',
          entity: 'document',
          entityId: id,
          componentId: inspection.componentId,
          summary: `File ${file.name} attached to inspection ${inspection.reportNo}`,
          after: { fileName: kept.fileName, sha256: kept.sha256, byteLength: kept.byteLength },
        });
        return { ...kept, createdAt: kept.createdAt.toISOString() };
      });
    },
    receiveFile(config.uploadBytes),
  );

  api.stream(downloadDocument, async ({ actor, params, response }) => {
    const found = await documentRepository(db).byId(actor.siteId, params.id);
    if (!found) throw notFound('document');
    response.attachment(found.fileName);
    response.setHeader('Content-Type', found.mediaType);
    response.setHeader('Content-Security-Policy', "default-src 'none'; sandbox");
    response.send(Buffer.from(found.bytes));
  });
}

function refusePrograms(bytes: Uint8Array): void {
  const content = knownContent(bytes);
  if (content?.startsWith('a program')) {
    throw unacceptable(
      'document.program',
      `This file is ${content}; programs are not kept here.`,
      'file',
    );
  }
}
