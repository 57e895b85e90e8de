import { inject } from '@angular/core';
import { type CanActivateFn, Router } from '@angular/router';
import type { Action } from '@ligament/domain/contract/policy';
import { Session } from './session';

/** Lets in those whose role may do the action. */
export const actionGuard =
  (action: Action): CanActivateFn =>
  () =>
    inject(Session).can(action) || inject(Router).createUrlTree(['/not-allowed']);
