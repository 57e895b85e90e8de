import { sites } from '@ligament/domain/schema/sites';
import type { Database } from '../../db/database';

export type SiteRow = typeof sites.$inferSelect;

/** Every site of the database, for work that no person asks for. */
export const allSites = (db: Database): Promise<SiteRow[]> => db.select().from(sites);
