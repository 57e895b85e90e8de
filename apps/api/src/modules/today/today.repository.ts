import { assessments } from '@ligament/domain/schema/assessments';
import { components } from '@ligament/domain/schema/components';
import { flaws } from '@ligament/domain/schema/flaws';
import { imports, inspections } from '@ligament/domain/schema/inspections';
import { people } from '@ligament/domain/schema/people';
import { reinspections, shutdownWindows } from '@ligament/domain/schema/schedule';
import {
  and,
  asc,
  eq,
  gte,
  inArray,
  isNull,
  lt,
  lte,
  notInArray,
  or,
  sql,
  type SQL,
} from 'drizzle-orm';
import type { Database } from '../../db/database';

const SHOWN = 8;
const isOpen = notInArray(reinspections.state, ['done', 'cancelled']);

/** Lists behind a person's day, each with its whole count and its first few rows. */
export const todayRepository = (db: Database, siteId: string) => {
  const tasks = async (...conditions: (SQL | undefined)[]) => {
    const where = and(eq(reinspections.siteId, siteId), isOpen, ...conditions);
    const rows = await db
      .select({
        id: reinspections.id,
        tag: components.tag,
        task: reinspections.task,
        dueOn: reinspections.dueOn,
        plannedOn: reinspections.plannedOn,
        basis: reinspections.basis,
      })
      .from(reinspections)
      .innerJoin(components, eq(components.id, reinspections.componentId))
      .where(where)
      .orderBy(asc(reinspections.dueOn))
      .limit(SHOWN);
    return { rows, count: await db.$count(reinspections, where) };
  };
  const ofAssessments = async (...conditions: (SQL | undefined)[]) => {
    const where = and(eq(assessments.siteId, siteId), ...conditions);
    const rows = await db
      .select({
        id: assessments.id,
        revision: assessments.revision,
        number: flaws.number,
        author: people.name,
        returnReason: assessments.returnReason,
        updatedAt: assessments.updatedAt,
      })
      .from(assessments)
      .innerJoin(flaws, eq(flaws.id, assessments.flawId))
      .innerJoin(people, eq(people.id, assessments.authorId))
      .where(where)
      .orderBy(asc(assessments.updatedAt))
      .limit(SHOWN);
    return { rows, count: await db.$count(assessments, where) };
  };
  const ofFlaws = async (...conditions: (SQL | undefined)[]) => {
    const where = and(eq(flaws.siteId, siteId), ...conditions);
    const rows = await db
      .select({
        id: flaws.id,
        number: flaws.number,
        description: components.description,
        mechanism: flaws.mechanism,
      })
      .from(flaws)
      .innerJoin(components, eq(components.id, flaws.componentId))
      .where(where)
      .orderBy(asc(flaws.number))
      .limit(SHOWN);
    return { rows, count: await db.$count(flaws, where) };
  };
  const ofInspections = async (...conditions: (SQL | undefined)[]) => {
    const where = and(eq(inspections.siteId, siteId), ...conditions);
    const rows = await db
      .select({
        id: inspections.id,
        reportNo: inspections.reportNo,
        tag: components.tag,
        technique: inspections.technique,
        plannedOn: inspections.plannedOn,
        inspectedOn: inspections.inspectedOn,
        state: inspections.state,
      })
      .from(inspections)
      .innerJoin(components, eq(components.id, inspections.componentId))
      .where(where)
      .orderBy(asc(sql`coalesce(${inspections.inspectedOn}, ${inspections.plannedOn})`))
      .limit(SHOWN);
    return { rows, count: await db.$count(inspections, where) };
  };
  return {
    overdue: (today: string) => tasks(lt(reinspections.dueOn, today)),
    dueUnplanned: (today: string, until: string) =>
      tasks(
        gte(reinspections.dueOn, today),
        lte(reinspections.dueOn, until),
        eq(reinspections.state, 'open'),
      ),
    planned: (today: string, until: string) =>
      tasks(
        gte(reinspections.plannedOn, today),
        lte(reinspections.plannedOn, until),
        eq(reinspections.state, 'planned'),
      ),
    notAcceptable: () => ofFlaws(eq(flaws.state, 'not acceptable')),
    newFlaws: () => ofFlaws(eq(flaws.state, 'new')),
    toCheck: (personId: string) =>
      ofAssessments(
        eq(assessments.state, 'submitted'),
        sql`not (${assessments.editorIds} ? ${personId})`,
      ),
    mine: (personId: string) =>
      ofAssessments(
        inArray(assessments.state, ['draft', 'returned']),
        sql`${assessments.editorIds} ? ${personId}`,
      ),
    submittedReports: () => ofInspections(eq(inspections.state, 'submitted')),
    openReports: () => ofInspections(inArray(inspections.state, ['in progress', 'rejected'])),
    plannedInspections: () => ofInspections(eq(inspections.state, 'planned')),

    async previews() {
      const where = and(eq(imports.siteId, siteId), eq(imports.state, 'preview'));
      const rows = await db
        .select({
          id: imports.id,
          reportNo: inspections.reportNo,
          tag: components.tag,
          createdAt: imports.createdAt,
        })
        .from(imports)
        .innerJoin(inspections, eq(inspections.id, imports.inspectionId))
        .innerJoin(components, eq(components.id, inspections.componentId))
        .where(where)
        .orderBy(asc(imports.createdAt))
        .limit(SHOWN);
      return { rows, count: await db.$count(imports, where) };
    },

    async invitations() {
      const where = and(
        eq(people.siteId, siteId),
        isNull(people.passwordHash),
        eq(people.active, true),
      );
      const rows = await db
        .select({ id: people.id, name: people.name, email: people.email })
        .from(people)
        .where(where)
        .limit(SHOWN);
      return { rows, count: await db.$count(people, where) };
    },

    freezes: (today: string, until: string) =>
      db
        .select({
          id: shutdownWindows.id,
          code: shutdownWindows.code,
          scopeFreezeOn: shutdownWindows.scopeFreezeOn,
          startsOn: shutdownWindows.startsOn,
        })
        .from(shutdownWindows)
        .where(
          and(
            eq(shutdownWindows.siteId, siteId),
            notInArray(shutdownWindows.state, ['cancelled']),
            or(
              and(
                gte(shutdownWindows.scopeFreezeOn, today),
                lte(shutdownWindows.scopeFreezeOn, until),
              ),
              and(gte(shutdownWindows.startsOn, today), lte(shutdownWindows.startsOn, until)),
            ),
          ),
        )
        .orderBy(asc(shutdownWindows.startsOn)),
  };
};
