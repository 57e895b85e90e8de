/** Takes one value after the other and hands on those at which the history turns. */
export interface TurningPoints {
  readonly push: (value: number) => void;
  /** Hands on the last point; nothing may be pushed after it. */
  readonly end: () => void;
}

/**
 * Turning points of a history, first and last point included. A turn counts once the history has gone back
 * by more than the dead band; with a band of 0 every turn counts and equal neighbours count once.
 */
export function turningPoints(deadBand: number, emit: (value: number) => void): TurningPoints {
  let [low, high] = [Infinity, -Infinity];
  let candidate = Number.NaN;
  let direction: -1 | 0 | 1 = 0;
  const turn = (from: number, to: number) => {
    emit(from);
    candidate = to;
    direction = to > from ? 1 : -1;
  };
  const begin = (value: number) => {
    [low, high] = [Math.min(low, value), Math.max(high, value)];
    if (value - low > deadBand) turn(low, value);
    else if (high - value > deadBand) turn(high, value);
  };
  const push = (value: number) => {
    if (direction === 0) begin(value);
    else if ((value - candidate) * direction >= 0) candidate = value;
    else if (Math.abs(value - candidate) > deadBand) turn(candidate, value);
  };
  return {
    push,
    end: () => {
      if (direction !== 0) emit(candidate);
    },
  };
}
