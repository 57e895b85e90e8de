import type { Database } from '../../db/database';
import { flawRepository, type FlawRecord } from './flaw.repository';

/** A flaw of the site as it is kept, for use cases of other modules. */
export async function readFlawRecord(
  db: Database,
  siteId: string,
  id: string,
): Promise<FlawRecord | undefined> {
  return (await flawRepository(db).byId(siteId, id))?.flaw;
}

/** The newest finding of a flaw that counts. */
export async function newestFinding(db: Database, flawId: string) {
  return (await flawRepository(db).findings(flawId)).at(-1);
}
