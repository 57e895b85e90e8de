import type { recordSiteRules as route } from '@ligament/domain/contract/rules';
import { canonicalJson } from '@ligament/domain/records/canonical-json';
import type { z } from 'zod';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { conflict, notFound, staleVersion, unacceptable } from '../../http/failure';
import { siteDay } from '../../http/site-day';
import { writeHistory } from '../history/write-history';
import { siteRulesRepository, type SiteRulesRow } from './site-rules.repository';
import { siteRulesView } from './site-rules-view';

type Input = z.output<typeof route.body>;

/** Records a new version of the rules. Earlier versions stay, because assessments made under them cite them. */
export function recordSiteRules(
  { db, clock }: Deps,
  actor: Actor,
  seen: number,
  input: Input,
): Promise<SiteRulesRow> {
  refuseUnorderedLeads(input.rules.reminderLeadDays);
  return db.transaction(async (tx) => {
    const now = clock.now();
    const repository = siteRulesRepository(tx);
    const { newest, timeZone } = await repository.lockNewest(actor.siteId);
    if (!newest) throw notFound('set of site rules');
    if (newest.number !== seen) throw staleVersion('set of site rules', siteRulesView(newest));
    if (input.effectiveOn > siteDay(now, timeZone)) {
      throw unacceptable(
        'site-rules.future',
        'Rules are in force from the moment they are recorded: give today or an earlier day, and record them again when the day has come.',
        'effectiveOn',
      );
    }
    if (canonicalJson(newest.rules) === canonicalJson(input.rules)) {
      throw conflict(
        'site-rules.unchanged',
        `These rules are the same as version ${newest.number}.`,
      );
    }
    const added = await repository.add({
      siteId: actor.siteId,
      number: newest.number + 1,
      ...input,
      createdBy: actor.name,
      createdAt: now,
    });
    if (!added) throw new Error('the new version of the site rules was not returned');
    await writeHistory(tx, actor, now, {
      action: 'site-rules.recorded',
      entity: 'site rules',
      entityId: actor.siteId,
      summary: `Recorded version ${added.number} of the site rules`,
      before: { number: newest.number, effectiveOn: newest.effectiveOn, ...newest.rules },
      after: { number: added.number, effectiveOn: added.effectiveOn, ...added.rules },
      reason: input.reason,
    });
    return added;
  });
}

/** The longest lead comes first, none twice: each day is one mail. */
function refuseUnorderedLeads(days: readonly number[]): void {
  const ordered = days.every((day, index) => index === 0 || day < (days[index - 1] ?? 0));
  if (!ordered) {
    throw unacceptable(
      'site-rules.leads',
      'List the days before the due date from the longest to the shortest, each once.',
      'rules.reminderLeadDays',
    );
  }
}
