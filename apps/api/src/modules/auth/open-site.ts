import { randomUUID } from 'node:crypto';
import { DEFAULT_SITE_RULES } from '@ligament/domain/contract/site-rules';
import { GROWTH_LAWS } from '@ligament/domain/materials/growth-laws';
import { growthLaws } from '@ligament/domain/schema/materials';
import { siteRuleVersions, sites } from '@ligament/domain/schema/sites';
import type { Transaction } from '../../db/database';
import type { HistoryActor } from '../../http/actor';
import { siteDay } from '../../http/site-day';
import { writeHistory } from '../history/write-history';

export interface NewSite {
  readonly id?: string;
  readonly code: string;
  readonly name: string;
  readonly timeZone: string;
  readonly demo: boolean;
}

/** Opens a site with the rules and the library of growth laws a new site starts with; answers its identifier. */
export async function openSite(
  tx: Transaction,
  now: Date,
  by: Omit<HistoryActor, 'siteId'>,
  site: NewSite,
): Promise<string> {
  const id = site.id ?? randomUUID();
  const { code, name, timeZone, demo } = site;
  await tx.insert(sites).values({ id, code, name, timeZone, demo, createdAt: now });
  const ruleVersion = {
    siteId: id,
    number: 1,
    effectiveOn: siteDay(now, timeZone),
    rules: DEFAULT_SITE_RULES,
    reason:
      'Rules a new site starts with: common practice, to be replaced by the owner’s procedure.',
    createdBy: by.name,
    createdAt: now,
  };
  await tx.insert(siteRuleVersions).values(ruleVersion);
  await tx.insert(growthLaws).values(libraryOf(id, now));
  const actor = { ...by, siteId: id };
  await writeHistory(tx, actor, now, {
    action: 'site.opened',
    entity: 'site',
    entityId: id,
    summary: `Opened the site ${code}, ${name}`,
    after: { code, name, timeZone, demo },
  });
  await writeHistory(tx, actor, now, {
    action: 'site-rules.recorded',
    entity: 'site rules',
    entityId: id,
    summary: 'Recorded version 1 of the site rules',
    after: { number: 1, effectiveOn: ruleVersion.effectiveOn, ...DEFAULT_SITE_RULES },
    reason: ruleVersion.reason,
  });
  return id;
}

const libraryOf = (siteId: string, now: Date) =>
  GROWTH_LAWS.map(({ key, title, environment, stages, thresholdMPaSqrtMm, source }) => ({
    siteId,
    key,
    title,
    environment,
    stages,
    thresholdMpaSqrtMm: thresholdMPaSqrtMm,
    source,
    createdAt: now,
    updatedAt: now,
  }));
