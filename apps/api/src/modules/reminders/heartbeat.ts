/** When the job last looked for reminders in this process. */
let lastRunAt: Date | null = null;

export const noteRun = (at: Date): void => {
  lastRunAt = at;
};
export const lastRun = (): Date | null => lastRunAt;
