import { refused, type Refused } from '../../geometry/refusal';
import {
  leakBeforeBreak,
  type LeakBeforeBreak,
  type LeakStatement,
} from '../../growth/leak-before-break';
import { throughWallHalfLength } from '../../growth/recategorise';
import type { AssessmentInput } from '../assessment-input';
import { characterise } from '../characterise';
import { limitingSize } from '../limiting-size';
import { prepareCase } from '../prepare-case';

/** What a person adds to the case for leak before break. */
export interface LeakCase {
  /** Length whose leak is certain to be noticed [mm]; null when it is not known. */
  readonly leakingLengthMm: number | null;
  readonly factorOnLength: number;
  readonly statements: Readonly<Partial<Record<LeakStatement, boolean>>>;
}

/** The answer with the critical length it was held against. */
export interface LeakAnswer extends LeakBeforeBreak {
  /** Length at which a flaw through this wall stops being acceptable [mm]. */
  readonly criticalLengthMm: number;
  readonly criticalBecause: string;
}

/**
 * Whether the assessed flaw would leak, and be noticed, before it breaks: the flaw that has broken through is
 * assessed as a through-wall flaw in the same wall under the same load.
 */
export function leakOfFlaw(input: AssessmentInput, leak: LeakCase): LeakAnswer | Refused {
  const { wall, flaw } = input;
  if (wall.shape !== 'plate' && wall.shape !== 'cylinder' && wall.shape !== 'sphere') {
    return refused(noThroughWall(wall.shape));
  }
  const before = characterise(input);
  const deepest = Math.min(before.height, wall.thicknessMm.value * (1 - 1e-9));
  const through = throughWallCase(
    input,
    throughWallHalfLength(deepest, before.c, wall.thicknessMm.value),
  );
  const prepared = prepareCase(through);
  if (prepared.status === 'refused') return prepared;
  const critical = limitingSize(prepared.section, prepared.flaw);
  if (critical.lengthMm === null) return refused(noCriticalLength(flaw.kind, critical.because));
  const answer = leakBeforeBreak({
    depthMm: deepest,
    halfLengthMm: before.c,
    thicknessMm: wall.thicknessMm.value,
    criticalHalfLengthMm: critical.lengthMm / 2,
    leakingHalfLengthMm: leak.leakingLengthMm === null ? null : leak.leakingLengthMm / 2,
    factorOnLength: leak.factorOnLength,
    statements: leak.statements,
  });
  return answer.status === 'refused'
    ? answer
    : { ...answer, criticalLengthMm: critical.lengthMm, criticalBecause: critical.because };
}

/** The same wall and load with the flaw that has broken through; the allowance is in its size already. */
function throughWallCase(input: AssessmentInput, halfLength: number): AssessmentInput {
  const none = { value: 0, provenance: 'assumed', note: 'in the size already' } as const;
  return {
    ...input,
    flaw: {
      ...input.flaw,
      kind: 'through-wall',
      lengthMm: { ...input.flaw.lengthMm, value: 2 * halfLength },
      ligamentMm: null,
    },
    sizing: { heightAllowanceMm: none, lengthAllowanceMm: none },
    // a factor on size has been applied to the flaw before
    partialFactors: input.partialFactors ? { ...input.partialFactors, size: 1 } : null,
  };
}

const noThroughWall = (shape: string) => ({
  input: 'wall.shape',
  limit: 'plate, cylinder or sphere',
  value: shape,
  message: `No through-wall solution here covers a ${shape}.`,
  instead: 'Ask a specialist; leak before break is not shown.',
});

const noCriticalLength = (kind: string, because: string) => ({
  input: 'flaw.lengthMm',
  limit: 'a critical length of the through-wall flaw',
  value: kind,
  message: `No critical length was found: ${because}`,
  instead: 'Leak before break is not shown.',
});
