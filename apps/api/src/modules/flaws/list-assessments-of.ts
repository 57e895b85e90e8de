import type { AssessmentRow } from '@ligament/domain/contract/flaws';
import type { Database } from '../../db/database';
import { flawRepository } from './flaw.repository';

/** Assessments of a flaw in short, newest first; undefined when the site has no such flaw. */
export async function listAssessmentsOf(
  db: Database,
  siteId: string,
  flawId: string,
): Promise<AssessmentRow[] | undefined> {
  const repository = flawRepository(db);
  if (!(await repository.byId(siteId, flawId))) return undefined;
  return (await repository.assessments(flawId)).map((row) => ({
    ...row,
    approvedAt: row.approvedAt?.toISOString() ?? null,
    updatedAt: row.updatedAt.toISOString(),
  }));
}
