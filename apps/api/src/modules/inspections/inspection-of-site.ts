import type { Database } from '../../db/database';
import { inspectionRepository, type InspectionRecord } from './inspection.repository';

/** An inspection of the site, for use cases of other modules. */
export async function inspectionOfSite(
  db: Database,
  siteId: string,
  id: string,
): Promise<InspectionRecord | undefined> {
  return (await inspectionRepository(db).byId(siteId, id))?.inspection;
}
