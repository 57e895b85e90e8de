import { readToday } from '@ligament/domain/contract/today';
import type { Deps } from '../../deps';
import type { Api } from '../../http/serve';
import { currentSiteRules } from '../site-rules/current-site-rules';
import { todayAt } from '../site/site-clock';
import { todayGroups } from './today-groups';

/** A person's work on landing. */
export function serveToday(api: Api, { db, clock }: Deps): void {
  api.serve(readToday, async ({ actor }) => {
    const today = await todayAt(db, clock, actor.siteId);
    const { rules } = await currentSiteRules(db, actor.siteId);
    return {
      today,
      groups: await todayGroups(db, { ...actor, today, dueSoonDays: rules.dueSoonDays }),
    };
  });
}
