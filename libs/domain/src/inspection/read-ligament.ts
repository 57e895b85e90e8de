import type { FlawKind } from '../contract/vocabulary';
import type { ImportContext } from './import-context';
import type { Size } from './read-size';
import type { RowCells } from './row-cells';
import type { ProblemList } from './row-problem';
import { depthTolerance, marginsOf } from './wall-margins';

/**
 * Ligament of an embedded flaw to the nearer surface [mm], as stated or by the depths; null for one that opens to a face.
 * Height and ligament must lie within the wall, and a stated ligament must agree with the depths.
 */
export function readLigament(
  read: RowCells,
  context: ImportContext,
  size: Size | undefined,
  kind: FlawKind,
  stated: number | null,
  problems: ProblemList,
): number | null {
  const tell = (level: 'stop' | 'hold', message: string) =>
    problems.add(level, 'ligament', read.text('ligament'), message);
  if (stated !== null && stated < 0) {
    tell('stop', 'A ligament cannot be negative. Enter the metal between flaw and nearer surface.');
    return null;
  }
  if (kind !== 'embedded') return null;
  const metal = marginsOf(context, size);
  const byDepths = metal && round(Math.max(0, Math.min(metal.above, metal.below)));
  const ligament = stated ?? byDepths ?? null;
  if (!ligament) {
    tell(
      'stop',
      'An embedded flaw needs its ligament to the nearer surface, above 0 mm. Enter it, or call the flaw surface-breaking.',
    );
    return null;
  }
  const wall = size?.wallMm ?? context.wallMm;
  if (size && size.heightMm + ligament >= wall) {
    tell(
      'stop',
      `Height ${size.heightMm} mm and ligament ${ligament} mm together are not less than the wall of ${wall} mm. Check decimal mark and unit.`,
    );
    return null;
  }
  if (stated !== null && byDepths !== undefined) {
    if (Math.abs(stated - byDepths) > depthTolerance(wall)) {
      tell(
        'hold',
        `Ligament ${stated} mm does not agree with the depths, by which ${byDepths} mm remain. The stated one is used; confirm or correct it.`,
      );
    }
  } else if (size && stated !== null && stated > (wall - size.heightMm) / 2) {
    tell(
      'hold',
      `${stated} mm is more than half of the metal left: the ligament is counted to the nearer surface. Confirm or correct it.`,
    );
  }
  return ligament;
}

const round = (value: number): number => Math.round(value * 100) / 100;
