import type { ImportColumn, ImportRow, ImportView } from '@ligament/domain/contract/imports';

const ORDER = ['stop', 'hold', 'check', 'note'] as const;

/** The heaviest problem of a row; undefined when it has none. */
export const worstLevel = (row: ImportRow): (typeof ORDER)[number] | undefined =>
  ORDER.find((level) => row.problems.some((problem) => problem.level === level));

/** Column of the file that holds a field; undefined when none does. */
export const columnOfField = (view: ImportView, field: string | null): ImportColumn | undefined =>
  field === null ? undefined : view.mapping.find((column) => column.field === field);
