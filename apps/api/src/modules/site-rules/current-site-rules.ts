import type { SiteRules } from '@ligament/domain/contract/site-rules';
import { siteRuleVersions } from '@ligament/domain/schema/sites';
import { desc, eq } from 'drizzle-orm';
import type { Database } from '../../db/database';
import { notFound } from '../../http/failure';

export interface CurrentSiteRules {
  readonly id: string;
  readonly number: number;
  readonly rules: SiteRules;
}

/** The rules in force: the version recorded last, since a version takes effect no later than the day it is recorded. */
export async function currentSiteRules(db: Database, siteId: string): Promise<CurrentSiteRules> {
  const [row] = await db
    .select({
      id: siteRuleVersions.id,
      number: siteRuleVersions.number,
      rules: siteRuleVersions.rules,
    })
    .from(siteRuleVersions)
    .where(eq(siteRuleVersions.siteId, siteId))
    .orderBy(desc(siteRuleVersions.number))
    .limit(1);
  if (!row) throw notFound('set of site rules');
  return row;
}
