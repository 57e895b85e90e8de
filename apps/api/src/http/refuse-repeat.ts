import { brokenUnique } from '../db/unique-violation';
import { conflict } from './failure';

/** Runs a write and turns the breach of a unique constraint into words beside the field at fault. */
export async function refuseRepeat<T>(
  constraint: string,
  field: string,
  words: string,
  write: () => Promise<T>,
): Promise<T> {
  try {
    return await write();
  } catch (error) {
    if (brokenUnique(error) === constraint)
      throw conflict(constraint.replaceAll('_', '-'), words, field);
    throw error;
  }
}
