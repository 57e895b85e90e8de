import {
  addGrowthLaw,
  changeGrowthLaw,
  listGrowthLaws,
} from '@ligament/domain/contract/growth-laws';
import type { Deps } from '../../deps';
import { notFound, staleVersion } from '../../http/failure';
import { refuseRepeat } from '../../http/refuse-repeat';
import { etag, type Api } from '../../http/serve';
import { writeHistory } from '../history/write-history';
import { growthLawRepository, type GrowthLawRow } from './growth-law.repository';

const view = (row: GrowthLawRow) => ({ ...row, stages: [...row.stages] });

/** The site's fatigue growth laws, each with its source. */
export function serveGrowthLaws(api: Api, { db, clock }: Deps): void {
  api.serve(listGrowthLaws, async ({ actor }) => ({
    rows: (await growthLawRepository(db).list(actor.siteId)).map(view),
  }));

  api.serve(addGrowthLaw, ({ actor, body }) =>
    refuseRepeat(
      'growth_laws_key',
      'key',
      `There is already a growth law with the key “${body.key}”.`,
      () =>
        db.transaction(async (tx) => {
          const now = clock.now();
          const added = await growthLawRepository(tx).add({
            ...body,
            siteId: actor.siteId,
            createdAt: now,
            updatedAt: now,
          });
          if (!added) throw notFound('growth law');
          await writeHistory(tx, actor, now, {
            action: 'growth-law.added',
            entity: 'growth law',
            entityId: added.id,
            summary: `Growth law ${added.title} added`,
            after: added,
          });
          return view(added);
        }),
    ),
  );

  api.serve(changeGrowthLaw, ({ actor, params, body: { reason, ...change }, seen, response }) =>
    db.transaction(async (tx) => {
      const repository = growthLawRepository(tx);
      const before = await repository.byId(actor.siteId, params.id);
      if (!before) throw notFound('growth law');
      const now = clock.now();
      const after = await repository.change(actor.siteId, params.id, seen, {
        ...change,
        updatedAt: now,
      });
      if (!after) throw staleVersion('growth law', view(before));
      await writeHistory(tx, actor, now, {
        action: 'growth-law.changed',
        entity: 'growth law',
        entityId: after.id,
        summary: `Growth law ${after.title} changed`,
        before,
        after,
        reason,
      });
      response.setHeader('ETag', etag(after.version));
      return view(after);
    }),
  );
}
