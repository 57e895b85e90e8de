import type { FlawRecord } from '../flaws/flaw.repository';
import type { Database } from '../../db/database';
import { notFound } from '../../http/failure';
import { readFlawRecord } from '../flaws/read-flaw-record';
import { assessmentRepository, type AssessmentRecord } from './assessment.repository';

/** An assessment of the site with its flaw. */
export async function subjectOf(
  db: Database,
  siteId: string,
  id: string,
): Promise<{ readonly record: AssessmentRecord; readonly flaw: FlawRecord }> {
  const record = await assessmentRepository(db).byId(siteId, id);
  const flaw = record && (await readFlawRecord(db, siteId, record.flawId));
  if (!record || !flaw) throw notFound('assessment');
  return { record, flaw };
}
