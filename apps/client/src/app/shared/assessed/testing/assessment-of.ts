import { assessFlaw } from '@ligament/domain/assessment/assess-flaw';
import { sampleInput, type Variation } from '@ligament/domain/assessment/testing/sample-input';
import type { AssessmentView } from '@ligament/domain/contract/assessments';
import type { FlawFinding, FlawView } from '@ligament/domain/contract/flaws';
import { DEFAULT_SITE_RULES } from '@ligament/domain/contract/site-rules';
import { proposeReinspection } from '@ligament/domain/scheduling/propose-reinspection';

const id = (last: number) => `5e0d8c52-7f0f-4b59-9f0b-0d6a3c2f1b${String(last).padStart(2, '0')}`;

export const FLAW_ID = id(1);
export const ASSESSMENT_ID = id(2);
const FINDING_ID = id(3);
const COMPONENT_ID = id(4);

export const findingOf = (over: Partial<FlawFinding> = {}): FlawFinding => ({
  id: FINDING_ID,
  inspectionId: id(5),
  reportNo: 'T-5',
  technique: 'PAUT',
  inspectedOn: '2026-11-10',
  inspectorName: 'Ida Brandt',
  inspectionState: 'accepted',
  indicationType: 'crack',
  kind: 'surface',
  face: 'inside',
  heightMm: 4,
  heightQualifier: '=',
  heightErrorMm: 0.7,
  lengthMm: 24,
  lengthQualifier: '=',
  lengthErrorMm: 3,
  ligamentMm: null,
  wallMm: 25,
  axialMm: null,
  circumferentialMm: null,
  remarks: '',
  ...over,
});

/** An assessment as the server would answer it, computed by the engine. */
export function assessmentOf(
  over: Partial<AssessmentView> = {},
  variation: Variation = {},
): AssessmentView {
  const input = sampleInput(variation) as AssessmentView['input'];
  const outcome = assessFlaw(input);
  const proposal =
    outcome.status === 'assessed'
      ? (proposeReinspection({
          inspectedOn: '2026-11-10',
          life: outcome.life,
          mechanism: 'fatigue',
          policy: DEFAULT_SITE_RULES,
        }) as AssessmentView['proposal'])
      : null;
  return {
    id: ASSESSMENT_ID,
    flawId: FLAW_ID,
    flawNumber: 'R-401-F01',
    componentId: COMPONENT_ID,
    tag: 'R-401',
    locationName: 'L1',
    mechanism: 'fatigue',
    revision: 1,
    state: 'draft',
    inspectedOn: '2026-11-10',
    finding: findingOf(),
    input,
    outcome,
    engineVersion: outcome.engineVersion,
    rulesNumber: 1,
    proposal,
    chosenDueOn: proposal?.status === 'proposed' ? proposal.dueOn : null,
    chosenReason: '',
    conclusion: '',
    contentHash: 'a'.repeat(64),
    authorId: id(6),
    authorName: 'Tom Kerr',
    editorIds: [id(6)],
    reviewerName: null,
    returnReason: '',
    submittedAt: null,
    approvedAt: null,
    previous: null,
    signatures: [],
    version: 3,
    ...over,
  };
}

/** A flaw as the server would answer it. */
export const flawOf = (over: Partial<FlawView> = {}): FlawView => ({
  id: FLAW_ID,
  number: 'R-401-F01',
  componentId: COMPONENT_ID,
  tag: 'R-401',
  componentDescription: 'Batch reactor',
  unitCode: 'U400',
  unitName: 'Batch',
  unitId: id(7),
  wallMm: 25,
  insideDiameterMm: 2600,
  location: { id: id(8), name: 'L1', kind: 'longitudinal weld', datum: 'Stamp D1' },
  kind: 'surface',
  face: 'inside',
  orientation: 'axial',
  origin: 'service',
  mechanism: 'fatigue',
  state: 'accepted with conditions',
  axialMm: null,
  circumferentialMm: null,
  note: '',
  version: 2,
  findings: [findingOf()],
  assessments: [],
  reinspection: null,
  scope: null,
  ...over,
});
