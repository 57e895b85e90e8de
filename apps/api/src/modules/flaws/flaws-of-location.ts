import type { Database } from '../../db/database';
import { flawRepository, type FlawRecord } from './flaw.repository';

/** Flaws of one weld that may be found again, for use cases of other modules. */
export const flawsOfLocation = (db: Database, locationId: string) =>
  flawRepository(db).ofLocation(locationId);

/** A flaw of one component of the site; undefined when it belongs to another. */
export async function flawOfComponent(
  db: Database,
  siteId: string,
  componentId: string,
  flawId: string,
): Promise<FlawRecord | undefined> {
  const found = await flawRepository(db).byId(siteId, flawId);
  return found?.component.id === componentId ? found.flaw : undefined;
}
