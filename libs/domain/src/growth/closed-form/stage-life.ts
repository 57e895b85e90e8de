import { transition, type GrowthLaw, type LawStage } from '../growth-law';
import { integralPerCycle, lifeIntegral, sizeOfIntegral } from './power-life';

/** One stage as it holds between two sizes at one drive. */
interface Piece {
  readonly stage: LawStage;
  readonly upTo: number;
}

/**
 * Size at which ΔK = Y ΔS √(πa) reaches a value: (ΔK/(Y ΔS))²/π.
 * @param range range of stress intensity, ΔK [MPa·√mm]
 * @param drive Y ΔS [MPa]
 * @returns size a [mm]
 * @validity drive above 0
 * @source inverse of ΔK = Y ΔS √(πa)
 * @example sizeAtRange(Math.sqrt(Math.PI) * 100, 50) // 4
 */
export const sizeAtRange = (range: number, drive: number): number => (range / drive) ** 2 / Math.PI;

/** The stages with the size up to which each holds. */
const piecesOf = ({ stages }: GrowthLaw, drive: number): readonly Piece[] =>
  stages.map((stage, i) => {
    const next = stages[i + 1];
    return { stage, upTo: next ? sizeAtRange(transition(stage, next), drive) : Infinity };
  });

/**
 * Whether the flaw grows at all: ΔK only rises with the size, so the first size decides.
 * @param law stages and threshold [MPa·√mm]
 * @param drive Y ΔS [MPa]
 * @param size first size [mm]
 * @returns true when ΔK is at or above the threshold [-]
 * @validity constant Y
 * @source ΔK = Y ΔS √(πa) against the threshold of the law
 * @example growsFrom({ stages: [], thresholdMPaSqrtMm: 100 }, 50, 4) // 1
 */
export const growsFrom = (law: GrowthLaw, drive: number, size: number): boolean =>
  drive > 0 && drive * Math.sqrt(Math.PI * size) >= law.thresholdMPaSqrtMm;

/**
 * Cycles from one size to another at constant Y and ΔS, split where the stages of the law meet.
 * @param law stages and threshold [MPa·√mm]
 * @param drive Y ΔS [MPa]
 * @param sizes first and last size [mm]
 * @returns cycles [cycles]
 * @validity growing from the first size; constant Y
 * @source sum of the closed forms of the pieces
 * @example cyclesThroughStages({ stages: [{ coefficient: 1e-15, exponent: 4 }], thresholdMPaSqrtMm: 0 }, 80, [2, 20]) // 1113147.7695
 */
export function cyclesThroughStages(
  law: GrowthLaw,
  drive: number,
  [from, to]: readonly [from: number, to: number],
): number {
  let [at, cycles] = [from, 0];
  for (const { stage, upTo } of piecesOf(law, drive)) {
    const end = Math.min(to, upTo);
    if (end <= at) continue;
    cycles += lifeIntegral(stage.exponent, at, end) / integralPerCycle(stage, drive);
    at = end;
  }
  return cycles;
}

/**
 * Size after a number of cycles at constant Y and ΔS, through the stages of the law.
 * @param law stages and threshold [MPa·√mm]
 * @param drive Y ΔS [MPa]
 * @param from first size [mm]
 * @param cycles cycles done [cycles]
 * @returns size; Infinity when the cycles are more than any size can take [mm]
 * @validity growing from the first size; constant Y
 * @source inverse of the closed form, piece by piece
 * @example sizeThroughStages({ stages: [{ coefficient: 1e-15, exponent: 4 }], thresholdMPaSqrtMm: 0 }, 80, 2, 1113147.7695) // 20.00000
 */
export function sizeThroughStages(
  law: GrowthLaw,
  drive: number,
  from: number,
  cycles: number,
): number {
  let [at, left] = [from, cycles];
  for (const { stage, upTo } of piecesOf(law, drive)) {
    if (at >= upTo) continue;
    const perCycle = integralPerCycle(stage, drive);
    const size = sizeOfIntegral(stage.exponent, at, left * perCycle);
    if (size <= upTo) return size;
    left -= lifeIntegral(stage.exponent, at, upTo) / perCycle;
    at = upTo;
  }
  return Infinity;
}
