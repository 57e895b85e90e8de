import type { Deps } from '../apps/api/src/deps';
import { siteDay } from '../apps/api/src/http/site-day';
import { addInspection } from '../apps/api/src/modules/inspections/record-inspection';
import { addReinspection } from '../apps/api/src/modules/reinspections/add-reinspection';
import { ASSESSMENTS, REFERRED } from './plant/assessments';
import { INSPECTIONS, type DemoInspection } from './plant/inspections';
import { SITE } from './plant/site';
import { assessAsTold } from './replay/assess-flaw-as-told';
import { buildRegister, type BuiltRegister } from './replay/build-register';
import { dateMover } from './replay/dates';
import { holdInspection, inspectionFields } from './replay/hold-inspection';
import { enterWindows, planWork, referOutOfScope } from './replay/plan-work';
import { play, type Flow } from './replay/play';
import { openStage, type Stage } from './replay/stage';

const FIRST_DAY = '2020-01-06';

/**
 * Fills an empty database with the invented plant by replaying its years day by day through the product's own use cases:
 * every number is computed, every signature made, and the history chained as if it had been lived.
 */
export async function seedDemo(deps: Deps): Promise<void> {
  const today = siteDay(deps.clock.now(), SITE.timeZone);
  const dates = dateMover(today);
  const stage = await openStage(deps, dates, dates.move(FIRST_DAY));
  const register = await buildRegister(stage);
  const flaws = new Map<string, string>();
  await play(
    stage,
    INSPECTIONS.map((inspection) => playInspection(stage, register, inspection, flaws)),
  );
  stage.goTo(dates.after('2026-12-01', 0));
  const windows = await enterWindows(stage, register);
  await referOutOfScope(stage, flaws);
  await addNextWork(stage, register);
  await planWork(stage, flaws, windows);
}

async function* playInspection(
  stage: Stage,
  { components }: BuiltRegister,
  inspection: DemoInspection,
  flaws: Map<string, string>,
): Flow {
  const component = components.get(inspection.tag);
  if (!component) throw new Error(`no component ${inspection.tag}`);
  yield* holdInspection(stage, component, inspection, flaws);
  for (const finding of inspection.findings) {
    const flaw = `${inspection.tag}-${finding.flaw}`;
    const flawId = flaws.get(flaw);
    if (!flawId || isOutside(flaw)) continue;
    const told = ASSESSMENTS.find(({ key }) => key === `${flaw} ${inspection.on}`) ?? {
      until: 'approved' as const,
    };
    yield* assessAsTold(stage, flawId, inspection.on, told);
  }
}

const isOutside = (flaw: string): boolean => REFERRED.some((each) => each.flaw === flaw);

/** What is under way on the last day: a re-inspection without a flaw, a planned inspection, and a report waiting for its file. */
async function addNextWork(stage: Stage, { components }: BuiltRegister): Promise<void> {
  const { deps, actor, dates } = stage;
  const receiver = components.get('V-405');
  const line = components.get('L-105');
  const reactor = components.get('R-401');
  if (!receiver || !line || !reactor) throw new Error('a component of the scenario is missing');
  await addReinspection(deps, actor('tomas'), {
    componentId: receiver.id,
    flawId: null,
    task: 'PAUT of seam L1',
    technique: 'PAUT',
    dueOn: dates.move('2029-06-11'),
    basis: 'Site maximum of 60 months from the nil result of 2024-06-11',
    reason: 'Written scheme of examination',
  });
  const planned = inspectionFields(stage, 'BW-26-141', 'PAUT', '2026-11-30');
  await addInspection(deps, actor('ines'), line.id, {
    ...planned,
    inspectedOn: null,
    plannedOn: dates.move('2026-12-10'),
  });
  await addInspection(
    deps,
    actor('ines'),
    reactor.id,
    inspectionFields(stage, 'BW-26-140', 'PAUT', '2026-11-30'),
  );
}
