import type { FlawView } from '@ligament/domain/contract/flaws';
import { urgencyOf } from '@ligament/domain/scheduling/urgency';
import type { Clock } from '../../clock';
import type { Database } from '../../db/database';
import { notFound } from '../../http/failure';
import { currentSiteRules } from '../site-rules/current-site-rules';
import { todayAt } from '../site/site-clock';
import { listAssessmentsOf } from './list-assessments-of';
import { outOfScope } from './flaw-scope';
import { flawRepository } from './flaw.repository';

/** One flaw with its findings, assessments and next re-inspection. */
export async function readFlawView(
  db: Database,
  clock: Clock,
  siteId: string,
  id: string,
): Promise<FlawView> {
  const repository = flawRepository(db);
  const found = await repository.byId(siteId, id);
  if (!found) throw notFound('flaw');
  const { flaw, component, location, unit } = found;
  const findings = await repository.findings(id);
  const assessments = (await listAssessmentsOf(db, siteId, id)) ?? [];
  const reinspection = await repository.openReinspection(id);
  const { rules } = await currentSiteRules(db, siteId);
  const today = await todayAt(db, clock, siteId);
  return {
    ...flaw,
    tag: component.tag,
    componentDescription: component.description,
    unitCode: unit.code,
    unitName: unit.name,
    unitId: unit.id,
    wallMm: component.wallMm,
    insideDiameterMm: component.insideDiameterMm,
    location,
    findings,
    assessments,
    reinspection: reinspection
      ? { ...reinspection, urgency: urgencyOf(reinspection.dueOn, today, rules.dueSoonDays) }
      : null,
    scope: outOfScope(flaw.mechanism, findings.at(-1)?.indicationType),
  };
}
