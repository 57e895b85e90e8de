import type { ReinspectionView } from '@ligament/domain/contract/reinspections';
import type { Database } from '../../db/database';
import { reminderRepository } from './reminder.repository';

/** Reminders of a re-inspection, newest first. */
export async function remindersOf(
  db: Database,
  reinspectionId: string,
): Promise<ReinspectionView['reminders']> {
  const rows = await reminderRepository(db).of(reinspectionId);
  return rows.map((row) => ({
    ...row,
    sentAt: row.sentAt?.toISOString() ?? null,
    acknowledgedAt: row.acknowledgedAt?.toISOString() ?? null,
  }));
}
