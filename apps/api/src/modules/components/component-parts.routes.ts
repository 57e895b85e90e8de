import {
  loadCaseRoutes,
  locationRoutes,
  operatingCycleRoutes,
  removeOperatingCycle,
} from '@ligament/domain/contract/components';
import { loadCases, locations, operatingCycles } from '@ligament/domain/schema/components';
import type { Deps } from '../../deps';
import { notFound } from '../../http/failure';
import { etag, type Api } from '../../http/serve';
import { componentRepository } from './component.repository';
import { addPart, changePart, removePart } from './component-part';
import { loadCaseView } from './component-view';

/** Locations, load cases and operating cycles of a component. */
export function serveComponentParts(api: Api, deps: Deps): void {
  const of = async (siteId: string, id: string) => {
    const repository = componentRepository(deps.db);
    if (!(await repository.byId(siteId, id))) throw notFound('component');
    return repository;
  };

  api.serve(locationRoutes.list, async ({ actor, params }) => ({
    rows: await (await of(actor.siteId, params.id)).locations(params.id),
  }));
  api.serve(locationRoutes.add, ({ actor, params, body }) =>
    addPart(
      deps,
      actor,
      { table: locations, word: 'location', unique: 'locations_name' },
      params.id,
      body,
    ),
  );
  api.serve(
    locationRoutes.change,
    async ({ actor, params, body: { reason, ...change }, seen, response }) => {
      const part = { table: locations, word: 'location', unique: 'locations_name' } as const;
      const changed = await changePart(deps, actor, part, params.id, seen, change, reason);
      response.setHeader('ETag', etag(changed.version));
      return changed;
    },
  );

  api.serve(loadCaseRoutes.list, async ({ actor, params }) => ({
    rows: (await (await of(actor.siteId, params.id)).loadCases(params.id)).map(loadCaseView),
  }));
  api.serve(loadCaseRoutes.add, async ({ actor, params, body }) =>
    loadCaseView(
      await addPart(
        deps,
        actor,
        { table: loadCases, word: 'load case', unique: 'load_cases_name' },
        params.id,
        body,
      ),
    ),
  );
  api.serve(
    loadCaseRoutes.change,
    async ({ actor, params, body: { reason, ...change }, seen, response }) => {
      const part = { table: loadCases, word: 'load case', unique: 'load_cases_name' } as const;
      const changed = await changePart(deps, actor, part, params.id, seen, change, reason);
      response.setHeader('ETag', etag(changed.version));
      return loadCaseView(changed);
    },
  );

  const cycle = {
    table: operatingCycles,
    word: 'operating cycle',
    unique: 'operating_cycles_name',
  } as const;
  api.serve(operatingCycleRoutes.list, async ({ actor, params }) => ({
    rows: await (await of(actor.siteId, params.id)).operatingCycles(params.id),
  }));
  api.serve(operatingCycleRoutes.add, ({ actor, params, body }) =>
    addPart(deps, actor, cycle, params.id, body),
  );
  api.serve(
    operatingCycleRoutes.change,
    async ({ actor, params, body: { reason, ...change }, seen, response }) => {
      const changed = await changePart(deps, actor, cycle, params.id, seen, change, reason);
      response.setHeader('ETag', etag(changed.version));
      return changed;
    },
  );
  api.serve(removeOperatingCycle, ({ actor, params, query, seen }) =>
    removePart(deps, actor, cycle, params.id, seen, query.reason),
  );
}
