import { isDeepStrictEqual } from 'node:util';
import type {
  AssessmentView,
  changeAssessment as route,
} from '@ligament/domain/contract/assessments';
import type { z } from 'zod';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { conflict, staleVersion } from '../../http/failure';
import { writeHistory } from '../history/write-history';
import { currentSiteRules } from '../site-rules/current-site-rules';
import { assessmentRepository, type AssessmentRecord } from './assessment.repository';
import { assessmentView } from './assessment-view';
import { compute, contentHash } from './compute';
import { refuseDate } from './refuse-date';
import { subjectOf } from './subject';

/** Changes a draft or a returned assessment; the result is the server's own computation. */
export function changeAssessment(
  { db, clock }: Deps,
  actor: Actor,
  id: string,
  seen: number,
  change: z.output<typeof route.body>,
): Promise<AssessmentView> {
  return db.transaction(async (tx) => {
    const repository = assessmentRepository(tx);
    const { record, flaw } = await subjectOf(tx, actor.siteId, id);
    if (record.state !== 'draft' && record.state !== 'returned') {
      throw conflict(
        'assessment.not-editable',
        `This assessment is ${record.state}; only a draft or a returned one can be changed.`,
      );
    }
    const { id: ruleVersionId, rules } = await currentSiteRules(tx, actor.siteId);
    const input = change.input ?? record.input;
    const { outcome, proposal } = compute(input, record.inspectedOn, flaw.mechanism, rules);
    const content = {
      flawId: record.flawId,
      findingId: record.findingId,
      revision: record.revision,
      input,
      outcome,
      conclusion: change.conclusion ?? record.conclusion,
      ...dateOf(record, change, proposal),
    };
    refuseDate(proposal, content.chosenDueOn, content.chosenReason);
    const now = clock.now();
    const after = await repository.change(id, seen, ['draft', 'returned'], {
      ...content,
      ruleVersionId,
      engineVersion: outcome.engineVersion,
      proposal,
      contentHash: contentHash(content),
      editorIds: [...new Set([...record.editorIds, actor.personId])],
      updatedAt: now,
    });
    if (!after) throw staleVersion('assessment', await assessmentView(tx, record));
    await writeHistory(tx, actor, now, {
      action: 'assessment.changed',
      entity: 'assessment',
      entityId: id,
      componentId: flaw.componentId,
      flawId: flaw.id,
      summary: `Assessment of ${flaw.number}, revision ${record.revision}, changed`,
      before: told(record),
      after: told(after),
    });
    return assessmentView(tx, after);
  });
}

type Proposal = ReturnType<typeof compute>['proposal'];

/** The chosen date follows the proposal until the engineer chooses one. */
function dateOf(record: AssessmentRecord, change: z.output<typeof route.body>, proposal: Proposal) {
  if (proposal?.status !== 'proposed') return { chosenDueOn: null, chosenReason: '' };
  const earlier = record.proposal as Proposal;
  const followed =
    record.chosenDueOn === null ||
    (earlier?.status === 'proposed' && record.chosenDueOn === earlier.dueOn);
  const kept = followed ? proposal.dueOn : record.chosenDueOn;
  return {
    chosenDueOn: change.chosenDueOn ?? kept,
    chosenReason: change.chosenReason ?? record.chosenReason,
  };
}

/** What the history keeps of an assessment: inputs, the main results, date and conclusion. */
function told({ input, outcome, chosenDueOn, chosenReason, conclusion }: AssessmentRecord) {
  const result =
    outcome.status === 'assessed'
      ? {
          verdict: outcome.verdict,
          lifeYears: outcome.life.years,
          reserveOnLoad: outcome.reserveOnLoad,
        }
      : { verdict: 'refused', lifeYears: null, reserveOnLoad: null };
  return { ...flat(input), ...result, chosenDueOn, chosenReason, conclusion };
}

/** Inputs by group, so that the history shows which group changed. */
const flat = (input: AssessmentRecord['input']) =>
  Object.fromEntries(
    Object.entries(input).filter(([, group]) => !isDeepStrictEqual(group, undefined)),
  );
