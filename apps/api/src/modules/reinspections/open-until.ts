import type { Database } from '../../db/database';
import {
  reinspectionListRepository,
  type ReinspectionListRow,
} from './reinspection-list.repository';

/** Re-inspections still to be done whose due date lies no later than a day. */
export const openReinspectionsUntil = (
  db: Database,
  siteId: string,
  until: string,
): Promise<ReinspectionListRow[]> => reinspectionListRepository(db).openUntil(siteId, until);
