import type { InspectionBody } from '@ligament/domain/contract/inspections';
import type { Technique } from '@ligament/domain/contract/vocabulary';
import { inspections } from '@ligament/domain/schema/inspections';
import { eq } from 'drizzle-orm';
import { componentOfSite } from '../../apps/api/src/modules/components/component-of-site';
import { recordFinding } from '../../apps/api/src/modules/findings/record-finding';
import { moveInspection } from '../../apps/api/src/modules/inspections/move-inspection';
import {
  addInspection,
  changeInspection,
} from '../../apps/api/src/modules/inspections/record-inspection';
import type { DemoFinding, DemoInspection } from '../plant/inspections';
import type { BuiltComponent } from './build-register';
import type { Flow } from './play';
import type { Stage } from './stage';

/** Sizing error of a technique, 1 SD in mm: assumptions of the scenario, to be replaced by qualification data. */
const ERRORS: Readonly<Partial<Record<Technique, readonly [number, number]>>> = {
  UT: [1.5, 5],
  PAUT: [0.7, 3],
  TOFD: [0.5, 3],
};

/** Fields of an inspection as its inspector enters them. */
export function inspectionFields(
  stage: Stage,
  reportNo: string,
  technique: Technique,
  on: string,
): InspectionBody {
  const [heightErrorMm, lengthErrorMm] = ERRORS[technique] ?? [2, 10];
  return {
    reportNo,
    revision: 0,
    technique,
    procedureNo:
      technique === 'UT' ? 'NDT-U-006 r3' : technique === 'TOFD' ? 'NDT-T-009 r2' : 'NDT-P-014 r5',
    plannedOn: null,
    inspectedOn: stage.dates.move(on),
    inspectorName: 'Ines Vaarala',
    certificateNo: 'INV-0457',
    certificateValidUntil: stage.dates.move('2027-01-31'),
    heightErrorMm,
    lengthErrorMm,
    sizingErrorSource: 'Assumed for the demonstration; replace by qualification data',
    scanSurface: 'outside',
    coveragePercent: 100,
    limitations: '',
    result: null,
    reinspectionId: null,
  };
}

/** Holds an inspection: recorded, findings entered, handed over the next day, accepted the day after. Returns the flaws by their name. */
export async function* holdInspection(
  stage: Stage,
  component: BuiltComponent,
  inspection: DemoInspection,
  known: Map<string, string>,
): Flow {
  const { deps, actor, dates } = stage;
  const inspector = actor('ines');
  yield dates.after(inspection.on, 1);
  const fields = inspectionFields(stage, inspection.reportNo, inspection.technique, inspection.on);
  const added = await addInspection(deps, inspector, component.id, fields);
  for (const [index, finding] of inspection.findings.entries()) {
    await enter(stage, component, added.id, finding, index + 1, known);
  }
  const result = inspection.findings.length === 0 ? 'nil' : 'indications recorded';
  const told = await changeInspection(deps, inspector, added.id, added.version, { result });
  const sent = await moveInspection(deps, inspector, added.id, told.version, 'submit');
  yield dates.after(inspection.on, 2);
  await moveInspection(deps, actor('tomas'), added.id, sent.version, 'accept');
}

async function enter(
  { deps, siteId, actor }: Stage,
  component: BuiltComponent,
  inspectionId: string,
  finding: DemoFinding,
  indication: number,
  known: Map<string, string>,
): Promise<void> {
  const key = `${component.data.tag}-${finding.flaw}`;
  const flawId = known.get(key);
  const [locationName, locationId] = [...component.locationIds][0] ?? ['', ''];
  const recorded = await deps.db.transaction(async (tx) => {
    const [inspection] = await tx
      .select()
      .from(inspections)
      .where(eq(inspections.id, inspectionId));
    const owner = await componentOfSite(tx, siteId, component.id);
    if (!inspection || !owner) throw new Error(`inspection of ${component.data.tag} is gone`);
    return recordFinding(tx, actor('ines'), deps.clock.now(), inspection, owner, {
      finding: {
        indicationNo: String(indication),
        locationId,
        locationName,
        indicationType: finding.type ?? 'crack',
        kind: finding.kind ?? 'surface',
        face: finding.face ?? 'inside',
        orientation: finding.orientation,
        heightMm: finding.heightMm,
        heightQualifier: '=',
        lengthMm: finding.lengthMm,
        lengthQualifier: '=',
        ligamentMm: finding.ligamentMm ?? null,
        depthToTopMm: null,
        axialMm: finding.axialMm ?? null,
        circumferentialMm: finding.circumferentialMm ?? null,
        wallMm: null,
        amplitudeDb: null,
        heightErrorMm: inspection.heightErrorMm ?? 1,
        lengthErrorMm: inspection.lengthErrorMm ?? 5,
        remarks: finding.remarks ?? '',
      },
      flaw: flawId ? { kind: 'continues', flawId } : { kind: 'new' },
      importId: null,
      rowNo: null,
      original: {},
    });
  });
  known.set(key, recorded.flawId);
}
