import * as contract from '@ligament/domain/contract/assessments';
import type { Deps } from '../../deps';
import { notFound } from '../../http/failure';
import { etag, type Api } from '../../http/serve';
import { listAssessmentsOf } from '../flaws/list-assessments-of';
import { currentSiteRules } from '../site-rules/current-site-rules';
import { approveAssessment } from './approve-assessment';
import { assessmentView } from './assessment-view';
import { changeAssessment } from './change-assessment';
import { compute } from './compute';
import { findBasis } from './find-basis';
import { prefillInput } from './prefill-input';
import { recomputeAssessment } from './recompute-assessment';
import { returnAssessment } from './return-assessment';
import { startAssessment } from './start-assessment';
import { subjectOf } from './subject';
import { submitAssessment } from './submit-assessment';

/** Assessments: draft, sent for check, returned or approved, superseded. */
export function serveAssessments(api: Api, deps: Deps): void {
  const { db } = deps;

  api.serve(contract.listAssessments, async ({ actor, params }) => {
    const rows = await listAssessmentsOf(db, actor.siteId, params.id);
    if (!rows) throw notFound('flaw');
    return { rows };
  });

  api.serve(contract.startAssessment, ({ actor, params, body }) =>
    startAssessment(deps, actor, params.id, body),
  );

  api.serve(contract.readAssessmentInputs, async ({ actor, params, query }) => {
    const basis = await findBasis(db, actor.siteId, params.id, query);
    const { number, rules } = await currentSiteRules(db, actor.siteId);
    return {
      input: prefillInput(basis, rules, number) as contract.AssessmentView['input'],
      inspectedOn: basis.finding.inspectedOn,
      mechanism: basis.flaw.mechanism,
      findingId: basis.finding.id,
    };
  });

  api.serve(contract.previewAssessment, async ({ actor, body }) => {
    const { rules } = await currentSiteRules(db, actor.siteId);
    const { outcome, proposal } = compute(body.input, body.inspectedOn, body.mechanism, rules);
    return { outcome, proposal: proposal as contract.ReinspectionProposalView | null };
  });

  api.serve(contract.readAssessment, async ({ actor, params, response }) => {
    const { record } = await subjectOf(db, actor.siteId, params.id);
    response.setHeader('ETag', etag(record.version));
    return assessmentView(db, record);
  });

  api.serve(contract.changeAssessment, async ({ actor, params, body, seen, response }) =>
    tagged(response, await changeAssessment(deps, actor, params.id, seen, body)),
  );
  api.serve(contract.submitAssessment, async ({ actor, params, seen, response }) =>
    tagged(response, await submitAssessment(deps, actor, params.id, seen)),
  );
  api.serve(contract.returnAssessment, async ({ actor, params, body, seen, response }) =>
    tagged(response, await returnAssessment(deps, actor, params.id, seen, body.reason)),
  );
  api.serve(contract.approveAssessment, async ({ actor, params, body, seen, response }) =>
    tagged(response, await approveAssessment(deps, actor, params.id, seen, body.comment)),
  );

  api.serve(contract.recomputeAssessment, ({ actor, params }) =>
    recomputeAssessment(db, actor.siteId, params.id),
  );
}

function tagged<T extends { readonly version: number }>(
  response: { setHeader(name: string, value: string): unknown },
  view: T,
): T {
  response.setHeader('ETag', etag(view.version));
  return view;
}
