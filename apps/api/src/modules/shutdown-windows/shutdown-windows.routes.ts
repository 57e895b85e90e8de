import {
  addWindow,
  changeWindow as changeRoute,
  listWindows,
  readWindow,
} from '@ligament/domain/contract/shutdown-windows';
import type { Deps } from '../../deps';
import { notFound, unacceptable } from '../../http/failure';
import { refuseRepeat } from '../../http/refuse-repeat';
import { etag, type Api } from '../../http/serve';
import { writeHistory } from '../history/write-history';
import { changeWindow } from './change-window';
import { windowRepository } from './window.repository';

/** Shutdown windows. */
export function serveShutdownWindows(api: Api, deps: Deps): void {
  const { db, clock } = deps;

  api.serve(listWindows, async ({ actor }) => ({
    rows: await windowRepository(db).list(actor.siteId),
  }));

  api.serve(readWindow, async ({ actor, params, response }) => {
    const found = await windowRepository(db).byId(actor.siteId, params.id);
    if (!found) throw notFound('shutdown window');
    response.setHeader('ETag', etag(found.version));
    return found;
  });

  api.serve(addWindow, ({ actor, body: { unitIds, ...body } }) =>
    refuseRepeat('shutdown_windows_code', 'code', `There is already a window ${body.code}.`, () =>
      db.transaction(async (tx) => {
        const repository = windowRepository(tx);
        if (!(await repository.unitsAreOurs(actor.siteId, unitIds)))
          throw unacceptable('window.units', 'Choose units of this site.', 'unitIds');
        const now = clock.now();
        const added = await repository.add({
          ...body,
          siteId: actor.siteId,
          createdAt: now,
          updatedAt: now,
        });
        if (!added) throw notFound('shutdown window');
        await repository.setUnits(added.id, unitIds);
        const view = await repository.byId(actor.siteId, added.id);
        if (!view) throw notFound('shutdown window');
        await writeHistory(tx, actor, now, {
          action: 'shutdown-window.added',
          entity: 'shutdown window',
          entityId: added.id,
          summary: `Shutdown window ${view.code} of ${view.unitCodes.join(', ')} added, ${view.startsOn} to ${view.endsOn}`,
          after: view,
        });
        return view;
      }),
    ),
  );

  api.serve(changeRoute, async ({ actor, params, body, seen, response }) => {
    const answer = await changeWindow(deps, actor, params.id, seen, body);
    response.setHeader('ETag', etag(answer.window.version));
    return answer;
  });
}
