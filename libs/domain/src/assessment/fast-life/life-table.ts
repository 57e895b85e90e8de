/** Lives of many flaws, one list for each number; a row refused has stop `refused` and 0 elsewhere. */
export interface LifeTable {
  readonly cycles: Float64Array;
  readonly depthMm: Float64Array;
  readonly halfLengthMm: Float64Array;
  /** Index into LIFE_STOPS. */
  readonly stop: Uint8Array;
  readonly evaluations: Int32Array;
}

/** A table with room for a number of lives. */
export const lifeTable = (rows: number): LifeTable => ({
  cycles: new Float64Array(rows),
  depthMm: new Float64Array(rows),
  halfLengthMm: new Float64Array(rows),
  stop: new Uint8Array(rows),
  evaluations: new Int32Array(rows),
});
