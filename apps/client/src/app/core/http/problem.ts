import { HttpErrorResponse } from '@angular/common/http';
import type { ProblemDetails } from '@ligament/domain/contract/primitives';

/** A failure as the screens see it: always with words a person can act on. */
export interface Problem {
  readonly status: number;
  readonly title: string;
  readonly detail: string;
  /** Stable word for programs, e.g. `stale`. */
  readonly code: string;
  readonly errors: readonly { readonly field: string; readonly message: string }[];
  /** The current state of a record that was changed meanwhile. */
  readonly current?: unknown;
}

/** Turns whatever a request failed with into a Problem. */
export function problemOf(error: unknown): Problem {
  if (isProblem(error)) return error;
  if (!(error instanceof HttpErrorResponse)) {
    return {
      status: 0,
      title: 'Something went wrong',
      detail: 'The page could not do this. Reload it and try again.',
      code: 'client',
      errors: [],
    };
  }
  if (error.status === 0) {
    return {
      status: 0,
      title: 'No connection',
      detail:
        'The server cannot be reached. What you typed is still here; try again when the connection is back.',
      code: 'offline',
      errors: [],
    };
  }
  const body = detailsOf(error);
  return {
    status: error.status,
    title: body.title ?? 'The request failed',
    detail: body.detail ?? 'Try again; if it happens again, tell your administrator.',
    code: body.type?.split(':').at(-1) ?? '',
    errors: body.errors ?? [],
    current: body.current,
  };
}

function detailsOf(error: HttpErrorResponse): Partial<ProblemDetails> {
  const body: unknown = error.error;
  if (body !== null && typeof body === 'object') return body as Partial<ProblemDetails>;
  if (typeof body !== 'string') return {};
  try {
    return JSON.parse(body) as Partial<ProblemDetails>;
  } catch {
    // not JSON: an answer of something between browser and server
    return {};
  }
}

function isProblem(error: unknown): error is Problem {
  return error !== null && typeof error === 'object' && 'detail' in error && 'errors' in error;
}
