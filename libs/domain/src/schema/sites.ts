import { boolean, date, integer, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import type { SiteRules } from '../contract/site-rules';
import { createdAt, key, version } from './columns';

export const sites = pgTable('sites', {
  id: key(),
  code: text('code').notNull().unique(),
  name: text('name').notNull(),
  timeZone: text('time_zone').notNull(),
  /** Whether this is the invented demonstration plant. */
  demo: boolean('demo').notNull().default(false),
  version: version(),
  createdAt: createdAt(),
});

export const siteRuleVersions = pgTable(
  'site_rule_versions',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    number: integer('number').notNull(),
    effectiveOn: date('effective_on', { mode: 'string' }).notNull(),
    rules: jsonb('rules').$type<SiteRules>().notNull(),
    reason: text('reason').notNull(),
    createdBy: text('created_by').notNull(),
    createdAt: createdAt(),
  },
  (t) => [unique('site_rule_versions_number').on(t.siteId, t.number)],
);

export const units = pgTable(
  'units',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    code: text('code').notNull(),
    name: text('name').notNull(),
    version: version(),
  },
  (t) => [unique('units_code').on(t.siteId, t.code)],
);
