// Every list of words that schema, routes, screens and messages share stands here once.

export const COMPONENT_KINDS = [
  'vessel shell',
  'head',
  'sphere',
  'pipe',
  'exchanger shell',
] as const;
export type ComponentKind = (typeof COMPONENT_KINDS)[number];

export const COMPONENT_STATES = ['in service', 'out of service', 'retired'] as const;
export type ComponentState = (typeof COMPONENT_STATES)[number];

export const HEAT_TREATMENTS = ['as-welded', 'post-weld heat treated', 'unknown'] as const;
export type HeatTreatment = (typeof HEAT_TREATMENTS)[number];

export const LOCATION_KINDS = [
  'longitudinal weld',
  'circumferential weld',
  'nozzle weld',
  'attachment weld',
  'plain zone',
] as const;
export type LocationKind = (typeof LOCATION_KINDS)[number];

export const LOAD_CASE_KINDS = ['design', 'operating', 'start-up', 'hydrotest', 'upset'] as const;
export type LoadCaseKind = (typeof LOAD_CASE_KINDS)[number];

export const MECHANISMS = [
  'fatigue',
  'corrosion fatigue',
  'thermal fatigue',
  'stress corrosion cracking',
  'fabrication, not growing',
  'hydrogen attack',
  'creep',
  'unknown',
] as const;
export type Mechanism = (typeof MECHANISMS)[number];

export const TECHNIQUES = [
  'UT',
  'PAUT',
  'TOFD',
  'PAUT+TOFD',
  'TFM',
  'MT',
  'PT',
  'ET',
  'RT',
  'VT',
  'other',
] as const;
export type Technique = (typeof TECHNIQUES)[number];

export const INSPECTION_STATES = [
  'planned',
  'in progress',
  'submitted',
  'accepted',
  'rejected',
  'void',
] as const;
export type InspectionState = (typeof INSPECTION_STATES)[number];

export const INSPECTION_RESULTS = ['nil', 'indications recorded'] as const;

export const FACES = ['inside', 'outside'] as const;
export type Face = (typeof FACES)[number];

export const ORIENTATIONS = ['axial', 'circumferential'] as const;
export type Orientation = (typeof ORIENTATIONS)[number];

export { FLAW_KINDS, type FlawKind } from '../geometry/flaw-kind';

export const INDICATION_TYPES = [
  'crack',
  'lack of fusion',
  'lack of penetration',
  'slag',
  'porosity',
  'lamination',
  'point',
  'geometry',
  'unknown',
] as const;
export type IndicationType = (typeof INDICATION_TYPES)[number];

/** `<` and `>` keep what the instrument really said; the bounding end is assessed. */
export const SIZE_QUALIFIERS = ['=', '<', '>', '~'] as const;
export type SizeQualifier = (typeof SIZE_QUALIFIERS)[number];

export const FLAW_STATES = [
  'new',
  'under assessment',
  'accepted with conditions',
  'not acceptable',
  'referred',
  'removed',
  'closed',
] as const;
export type FlawState = (typeof FLAW_STATES)[number];

export const ORIGINS = ['fabrication', 'service', 'unknown'] as const;

export const IMPORT_STATES = ['preview', 'committed', 'discarded'] as const;
export type ImportState = (typeof IMPORT_STATES)[number];

export const ASSESSMENT_STATES = [
  'draft',
  'submitted',
  'returned',
  'approved',
  'superseded',
] as const;
export type AssessmentState = (typeof ASSESSMENT_STATES)[number];

export const SIGNATURE_MEANINGS = [
  'authored',
  'returned',
  'reviewed and approved',
  'acknowledged',
] as const;
export type SignatureMeaning = (typeof SIGNATURE_MEANINGS)[number];

export const REINSPECTION_STATES = [
  'open',
  'planned',
  'in execution',
  'awaiting report',
  'done',
  'cancelled',
] as const;
export type ReinspectionState = (typeof REINSPECTION_STATES)[number];

export const URGENCIES = ['overdue', 'due soon', 'later'] as const;
export type Urgency = (typeof URGENCIES)[number];

export const WINDOW_KINDS = ['turnaround', 'short shutdown', 'on-stream campaign'] as const;
export const WINDOW_STATES = ['planned', 'confirmed', 'cancelled'] as const;
export type WindowState = (typeof WINDOW_STATES)[number];

export const REMINDER_STATES = ['queued', 'sent', 'not delivered', 'cancelled'] as const;
export type ReminderState = (typeof REMINDER_STATES)[number];

export const MAIL_STATES = ['queued', 'sent', 'not delivered'] as const;
export type MailState = (typeof MAIL_STATES)[number];

/** Records a history entry can be about. */
export const ENTITIES = [
  'site',
  'site rules',
  'unit',
  'material',
  'growth law',
  'component',
  'location',
  'load case',
  'operating cycle',
  'inspection',
  'document',
  'import',
  'finding',
  'flaw',
  'assessment',
  're-inspection',
  'shutdown window',
  'reminder',
  'person',
  'session',
] as const;
export type Entity = (typeof ENTITIES)[number];
