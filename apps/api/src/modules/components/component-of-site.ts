import type { Database } from '../../db/database';
import { componentRepository, type ComponentRecord } from './component.repository';

/** A component of the site, for use cases of other modules. */
export async function componentOfSite(
  db: Database,
  siteId: string,
  id: string,
): Promise<ComponentRecord | undefined> {
  return (await componentRepository(db).byId(siteId, id))?.component;
}

/** Welds and places of a component. */
export const locationsOf = (db: Database, componentId: string) =>
  componentRepository(db).locations(componentId);
