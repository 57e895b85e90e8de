import type { WindowView } from '@ligament/domain/contract/shutdown-windows';
import type { Database } from '../../db/database';
import { windowRepository } from './window.repository';

/** Windows of a unit from a day on, for use cases of other modules. */
export const windowsOfUnit = (
  db: Database,
  siteId: string,
  unitId: string,
  from: string,
): Promise<WindowView[]> => windowRepository(db).ofUnit(siteId, unitId, from);

export const windowOfSite = (
  db: Database,
  siteId: string,
  id: string,
): Promise<WindowView | undefined> => windowRepository(db).byId(siteId, id);
