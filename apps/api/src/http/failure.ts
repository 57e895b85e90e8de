/** An expected failure: what a person can act on, never a stack. */
export class Failure extends Error {
  override readonly name = 'Failure';

  constructor(
    /** Stable word for programs, e.g. `component.not-found`. */
    readonly code: string,
    readonly status: number,
    readonly title: string,
    readonly detail: string,
    readonly more: {
      readonly errors?: readonly { readonly field: string; readonly message: string }[];
      readonly current?: unknown;
      readonly retryAfterSeconds?: number;
    } = {},
  ) {
    super(`${code}: ${detail}`);
  }
}

export const notFound = (what: string) =>
  new Failure(
    `${what}.not-found`,
    404,
    'Not found',
    `There is no such ${what}, or it is not on your site.`,
  );

export const forbidden = (detail: string) => new Failure('forbidden', 403, 'Not allowed', detail);

export const conflict = (code: string, detail: string, field?: string) =>
  new Failure(code, 409, 'In conflict with what is recorded', detail, {
    errors: field ? [{ field, message: detail }] : undefined,
  });

/** The input is well formed, but cannot be right. */
export const unacceptable = (code: string, detail: string, field?: string) =>
  new Failure(code, 422, 'Cannot be accepted', detail, {
    errors: field ? [{ field, message: detail }] : undefined,
  });

export const staleVersion = (what: string, current: unknown) =>
  new Failure(
    'stale',
    412,
    'Changed by somebody else meanwhile',
    `This ${what} was changed after you opened it. Look at the current state and make your change again.`,
    { current },
  );
