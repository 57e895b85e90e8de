import { addUnit, changeUnit, listUnits } from '@ligament/domain/contract/units';
import type { Deps } from '../../deps';
import { notFound, staleVersion } from '../../http/failure';
import { refuseRepeat } from '../../http/refuse-repeat';
import type { Api } from '../../http/serve';
import { writeHistory } from '../history/write-history';
import { unitRepository } from './unit.repository';

/** Units of the site. */
export function serveUnits(api: Api, { db, clock }: Deps): void {
  api.serve(listUnits, async ({ actor }) => ({
    rows: await unitRepository(db).list(actor.siteId),
  }));

  api.serve(addUnit, ({ actor, body }) =>
    refuseRepeat('units_code', 'code', `There is already a unit ${body.code}.`, () =>
      db.transaction(async (tx) => {
        const added = await unitRepository(tx).add({ ...body, siteId: actor.siteId });
        if (!added) throw notFound('unit');
        await writeHistory(tx, actor, clock.now(), {
          action: 'unit.added',
          entity: 'unit',
          entityId: added.id,
          summary: `Unit ${added.code} ${added.name} added`,
          after: added,
        });
        return { ...added, components: 0 };
      }),
    ),
  );

  api.serve(changeUnit, ({ actor, params, body: { reason, ...change }, seen }) =>
    refuseRepeat('units_code', 'code', `There is already a unit ${change.code}.`, () =>
      db.transaction(async (tx) => {
        const repository = unitRepository(tx);
        const before = await repository.byId(actor.siteId, params.id);
        if (!before) throw notFound('unit');
        const after = await repository.change(actor.siteId, params.id, seen, change);
        if (!after) throw staleVersion('unit', before);
        await writeHistory(tx, actor, clock.now(), {
          action: 'unit.changed',
          entity: 'unit',
          entityId: after.id,
          summary: `Unit ${after.code} changed`,
          before: { code: before.code, name: before.name },
          after: { code: after.code, name: after.name },
          reason,
        });
        return { ...after, components: before.components };
      }),
    ),
  );
}
