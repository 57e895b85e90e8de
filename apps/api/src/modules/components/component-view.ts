import type { ComponentView, LoadCaseView } from '@ligament/domain/contract/components';
import type { MaterialView } from '@ligament/domain/contract/materials';
import { urgencyOf } from '@ligament/domain/scheduling/urgency';
import type { loadCases } from '@ligament/domain/schema/components';
import type { Clock } from '../../clock';
import type { Database } from '../../db/database';
import { notFound } from '../../http/failure';
import { currentSiteRules } from '../site-rules/current-site-rules';
import { todayAt } from '../site/site-clock';
import { componentRepository } from './component.repository';
import { componentSummaryRepository } from './component-summary.repository';

/** One component with everything the register and the rest of the product know of it. */
export async function readComponentView(
  db: Database,
  clock: Clock,
  siteId: string,
  id: string,
): Promise<ComponentView> {
  const repository = componentRepository(db);
  const found = await repository.byId(siteId, id);
  if (!found) throw notFound('component');
  const summary = componentSummaryRepository(db, id);
  const { rules } = await currentSiteRules(db, siteId);
  const today = await todayAt(db, clock, siteId);
  const { component, unit, material } = found;
  return {
    ...component,
    updatedAt: component.updatedAt.toISOString(),
    unit,
    material: {
      ...material,
      origins: material.origins as MaterialView['origins'],
      updatedAt: material.updatedAt.toISOString(),
    },
    locations: await repository.locations(id),
    loadCases: (await repository.loadCases(id)).map(loadCaseView),
    operatingCycles: await repository.operatingCycles(id),
    flaws: await summary.flaws(),
    reinspections: (await summary.reinspections()).map((row) => ({
      ...row,
      urgency: urgencyOf(row.dueOn, today, rules.dueSoonDays),
    })),
    inspections: await summary.inspections(),
  };
}

export const loadCaseView = (row: typeof loadCases.$inferSelect): LoadCaseView => ({
  ...row,
  origins: row.origins as LoadCaseView['origins'],
});
