import {
  exportHistory,
  listComponentHistory as listComponentHistoryRoute,
  listHistory as listHistoryRoute,
  listHistoryActors,
  verifyHistory as verifyHistoryRoute,
} from '@ligament/domain/contract/history';
import type { Deps } from '../../deps';
import { answerCsv } from '../../http/csv-answer';
import { logSecurity } from '../../http/security-log';
import type { Api } from '../../http/serve';
import { siteDay } from '../../http/site-day';
import { HISTORY_COLUMNS, historyRows } from './export-history';
import { historyRepository } from './history.repository';
import { listComponentHistory, listHistory } from './list-history';
import { verifyHistory } from './verify-history';

/** What happened, by whom and why; and the proof that nobody has touched it since. */
export function serveHistory(api: Api, deps: Deps): void {
  const { db } = deps;
  const repository = historyRepository(db);

  api.serve(listHistoryRoute, ({ actor, query }) => listHistory(db, actor.siteId, query));

  api.serve(listComponentHistoryRoute, ({ actor, params, query }) =>
    listComponentHistory(db, actor.siteId, params.id, query),
  );

  api.serve(listHistoryActors, async ({ actor, query }) => ({
    rows: (await repository.actors(actor.siteId, query.component)).map(({ id, name }) => ({
      id: id ?? 'system',
      name,
    })),
  }));

  api.serve(verifyHistoryRoute, ({ actor, query }) => verifyHistory(db, actor.siteId, query.noted));

  api.stream(exportHistory, async ({ actor, query, response }) => {
    const site = await repository.site(actor.siteId);
    const today = siteDay(deps.clock.now(), site?.timeZone ?? 'UTC');
    logSecurity(deps.log, 'export', { personId: actor.personId, what: 'history' });
    const rows = historyRows(db, actor.siteId, query);
    await answerCsv(
      response,
      `${site?.code ?? 'site'}-history-${today}.csv`,
      HISTORY_COLUMNS,
      rows,
    );
  });
}
