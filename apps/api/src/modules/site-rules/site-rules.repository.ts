import { siteRuleVersions, sites } from '@ligament/domain/schema/sites';
import { desc, eq } from 'drizzle-orm';
import type { Database } from '../../db/database';

export type SiteRulesRow = typeof siteRuleVersions.$inferSelect;

export const siteRulesRepository = (db: Database) => ({
  /** Every version, newest first. */
  versions(siteId: string): Promise<SiteRulesRow[]> {
    return db
      .select()
      .from(siteRuleVersions)
      .where(eq(siteRuleVersions.siteId, siteId))
      .orderBy(desc(siteRuleVersions.number));
  },

  /** The newest version, with the site held so that versions are numbered one after the other. */
  async lockNewest(
    siteId: string,
  ): Promise<{ newest: SiteRulesRow | undefined; timeZone: string }> {
    const [site] = await db.select().from(sites).where(eq(sites.id, siteId)).for('update');
    const [newest] = await db
      .select()
      .from(siteRuleVersions)
      .where(eq(siteRuleVersions.siteId, siteId))
      .orderBy(desc(siteRuleVersions.number))
      .limit(1);
    return { newest, timeZone: site?.timeZone ?? 'UTC' };
  },

  async add(row: typeof siteRuleVersions.$inferInsert): Promise<SiteRulesRow | undefined> {
    const [added] = await db.insert(siteRuleVersions).values(row).returning();
    return added;
  },
});
