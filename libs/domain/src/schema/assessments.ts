import { date, index, integer, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import type { AssessmentInput } from '../assessment/assessment-input';
import type { AssessmentOutcome } from '../assessment/assessment-outcome';
import {
  ASSESSMENT_STATES,
  SIGNATURE_MEANINGS,
  type AssessmentState,
  type SignatureMeaning,
} from '../contract/vocabulary';
import { at, createdAt, key, oneOf, updatedAt, version } from './columns';
import { findings, flaws } from './flaws';
import { people } from './people';
import { siteRuleVersions, sites } from './sites';

/** One revision of the assessment of a flaw. An approved one never changes; a new one supersedes it. */
export const assessments = pgTable(
  'assessments',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    flawId: uuid('flaw_id')
      .notNull()
      .references(() => flaws.id),
    /** The finding assessed; the clock starts on its inspection date. */
    findingId: uuid('finding_id')
      .notNull()
      .references(() => findings.id),
    revision: integer('revision').notNull(),
    state: text('state').$type<AssessmentState>().notNull(),
    inspectedOn: date('inspected_on', { mode: 'string' }).notNull(),
    input: jsonb('input').$type<AssessmentInput>().notNull(),
    /** The server's own computation, never the browser's. */
    outcome: jsonb('outcome').$type<AssessmentOutcome>().notNull(),
    engineVersion: text('engine_version').notNull(),
    ruleVersionId: uuid('rule_version_id')
      .notNull()
      .references(() => siteRuleVersions.id),
    /** Re-inspection as proposed by the site's rules, all candidates listed; null when there is none. */
    proposal: jsonb('proposal').$type<unknown>(),
    chosenDueOn: date('chosen_due_on', { mode: 'string' }),
    chosenReason: text('chosen_reason').notNull().default(''),
    conclusion: text('conclusion').notNull().default(''),
    /** SHA-256 over inputs, outcome and chosen date, in canonical form; signatures bind to it. */
    contentHash: text('content_hash').notNull(),
    authorId: uuid('author_id')
      .notNull()
      .references(() => people.id),
    /** Everyone who changed it; none of them may approve it. */
    editorIds: jsonb('editor_ids').$type<readonly string[]>().notNull(),
    submittedAt: at('submitted_at'),
    reviewerId: uuid('reviewer_id').references(() => people.id),
    returnReason: text('return_reason').notNull().default(''),
    approvedAt: at('approved_at'),
    supersedesId: uuid('supersedes_id'),
    version: version(),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
  },
  (t) => [
    unique('assessments_revision').on(t.flawId, t.revision),
    index('assessments_state').on(t.siteId, t.state),
    oneOf('assessments_state_word', t.state, ASSESSMENT_STATES),
  ],
);

/** Printed name, meaning and time over a content hash; rows are never changed or deleted. */
export const signatures = pgTable(
  'signatures',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    entity: text('entity').notNull(),
    entityId: uuid('entity_id').notNull(),
    contentHash: text('content_hash').notNull(),
    personId: uuid('person_id')
      .notNull()
      .references(() => people.id),
    personName: text('person_name').notNull(),
    role: text('role').notNull(),
    competence: text('competence').notNull().default(''),
    meaning: text('meaning').$type<SignatureMeaning>().notNull(),
    comment: text('comment').notNull().default(''),
    signedAt: at('signed_at').notNull(),
  },
  (t) => [
    index('signatures_entity').on(t.entity, t.entityId),
    oneOf('signatures_meaning', t.meaning, SIGNATURE_MEANINGS),
  ],
);
