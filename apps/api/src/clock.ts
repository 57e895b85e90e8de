/** Where "now" comes from, so that tests and journeys can set it. */
export interface Clock {
  now(): Date;
}

export const systemClock: Clock = { now: () => new Date() };

/** A clock that stands still until it is moved. */
export function settableClock(start: Date): Clock & { set(to: Date): void } {
  let current = start;
  return {
    now: () => new Date(current),
    set: (to) => {
      current = to;
    },
  };
}
