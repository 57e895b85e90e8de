import * as contract from '@ligament/domain/contract/inspections';
import type { Deps } from '../../deps';
import { cutPage } from '../../http/cursor';
import { notFound } from '../../http/failure';
import { etag, type Api } from '../../http/serve';
import { componentOfSite } from '../components/component-of-site';
import { inspectionRepository } from './inspection.repository';
import { readInspectionView } from './inspection-view';
import { moveInspection, type MOVES } from './move-inspection';
import { addInspection, changeInspection } from './record-inspection';

/** Inspections, planned and reported. */
export function serveInspections(api: Api, deps: Deps): void {
  const { db } = deps;

  api.serve(contract.listInspections, async ({ actor, query }) => {
    const found = await inspectionRepository(db).list(actor.siteId, query);
    return cutPage(found, query.limit, (row) => [row.place, row.id]);
  });

  api.serve(contract.listInspectionsOfComponent, async ({ actor, params }) => {
    if (!(await componentOfSite(db, actor.siteId, params.id))) throw notFound('component');
    return { rows: await inspectionRepository(db).ofComponent(actor.siteId, params.id) };
  });

  api.serve(contract.addInspection, ({ actor, params, body }) =>
    addInspection(deps, actor, params.id, body),
  );

  api.serve(contract.readInspection, async ({ actor, params, response }) => {
    const view = await readInspectionView(db, actor.siteId, params.id);
    response.setHeader('ETag', etag(view.version));
    return view;
  });

  api.serve(contract.changeInspection, async ({ actor, params, body, seen, response }) => {
    const view = await changeInspection(deps, actor, params.id, seen, body);
    response.setHeader('ETag', etag(view.version));
    return view;
  });

  const move = async (
    call: {
      actor: Parameters<typeof moveInspection>[1];
      params: { id: string };
      seen: number;
      response: { setHeader(name: string, value: string): unknown };
    },
    verb: keyof typeof MOVES,
    reason?: string,
  ) => {
    const view = await moveInspection(deps, call.actor, call.params.id, call.seen, verb, reason);
    call.response.setHeader('ETag', etag(view.version));
    return view;
  };
  api.serve(contract.submitInspection, (call) => move(call, 'submit'));
  api.serve(contract.acceptInspection, (call) => move(call, 'accept'));
  api.serve(contract.rejectInspection, (call) => move(call, 'reject', call.body.reason));
  api.serve(contract.voidInspection, (call) => move(call, 'void', call.body.reason));
}
