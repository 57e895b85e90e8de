import type { GrowthLaw } from '../../growth/growth-law';
import type { FlawTable } from './flaw-table';
import { followTable } from './follow-table';
import { lawPieces } from './law-pieces';
import { STANDARD, type LifeAccuracy } from './life-accuracy';
import { lifeTable, type LifeTable } from './life-table';

/** Lives of a table of surface flaws that grow by one law, each the same to the last bit as if it stood alone. */
export function surfaceFlawLives(
  table: FlawTable,
  law: GrowthLaw,
  accuracy: LifeAccuracy = STANDARD,
): LifeTable {
  const lives = lifeTable(table.thicknessMm.length);
  followTable(table, lawPieces(law), accuracy, lives);
  return lives;
}
