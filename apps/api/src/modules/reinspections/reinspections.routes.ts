import * as contract from '@ligament/domain/contract/reinspections';
import { daysAfter } from '@ligament/domain/scheduling/calendar-date';
import type { Deps } from '../../deps';
import { answerCsv } from '../../http/csv-answer';
import { cutPage } from '../../http/cursor';
import { etag, type Api } from '../../http/serve';
import { currentSiteRules } from '../site-rules/current-site-rules';
import { todayAt } from '../site/site-clock';
import { addReinspection } from './add-reinspection';
import { planReinspection, unplanReinspection } from './plan-reinspection';
import { reinspectionListRepository } from './reinspection-list.repository';
import { readReinspectionView, reinspectionRow } from './reinspection-view';

const MOST_EXPORTED = 50_000;

/** Re-inspections: the due list, its planning and its export. */
export function serveReinspections(api: Api, deps: Deps): void {
  const { db, clock } = deps;
  const rowsOf = async (
    siteId: string,
    query: Parameters<ReturnType<typeof reinspectionListRepository>['list']>[1],
  ) => {
    const { rules } = await currentSiteRules(db, siteId);
    const today = await todayAt(db, clock, siteId);
    const found = await reinspectionListRepository(db).list(
      siteId,
      query,
      today,
      daysAfter(today, rules.dueSoonDays),
    );
    const { rows, nextCursor } = cutPage(found, query.limit, (row) => [row.place, row.id]);
    return { rows: rows.map((row) => reinspectionRow(row, today, rules.dueSoonDays)), nextCursor };
  };

  api.serve(contract.listReinspections, ({ actor, query }) => rowsOf(actor.siteId, query));

  api.stream(contract.exportReinspections, async ({ actor, response }) => {
    const { rows } = await rowsOf(actor.siteId, { sort: 'due', limit: MOST_EXPORTED });
    const header = [
      'days left',
      'due on',
      'unit',
      'component',
      'place',
      'flaw',
      'task',
      'technique',
      'state',
      'standing',
      'window',
      'planned on',
      'predicted limit',
      'basis',
    ];
    await answerCsv(
      response,
      'work list.csv',
      header,
      rows.map((row) => [
        row.daysLeft,
        row.dueOn,
        row.unitCode,
        row.tag,
        row.locationName,
        row.flawNumber,
        row.task,
        row.technique,
        row.state,
        row.fit,
        row.windowCode,
        row.plannedOn,
        row.limitOn,
        row.basis,
      ]),
    );
  });

  api.serve(contract.readReinspection, async ({ actor, params, response }) => {
    const view = await readReinspectionView(db, clock, actor.siteId, params.id);
    response.setHeader('ETag', etag(view.version));
    return view;
  });

  api.serve(contract.addReinspection, ({ actor, body }) => addReinspection(deps, actor, body));

  api.serve(contract.planReinspection, async ({ actor, params, body, seen, response }) => {
    const view = await planReinspection(deps, actor, params.id, seen, body);
    response.setHeader('ETag', etag(view.version));
    return view;
  });

  api.serve(contract.unplanReinspection, async ({ actor, params, body, seen, response }) => {
    const view = await unplanReinspection(deps, actor, params.id, seen, body.reason);
    response.setHeader('ETag', etag(view.version));
    return view;
  });
}
