import * as z from 'zod';
import { id, instant, isoDate, reason } from './primitives';
import { route } from './route';
import { siteRules } from './site-rules';

export const siteRulesVersion = z.object({
  id,
  number: z.number().int().describe('Counted from 1; the highest is in force'),
  effectiveOn: z.string().describe('Day from which the owner applies these rules'),
  rules: siteRules,
  reason: z.string(),
  createdBy: z.string(),
  createdAt: instant,
});
export type SiteRulesVersion = z.infer<typeof siteRulesVersion>;

export const readSiteRules = route({
  method: 'get',
  path: '/api/site-rules',
  summary: 'Rules in force and every earlier version, newest first',
  access: 'rules.read',
  response: z.object({ current: siteRulesVersion, versions: z.array(siteRulesVersion) }),
});

export const recordSiteRules = route({
  method: 'post',
  path: '/api/site-rules',
  summary:
    'Record a new version of the rules; If-Match carries the number of the version it replaces',
  access: 'rules.write',
  versioned: true,
  body: z.strictObject({
    rules: siteRules,
    effectiveOn: isoDate.describe(
      'Today or earlier: rules are in force from the moment they are recorded',
    ),
    reason,
  }),
  response: siteRulesVersion,
});
