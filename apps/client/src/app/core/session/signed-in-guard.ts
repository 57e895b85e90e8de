import { inject } from '@angular/core';
import { type CanActivateFn, Router } from '@angular/router';
import { map } from 'rxjs';
import { Session } from './session';

/** Lets signed-in people in; others sign in first and come back to where they were going. */
export const signedInGuard: CanActivateFn = (_route, state) => {
  const router = inject(Router);
  return inject(Session)
    .load()
    .pipe(
      map((view) =>
        view ? true : router.createUrlTree(['/sign-in'], { queryParams: { next: state.url } }),
      ),
    );
};
