/** How a problem weighs: stop (the row is not taken), hold and check (taken once the inspector confirms), note (for information). */
export const PROBLEM_LEVELS = ['stop', 'hold', 'check', 'note'] as const;
export type ProblemLevel = (typeof PROBLEM_LEVELS)[number];

/** What is wrong in one place of a file, what happens, and what to do. */
export interface RowProblem {
  /** Line of the file, counted from 1; 0 for the file as a whole. */
  readonly row: number;
  /** Field the problem is about; null for the whole row. */
  readonly field: string | null;
  /** Text of the cell as it stands. */
  readonly original: string;
  readonly level: ProblemLevel;
  readonly message: string;
}

/** Collects the problems of one row. */
export class ProblemList {
  readonly all: RowProblem[] = [];

  constructor(private readonly row: number) {}

  add(level: ProblemLevel, field: string | null, original: string, message: string): void {
    // a cell read for two purposes has its problem told once
    if (this.all.some((each) => each.field === field && each.message === message)) return;
    this.all.push({ row: this.row, field, original, level, message });
  }
}
