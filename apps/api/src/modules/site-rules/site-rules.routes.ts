import {
  readSiteRules,
  recordSiteRules as recordSiteRulesRoute,
} from '@ligament/domain/contract/rules';
import type { Deps } from '../../deps';
import { notFound } from '../../http/failure';
import { etag, type Api } from '../../http/serve';
import { recordSiteRules } from './record-site-rules';
import { siteRulesRepository } from './site-rules.repository';
import { siteRulesView } from './site-rules-view';

/** The site's rules and their versions. */
export function serveSiteRules(api: Api, deps: Deps): void {
  api.serve(readSiteRules, async ({ actor, response }) => {
    const versions = await siteRulesRepository(deps.db).versions(actor.siteId);
    const [current] = versions;
    if (!current) throw notFound('set of site rules');
    response.setHeader('ETag', etag(current.number));
    return { current: siteRulesView(current), versions: versions.map(siteRulesView) };
  });

  api.serve(recordSiteRulesRoute, async ({ actor, body, seen, response }) => {
    const recorded = await recordSiteRules(deps, actor, seen, body);
    response.setHeader('ETag', etag(recorded.number));
    return siteRulesView(recorded);
  });
}
