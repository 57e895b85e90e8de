import {
  addMaterial,
  changeMaterial,
  listMaterials,
  readMaterial,
} from '@ligament/domain/contract/materials';
import type { Deps } from '../../deps';
import { cutPage, decodeCursor } from '../../http/cursor';
import { notFound, staleVersion, unacceptable } from '../../http/failure';
import { refuseRepeat } from '../../http/refuse-repeat';
import { etag, type Api } from '../../http/serve';
import { writeHistory } from '../history/write-history';
import { materialRepository } from './material.repository';
import { materialView } from './material-view';

/** The site's materials, each property with its origin. */
export function serveMaterials(api: Api, { db, clock }: Deps): void {
  api.serve(listMaterials, async ({ actor, query }) => {
    const after = query.cursor ? String(decodeCursor(query.cursor, ['string'])[0]) : undefined;
    const found = await materialRepository(db).list(actor.siteId, { ...query, after });
    const { rows, nextCursor } = cutPage(found, query.limit, ({ material }) => [material.name]);
    return { rows: rows.map((row) => materialView(row.material, row.components)), nextCursor };
  });

  api.serve(readMaterial, async ({ actor, params, response }) => {
    const found = await materialRepository(db).byId(actor.siteId, params.id);
    if (!found) throw notFound('material');
    response.setHeader('ETag', etag(found.material.version));
    return materialView(found.material, found.components);
  });

  api.serve(addMaterial, ({ actor, body }) =>
    refuseRepeat('materials_name', 'name', `There is already a material “${body.name}”.`, () =>
      db.transaction(async (tx) => {
        const now = clock.now();
        const added = await materialRepository(tx).add({
          ...body,
          siteId: actor.siteId,
          createdAt: now,
          updatedAt: now,
        });
        if (!added) throw notFound('material');
        await writeHistory(tx, actor, now, {
          action: 'material.added',
          entity: 'material',
          entityId: added.id,
          summary: `Material ${added.name} added`,
          after: added,
        });
        return materialView(added, 0);
      }),
    ),
  );

  api.serve(changeMaterial, ({ actor, params, body: { reason, ...change }, seen, response }) =>
    refuseRepeat('materials_name', 'name', `There is already a material “${change.name}”.`, () =>
      db.transaction(async (tx) => {
        const repository = materialRepository(tx);
        const before = await repository.byId(actor.siteId, params.id);
        if (!before) throw notFound('material');
        const merged = { ...before.material, ...change };
        if (merged.tensileMpa < merged.yieldMpa) {
          throw unacceptable(
            'material.strengths',
            'Tensile strength cannot be below yield strength.',
            'tensileMpa',
          );
        }
        const now = clock.now();
        const after = await repository.change(actor.siteId, params.id, seen, {
          ...change,
          updatedAt: now,
        });
        if (!after)
          throw staleVersion('material', materialView(before.material, before.components));
        await writeHistory(tx, actor, now, {
          action: 'material.changed',
          entity: 'material',
          entityId: after.id,
          summary: `Material ${after.name} changed`,
          before: before.material,
          after,
          reason,
        });
        response.setHeader('ETag', etag(after.version));
        return materialView(after, before.components);
      }),
    ),
  );
}
