import { assessFlaw } from '@ligament/domain/assessment/assess-flaw';
import { canonicalJson } from '@ligament/domain/records/canonical-json';
import type { Database } from '../../db/database';
import { contentHash } from './compute';
import { subjectOf } from './subject';

/** Computes a stored assessment again and compares it with what was recorded. */
export async function recomputeAssessment(db: Database, siteId: string, id: string) {
  const { record } = await subjectOf(db, siteId, id);
  const outcome = assessFlaw(record.input);
  const now = Object.entries(outcome);
  const then = record.outcome as unknown as Readonly<Record<string, unknown>>;
  return {
    agrees: canonicalJson(outcome) === canonicalJson(record.outcome),
    engineVersion: outcome.engineVersion,
    recordedEngineVersion: record.engineVersion,
    contentHashAgrees: contentHash(record) === record.contentHash,
    differences: now
      .filter(([name, value]) => canonicalJson(value) !== canonicalJson(then[name]))
      .map(([name]) => name),
  };
}
