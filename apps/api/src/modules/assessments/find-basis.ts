import type { Database } from '../../db/database';
import { notFound, unacceptable } from '../../http/failure';
import { outOfScope } from '../flaws/flaw-scope';
import { assessmentBasisRepository, type AssessmentBasis } from './assessment-basis.repository';
import { suitableLaw } from './suitable-law';

/** Which finding, load case and growth law to start from; what is left out is chosen by rule. */
export interface BasisChoice {
  readonly findingId?: string | undefined;
  readonly loadCaseId?: string | undefined;
  readonly growthLawId?: string | undefined;
}

/** Finds everything an assessment of a flaw starts from, or says what is missing or out of scope. */
export async function findBasis(
  db: Database,
  siteId: string,
  flawId: string,
  choice: BasisChoice,
): Promise<AssessmentBasis> {
  const repository = assessmentBasisRepository(db);
  const found = await repository.flaw(siteId, flawId);
  if (!found) throw notFound('flaw');
  const findings = await repository.findings(flawId);
  const index = choice.findingId
    ? findings.findIndex(({ finding }) => finding.id === choice.findingId)
    : 0;
  const chosen = findings[index];
  if (!chosen)
    throw unacceptable('assessment.no-finding', 'This flaw has no finding to assess.', 'findingId');
  const scope = outOfScope(found.flaw.mechanism, chosen.finding.indicationType);
  if (scope) throw unacceptable('assessment.out-of-scope', scope);
  const loadCases = await repository.loadCases(found.component.id);
  const loadCase = choice.loadCaseId
    ? loadCases.find(({ id }) => id === choice.loadCaseId)
    : (loadCases.find(({ kind }) => kind === 'operating') ?? loadCases[0]);
  if (!loadCase) {
    throw unacceptable(
      'assessment.no-load-case',
      `${found.component.tag} has no load case: add its stresses in the register first.`,
      'loadCaseId',
    );
  }
  const laws = await repository.growthLaws(siteId);
  const growthLaw = choice.growthLawId
    ? laws.find(({ id }) => id === choice.growthLawId)
    : suitableLaw(laws, found.flaw.mechanism);
  return {
    ...found,
    ...chosen,
    earlier: findings.slice(index + 1).map(({ finding }) => finding),
    loadCase,
    loadCases,
    cycles: await repository.operatingCycles(found.component.id),
    growthLaw,
  };
}
