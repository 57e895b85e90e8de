import { addFinding, listFindings } from '@ligament/domain/contract/findings';
import type { FindingBody } from '@ligament/domain/contract/findings';
import type { CandidateFinding } from '@ligament/domain/inspection/import-context';
import type { Deps } from '../../deps';
import { cutPage } from '../../http/cursor';
import { notFound, unacceptable } from '../../http/failure';
import { refuseRepeat } from '../../http/refuse-repeat';
import type { Api } from '../../http/serve';
import type { ComponentRecord } from '../components/component.repository';
import { componentOfSite, locationsOf } from '../components/component-of-site';
import { inspectionOfSite } from '../inspections/inspection-of-site';
import type { InspectionRecord } from '../inspections/inspection.repository';
import { findingRepository } from './finding.repository';
import { recordFinding, refuseClosedInspection } from './record-finding';

/** What inspections recorded. */
export function serveFindings(api: Api, { db, clock }: Deps): void {
  api.serve(listFindings, async ({ actor, query }) => {
    const found = await findingRepository(db).list(actor.siteId, query);
    return cutPage(found, query.limit, (row) => [row.inspectedOn, row.id]);
  });

  api.serve(addFinding, ({ actor, params, body }) =>
    refuseRepeat(
      'findings_indication',
      'indicationNo',
      'This report already has an indication of that number in this weld.',
      () =>
        db.transaction(async (tx) => {
          const inspection = await inspectionOfSite(tx, actor.siteId, params.id);
          const component =
            inspection && (await componentOfSite(tx, actor.siteId, inspection.componentId));
          if (!inspection || !component) throw notFound('inspection');
          refuseClosedInspection(inspection);
          const location = (await locationsOf(tx, component.id)).find(
            ({ id }) => id === body.locationId,
          );
          if (!location)
            throw unacceptable(
              'finding.location',
              `Choose a weld or place of ${component.tag}.`,
              'locationId',
            );
          refuseImpossible(body, component);
          const recorded = await recordFinding(tx, actor, clock.now(), inspection, component, {
            finding: byHand(body, location.name, inspection),
            flaw: body.flaw,
            importId: null,
            rowNo: null,
            original: {},
          });
          const row = await findingRepository(tx).byId(recorded.findingId);
          if (!row) throw notFound('finding');
          return row;
        }),
    ),
  );
}

function byHand(
  body: FindingBody,
  locationName: string,
  inspection: InspectionRecord,
): CandidateFinding {
  const { flaw: _flaw, ...finding } = body;
  if (inspection.heightErrorMm === null || inspection.lengthErrorMm === null) {
    throw unacceptable(
      'finding.sizing-error',
      'State the technique’s sizing error at the inspection first.',
      'heightErrorMm',
    );
  }
  return {
    ...finding,
    locationName,
    heightQualifier: '=',
    lengthQualifier: '=',
    depthToTopMm: null,
    amplitudeDb: null,
    heightErrorMm: inspection.heightErrorMm,
    lengthErrorMm: inspection.lengthErrorMm,
  };
}

/** The same sense that an import is checked for. */
function refuseImpossible(body: FindingBody, component: ComponentRecord): void {
  const wall = body.wallMm ?? component.wallMm;
  if (body.heightMm >= wall) {
    throw unacceptable(
      'finding.height',
      `Height ${body.heightMm} mm is not less than the wall of ${wall} mm.`,
      'heightMm',
    );
  }
  if (body.kind === 'embedded' && !(body.ligamentMm && body.ligamentMm > 0)) {
    throw unacceptable(
      'finding.ligament',
      'An embedded flaw needs its ligament to the nearer surface, above 0 mm.',
      'ligamentMm',
    );
  }
  if (body.kind === 'embedded' && body.heightMm + (body.ligamentMm ?? 0) >= wall) {
    throw unacceptable(
      'finding.ligament',
      `Height and ligament together are not less than the wall of ${wall} mm.`,
      'ligamentMm',
    );
  }
}
