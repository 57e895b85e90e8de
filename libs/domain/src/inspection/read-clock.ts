/** A place around the shell: its angle from the clock zero, clockwise, and how fine the reading is. */
export interface ClockRead {
  readonly degrees: number;
  /** Half a step of the reading [°]. */
  readonly resolutionDegrees: number;
}

/** Reads `3:30` as a clock position on a dial of twelve hours; undefined when it is none. */
export function readClock(cell: string): ClockRead | undefined {
  const match = /^(\d{1,2}):(\d{2})(:00)?$/.exec(cell.trim());
  if (!match) return undefined;
  const hours = Number(match[1]);
  const minutes = Number(match[2]);
  if (hours > 12 || minutes > 59) return undefined;
  const step = minutes % 30 === 0 ? 30 : minutes % 15 === 0 ? 15 : 1;
  return { degrees: ((hours % 12) * 60 + minutes) / 2, resolutionDegrees: step / 4 };
}

/** Whether a cell looks like a clock position of twenty-four hours, which cannot be told from a mistake. */
export const looksLikeDayClock = (cell: string): boolean =>
  /^(1[3-9]|2[0-4]):\d{2}/.test(cell.trim());
