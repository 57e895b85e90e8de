import {
  addComponent as addComponentRoute,
  changeComponent as changeComponentRoute,
  exportComponents,
  listComponents,
  readComponent,
  type ComponentRow,
} from '@ligament/domain/contract/components';
import { urgencyOf } from '@ligament/domain/scheduling/urgency';
import type { Deps } from '../../deps';
import { cutPage } from '../../http/cursor';
import { answerCsv } from '../../http/csv-answer';
import { etag, type Api } from '../../http/serve';
import { currentSiteRules } from '../site-rules/current-site-rules';
import { todayAt } from '../site/site-clock';
import { addComponent } from './add-component';
import { changeComponent } from './change-component';
import { componentListRepository } from './component-list.repository';
import { readComponentView } from './component-view';
import { serveComponentParts } from './component-parts.routes';

const MOST_EXPORTED = 50_000;

/** The register of components. */
export function serveComponents(api: Api, deps: Deps): void {
  const { db, clock } = deps;

  api.serve(listComponents, async ({ actor, query }) => {
    const found = await componentListRepository(db).list(actor.siteId, query);
    const { rows, nextCursor } = cutPage(found, query.limit, ({ place, component }) => [
      place,
      component.id,
    ]);
    const { rules } = await currentSiteRules(db, actor.siteId);
    const today = await todayAt(db, clock, actor.siteId);
    return {
      rows: rows.map(({ component, ...rest }): ComponentRow => ({
        ...component,
        unitCode: rest.unitCode,
        flaws: rest.flaws,
        worstVerdict: rest.worstVerdict as ComponentRow['worstVerdict'],
        nextDueOn: rest.nextDueOn,
        urgency: rest.nextDueOn ? urgencyOf(rest.nextDueOn, today, rules.dueSoonDays) : null,
      })),
      nextCursor,
    };
  });

  api.stream(exportComponents, async ({ actor, response }) => {
    const query = { sort: 'tag' as const, limit: MOST_EXPORTED };
    const rows = await componentListRepository(db).list(actor.siteId, query);
    const header = [
      'tag',
      'description',
      'unit',
      'kind',
      'inside_diameter_mm',
      'wall_mm',
      'required_wall_mm',
      'design_pressure_mpa',
      'design_temperature_c',
      'operating_pressure_mpa',
      'operating_temperature_c',
      'material',
      'heat_treatment',
      'mechanism',
      'commissioned_on',
      'drawing_no',
      'state',
      'flaws',
      'worst_verdict',
      'next_due_on',
    ];
    await answerCsv(
      response,
      'register.csv',
      header,
      rows.map(({ component: c, ...rest }) => [
        c.tag,
        c.description,
        rest.unitCode,
        c.kind,
        c.insideDiameterMm,
        c.wallMm,
        c.requiredWallMm,
        c.designPressureMpa,
        c.designTemperatureC,
        c.operatingPressureMpa,
        c.operatingTemperatureC,
        rest.material,
        c.heatTreatment,
        c.mechanism,
        c.commissionedOn,
        c.drawingNo,
        c.state,
        rest.flaws,
        rest.worstVerdict,
        rest.nextDueOn,
      ]),
    );
  });

  api.serve(addComponentRoute, ({ actor, body }) => addComponent(deps, actor, body));

  api.serve(readComponent, async ({ actor, params, response }) => {
    const view = await readComponentView(db, clock, actor.siteId, params.id);
    response.setHeader('ETag', etag(view.version));
    return view;
  });

  api.serve(changeComponentRoute, async ({ actor, params, body, seen, response }) => {
    const view = await changeComponent(deps, actor, params.id, seen, body);
    response.setHeader('ETag', etag(view.version));
    return view;
  });

  serveComponentParts(api, deps);
}
