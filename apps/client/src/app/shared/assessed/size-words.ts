import { hasHeight, lengthIsOneSided } from '@ligament/domain/geometry/flaw-kind';
import type { AssessedCase } from './assessed-case';

/** The extents of an assessed flaw as they are measured, with the names they go by. */
export interface AssessedSize {
  readonly heightMm: number;
  readonly lengthMm: number;
  /** Depth of a flaw that opens to a face, height of an embedded one. */
  readonly heightWord: 'depth' | 'height';
  readonly heightSymbol: 'a' | '2a';
  /** Length from the edge, or from end to end. */
  readonly lengthSymbol: 'c' | '2c';
  /** Whether height can change; through the wall and through an edge only length can. */
  readonly byHeight: boolean;
}

export function assessedSize({ input: { flaw, wall }, outcome }: AssessedCase): AssessedSize {
  const { aMm, cMm, heightMm } = outcome.assessed;
  const oneSided = lengthIsOneSided(flaw.kind, wall.shape);
  const embedded = flaw.kind === 'embedded';
  return {
    heightMm,
    lengthMm: flaw.kind === 'edge' ? aMm : oneSided ? cMm : 2 * cMm,
    heightWord: embedded ? 'height' : 'depth',
    heightSymbol: embedded ? '2a' : 'a',
    lengthSymbol: oneSided ? 'c' : '2c',
    byHeight: hasHeight(flaw.kind),
  };
}
