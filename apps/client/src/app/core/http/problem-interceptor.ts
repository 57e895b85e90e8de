import { HttpErrorResponse, type HttpInterceptorFn } from '@angular/common/http';
import { inject } from '@angular/core';
import { Router } from '@angular/router';
import { catchError, retry, throwError, timer } from 'rxjs';
import { Session } from '../session/session';
import { problemOf } from './problem';

/**
 * Marks writes as ours, tries a failed read once more, and turns failures into problems.
 * Only a 401 ends the session: the server decides who is signed in, a server error says nothing about it.
 */
export const problemInterceptor: HttpInterceptorFn = (request, next) => {
  const router = inject(Router);
  const session = inject(Session);
  const ours =
    request.method === 'GET'
      ? request
      : request.clone({ setHeaders: { 'X-Requested-With': 'ligament' } });
  return next(ours).pipe(
    retry({
      count: request.method === 'GET' ? 1 : 0,
      delay: (error: unknown) =>
        error instanceof HttpErrorResponse && error.status >= 500
          ? timer(700)
          : throwError(() => error),
    }),
    catchError((error: unknown) => {
      const problem = problemOf(error);
      if (problem.status === 401 && session.user() && !request.url.endsWith('/api/session')) {
        session.forget();
        void router.navigate(['/sign-in'], { queryParams: { next: router.url } });
      }
      return throwError(() => problem);
    }),
  );
};
