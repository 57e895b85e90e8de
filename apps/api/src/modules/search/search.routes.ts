import { searchEverything } from '@ligament/domain/contract/search';
import type { Deps } from '../../deps';
import type { Api } from '../../http/serve';
import { searchRepository } from './search.repository';

const MOST = 20;

/** Search over everything on the site. */
export function serveSearch(api: Api, { db }: Deps): void {
  api.serve(searchEverything, async ({ actor, query }) => {
    const repository = searchRepository(db, actor.siteId, query.q);
    const hits = await Promise.all([
      repository.components(),
      repository.flaws(),
      repository.locations(),
      repository.inspections(),
    ]);
    return { items: hits.flat().slice(0, MOST) };
  });
}
