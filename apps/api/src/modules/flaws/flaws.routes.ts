import {
  changeFlaw as changeFlawRoute,
  listFlaws,
  readFlaw,
} from '@ligament/domain/contract/flaws';
import { urgencyOf } from '@ligament/domain/scheduling/urgency';
import { addDays, formatISO, parseISO } from 'date-fns';
import type { Deps } from '../../deps';
import { cutPage } from '../../http/cursor';
import { etag, type Api } from '../../http/serve';
import { currentSiteRules } from '../site-rules/current-site-rules';
import { todayAt } from '../site/site-clock';
import { changeFlaw } from './change-flaw';
import { flawListRepository } from './flaw-list.repository';
import { readFlawView } from './flaw-view';

/** Flaws: the physical things, tracked across inspections. */
export function serveFlaws(api: Api, deps: Deps): void {
  const { db, clock } = deps;

  api.serve(listFlaws, async ({ actor, query }) => {
    const { rules } = await currentSiteRules(db, actor.siteId);
    const today = await todayAt(db, clock, actor.siteId);
    const dueSoonOn = formatISO(addDays(parseISO(today), rules.dueSoonDays), {
      representation: 'date',
    });
    const found = await flawListRepository(db).list(actor.siteId, query, today, dueSoonOn);
    const { rows, nextCursor } = cutPage(found, query.limit, (row) => [row.place, row.id]);
    return {
      rows: rows.map((row) => ({
        ...row,
        urgency: row.dueOn ? urgencyOf(row.dueOn, today, rules.dueSoonDays) : null,
      })),
      nextCursor,
    };
  });

  api.serve(readFlaw, async ({ actor, params, response }) => {
    const view = await readFlawView(db, clock, actor.siteId, params.id);
    response.setHeader('ETag', etag(view.version));
    return view;
  });

  api.serve(changeFlawRoute, async ({ actor, params, body, seen, response }) => {
    const view = await changeFlaw(deps, actor, params.id, seen, body);
    response.setHeader('ETag', etag(view.version));
    return view;
  });
}
