import type { InspectionView } from '@ligament/domain/contract/inspections';
import type { Database } from '../../db/database';
import { notFound } from '../../http/failure';
import { documentsOf } from '../documents/documents-of';
import { signerOf } from '../history/signer-of';
import { inspectionRepository } from './inspection.repository';
import { missingForSubmission } from './missing-for-submission';

/** One inspection with its files, imports and what is still missing. */
export async function readInspectionView(
  db: Database,
  siteId: string,
  id: string,
): Promise<InspectionView> {
  const repository = inspectionRepository(db);
  const found = await repository.byId(siteId, id);
  if (!found) throw notFound('inspection');
  const { inspection, component, findings } = found;
  return {
    ...inspection,
    tag: component.tag,
    componentDescription: component.description,
    findings,
    missing: missingForSubmission(inspection, findings),
    documents: await documentsOf(db, 'inspection', id),
    imports: (await repository.imports(id)).map((row) => ({
      ...row,
      createdAt: row.createdAt.toISOString(),
    })),
    submittedById: await signerOf(db, id, 'inspection.submitted'),
  };
}
