import type { AssessmentView } from '@ligament/domain/contract/assessments';
import type { Database } from '../../db/database';
import { flawRepository } from './flaw.repository';

type Surroundings = Pick<
  AssessmentView,
  'flawNumber' | 'componentId' | 'tag' | 'locationName' | 'mechanism' | 'finding'
>;

/** What an assessment shows of its flaw and of the finding it is about. */
export async function readFlawForAssessment(
  db: Database,
  siteId: string,
  flawId: string,
  findingId: string,
): Promise<Surroundings | undefined> {
  const repository = flawRepository(db);
  const found = await repository.byId(siteId, flawId);
  const finding = await repository.finding(findingId);
  if (!found || !finding) return undefined;
  return {
    flawNumber: found.flaw.number,
    componentId: found.component.id,
    tag: found.component.tag,
    locationName: found.location.name,
    mechanism: found.flaw.mechanism,
    finding,
  };
}
