import * as z from 'zod';
import type { AssessmentOutcome } from '../assessment/assessment-outcome';
import { assessmentInput } from './assessment-input';
import { assessmentRow, flawFinding } from './flaws';
import { id, instant, isoDate, prose, reason, version } from './primitives';
import { route } from './route';
import { ASSESSMENT_STATES, MECHANISMS, SIGNATURE_MEANINGS } from './vocabulary';

/** The engine's answer travels as it is; only the engine makes one. */
export const assessmentOutcome = z.custom<AssessmentOutcome>(
  (value) => typeof value === 'object' && value !== null && 'status' in value,
);

const proposal = z.discriminatedUnion('status', [
  z.object({
    status: z.literal('proposed'),
    dueOn: isoDate,
    limitOn: isoDate.nullable().describe('Predicted limit; no date may lie after it'),
    basis: z.string(),
    candidates: z.array(
      z.object({
        rule: z.enum([
          'fraction of life',
          'fraction of time to change of category',
          'mechanism maximum',
          'code maximum',
          'temporary measure',
        ]),
        dueOn: isoDate,
        explanation: z.string(),
        governs: z.boolean(),
      }),
    ),
  }),
  z.object({ status: z.literal('no date'), reason: z.string() }),
]);
export type ReinspectionProposalView = z.infer<typeof proposal>;

export const signatureView = z.object({
  id,
  personName: z.string(),
  role: z.string(),
  competence: z.string(),
  meaning: z.enum(SIGNATURE_MEANINGS),
  comment: z.string(),
  signedAt: instant,
  contentHash: z.string(),
});

export const assessmentView = z.object({
  id,
  flawId: id,
  flawNumber: z.string(),
  componentId: id,
  tag: z.string(),
  locationName: z.string(),
  mechanism: z.enum(MECHANISMS),
  revision: z.number().int(),
  state: z.enum(ASSESSMENT_STATES),
  inspectedOn: isoDate,
  finding: flawFinding,
  input: assessmentInput,
  outcome: assessmentOutcome,
  engineVersion: z.string(),
  rulesNumber: z.number().int().describe('Version of the site rules it was made under'),
  proposal: proposal.nullable(),
  chosenDueOn: isoDate.nullable(),
  chosenReason: z.string(),
  conclusion: z.string(),
  contentHash: z.string(),
  authorId: id,
  authorName: z.string(),
  editorIds: z.array(id),
  reviewerName: z.string().nullable(),
  returnReason: z.string(),
  submittedAt: instant.nullable(),
  approvedAt: instant.nullable(),
  previous: z
    .object({ id, revision: z.number().int(), input: assessmentInput, outcome: assessmentOutcome })
    .nullable()
    .describe('The approved assessment this one follows'),
  signatures: z.array(signatureView),
  version,
});
export type AssessmentView = z.infer<typeof assessmentView>;

const ofFlaw = z.object({ id });
const one = z.object({ id });
const basis = {
  findingId: id.optional().describe('Newest finding unless named'),
  loadCaseId: id.optional(),
  growthLawId: id.optional(),
};

export const listAssessments = route({
  method: 'get',
  path: '/api/flaws/:id/assessments',
  summary: 'Assessments of a flaw, newest first',
  access: 'assessments.read',
  params: ofFlaw,
  response: z.object({ rows: z.array(assessmentRow) }),
});

export const startAssessment = route({
  method: 'post',
  path: '/api/flaws/:id/assessments',
  summary:
    'Start a draft from register, finding and site lists; every input says where it comes from',
  access: 'assessments.write',
  params: ofFlaw,
  body: z.strictObject(basis),
  response: assessmentView,
});

export const readAssessmentInputs = route({
  method: 'get',
  path: '/api/flaws/:id/assessment-inputs',
  summary: 'The inputs a draft would start with; stores nothing',
  access: 'assessments.preview',
  params: ofFlaw,
  query: z.object(basis),
  response: z.object({
    input: assessmentInput,
    inspectedOn: isoDate,
    mechanism: z.enum(MECHANISMS),
    findingId: id,
  }),
});

export const previewAssessment = route({
  method: 'post',
  path: '/api/assessments/preview',
  summary:
    'Compute an assessment and the re-inspection the site’s rules would propose; stores nothing',
  access: 'assessments.preview',
  status: 200,
  body: z.strictObject({
    input: assessmentInput,
    inspectedOn: isoDate,
    mechanism: z.enum(MECHANISMS),
  }),
  response: z.object({ outcome: assessmentOutcome, proposal: proposal.nullable() }),
});

export const readAssessment = route({
  method: 'get',
  path: '/api/assessments/:id',
  summary: 'One assessment with inputs, results, steps and signatures',
  access: 'assessments.read',
  params: one,
  response: assessmentView,
});

export const changeAssessment = route({
  method: 'patch',
  path: '/api/assessments/:id',
  summary: 'Change a draft; the server computes the result itself',
  access: 'assessments.write',
  versioned: true,
  params: one,
  body: z.strictObject({
    input: assessmentInput.optional(),
    conclusion: prose(4000).optional(),
    chosenDueOn: isoDate.nullable().optional(),
    chosenReason: prose(2000).optional(),
  }),
  response: assessmentView,
});

export const submitAssessment = route({
  method: 'post',
  path: '/api/assessments/:id/submit',
  summary: 'Send for the independent check; signs as author',
  access: 'assessments.write',
  versioned: true,
  status: 200,
  params: one,
  response: assessmentView,
});

export const returnAssessment = route({
  method: 'post',
  path: '/api/assessments/:id/return',
  summary: 'Return to the author with a reason; not for one’s own work',
  access: 'assessments.review',
  versioned: true,
  status: 200,
  params: one,
  body: z.strictObject({ reason }),
  response: assessmentView,
});

export const approveAssessment = route({
  method: 'post',
  path: '/api/assessments/:id/approve',
  summary:
    'Approve: supersedes the one in force and sets the re-inspection date; not for one’s own work',
  access: 'assessments.review',
  versioned: true,
  proof: true,
  status: 200,
  params: one,
  body: z.strictObject({ comment: prose(2000) }),
  response: assessmentView,
});

export const recomputeAssessment = route({
  method: 'get',
  path: '/api/assessments/:id/recompute',
  summary: 'Compute a stored assessment again and say whether it agrees bit for bit',
  access: 'assessments.read',
  params: one,
  response: z.object({
    agrees: z.boolean(),
    engineVersion: z.string().describe('Of this server'),
    recordedEngineVersion: z.string(),
    contentHashAgrees: z.boolean(),
    differences: z.array(z.string()).describe('Members that differ'),
  }),
});
