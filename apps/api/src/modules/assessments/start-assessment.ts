import type { AssessmentView } from '@ligament/domain/contract/assessments';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { conflict, notFound } from '../../http/failure';
import { setFlawState } from '../flaws/set-flaw-state';
import { writeHistory } from '../history/write-history';
import { currentSiteRules } from '../site-rules/current-site-rules';
import { assessmentRepository } from './assessment.repository';
import { assessmentView } from './assessment-view';
import { compute, contentHash } from './compute';
import { findBasis, type BasisChoice } from './find-basis';
import { prefillInput } from './prefill-input';

/** Starts a draft from register, finding and site lists; one at a time for a flaw. */
export function startAssessment(
  { db, clock }: Deps,
  actor: Actor,
  flawId: string,
  choice: BasisChoice,
): Promise<AssessmentView> {
  return db.transaction(async (tx) => {
    const repository = assessmentRepository(tx);
    const basis = await findBasis(tx, actor.siteId, flawId, choice);
    const open = await repository.openOf(flawId);
    if (open) {
      throw conflict(
        'assessment.open',
        `Revision ${open.revision} of this flaw’s assessment is still ${open.state}: finish that one first.`,
      );
    }
    const { id: ruleVersionId, number, rules } = await currentSiteRules(tx, actor.siteId);
    const now = clock.now();
    const { inspectedOn } = basis.finding;
    const input = prefillInput(basis, rules, number);
    const { outcome, proposal } = compute(input, inspectedOn, basis.flaw.mechanism, rules);
    const chosenDueOn = proposal?.status === 'proposed' ? proposal.dueOn : null;
    const content = {
      flawId,
      findingId: basis.finding.id,
      revision: await repository.nextRevision(flawId),
      input,
      outcome,
      chosenDueOn,
      chosenReason: '',
      conclusion: '',
    };
    const added = await repository.add({
      ...content,
      siteId: actor.siteId,
      state: 'draft',
      inspectedOn,
      engineVersion: outcome.engineVersion,
      ruleVersionId,
      proposal,
      contentHash: contentHash(content),
      authorId: actor.personId,
      editorIds: [actor.personId],
      supersedesId: (await repository.approvedOf(flawId))?.id ?? null,
      createdAt: now,
      updatedAt: now,
    });
    if (!added) throw notFound('assessment');
    await setFlawState(tx, actor, now, flawId, 'under assessment');
    await writeHistory(tx, actor, now, {
      action: 'assessment.started',
      entity: 'assessment',
      entityId: added.id,
      componentId: basis.component.id,
      flawId,
      summary: `Assessment of ${basis.flaw.number} started, revision ${added.revision}, on the finding of ${inspectedOn}`,
    });
    return assessmentView(tx, added);
  });
}
