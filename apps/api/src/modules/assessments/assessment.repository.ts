import { assessments, signatures } from '@ligament/domain/schema/assessments';
import { people } from '@ligament/domain/schema/people';
import { siteRuleVersions } from '@ligament/domain/schema/sites';
import { and, asc, desc, eq, inArray, max, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Database } from '../../db/database';

export type AssessmentRecord = typeof assessments.$inferSelect;

export const assessmentRepository = (db: Database) => ({
  async byId(siteId: string, id: string): Promise<AssessmentRecord | undefined> {
    const [row] = await db
      .select()
      .from(assessments)
      .where(and(eq(assessments.siteId, siteId), eq(assessments.id, id)));
    return row;
  },

  /** Names of author and reviewer, and the number of the rules. */
  async surroundings(id: string) {
    const reviewers = alias(people, 'reviewers');
    const [row] = await db
      .select({
        authorName: people.name,
        reviewerName: reviewers.name,
        rulesNumber: siteRuleVersions.number,
      })
      .from(assessments)
      .innerJoin(people, eq(people.id, assessments.authorId))
      .leftJoin(reviewers, eq(reviewers.id, assessments.reviewerId))
      .innerJoin(siteRuleVersions, eq(siteRuleVersions.id, assessments.ruleVersionId))
      .where(eq(assessments.id, id));
    return row;
  },

  signatures: (id: string) =>
    db
      .select()
      .from(signatures)
      .where(and(eq(signatures.entity, 'assessment'), eq(signatures.entityId, id)))
      .orderBy(asc(signatures.signedAt)),

  async approvedOf(flawId: string): Promise<AssessmentRecord | undefined> {
    const [row] = await db
      .select()
      .from(assessments)
      .where(and(eq(assessments.flawId, flawId), eq(assessments.state, 'approved')))
      .orderBy(desc(assessments.revision));
    return row;
  },

  async openOf(flawId: string): Promise<AssessmentRecord | undefined> {
    const [row] = await db
      .select()
      .from(assessments)
      .where(
        and(
          eq(assessments.flawId, flawId),
          inArray(assessments.state, ['draft', 'submitted', 'returned']),
        ),
      );
    return row;
  },

  async nextRevision(flawId: string): Promise<number> {
    const [row] = await db
      .select({ last: max(assessments.revision) })
      .from(assessments)
      .where(eq(assessments.flawId, flawId));
    return (row?.last ?? 0) + 1;
  },

  async add(values: typeof assessments.$inferInsert): Promise<AssessmentRecord | undefined> {
    const [row] = await db.insert(assessments).values(values).returning();
    return row;
  },

  /** Changes a record that is still in one of the given states and at the version seen. */
  async change(
    id: string,
    seen: number,
    states: readonly AssessmentRecord['state'][],
    values: Partial<typeof assessments.$inferInsert>,
  ): Promise<AssessmentRecord | undefined> {
    const [row] = await db
      .update(assessments)
      .set({ ...values, version: sql`${assessments.version} + 1` })
      .where(
        and(
          eq(assessments.id, id),
          eq(assessments.version, seen),
          inArray(assessments.state, [...states]),
        ),
      )
      .returning();
    return row;
  },

  async sign(values: typeof signatures.$inferInsert): Promise<void> {
    await db.insert(signatures).values(values);
  },
});
