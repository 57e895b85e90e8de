/** The system's word for what went wrong, e.g. ENOENT. */
export const codeOf = (error: unknown): unknown =>
  typeof error === 'object' && error !== null && 'code' in error ? error.code : undefined;

/** What went wrong, in the words of whoever noticed first: the query builder wraps what the database said. */
export function reasonOf(error: unknown): string {
  let reason = error;
  while (hasCause(reason)) reason = reason.cause;
  const message =
    typeof reason === 'object' && reason !== null && 'message' in reason ? reason.message : reason;
  return String(message || (codeOf(reason) ?? 'no reason given'));
}

const hasCause = (error: unknown): error is { readonly cause: object } =>
  typeof error === 'object' &&
  error !== null &&
  'cause' in error &&
  typeof error.cause === 'object' &&
  error.cause !== null;
