import type { SiteRulesVersion } from '@ligament/domain/contract/rules';
import type { SiteRulesRow } from './site-rules.repository';

/** A version of the rules as it leaves the server. */
export const siteRulesView = (row: SiteRulesRow): SiteRulesVersion => ({
  ...row,
  createdAt: row.createdAt.toISOString(),
});
