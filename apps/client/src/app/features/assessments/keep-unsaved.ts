import { inject } from '@angular/core';
import type { CanDeactivateFn } from '@angular/router';
import { defaultIfEmpty } from 'rxjs';
import { Ask } from '../../shared/dialogs/ask';

/** A page that knows whether something typed on it is not saved yet. */
export interface HasUnsaved {
  hasUnsaved(): boolean;
}

/** Asks before a page with unsaved changes is left. */
export const keepUnsaved: CanDeactivateFn<HasUnsaved> = (page) =>
  page.hasUnsaved()
    ? inject(Ask)
        .confirm({
          title: 'Leave without saving?',
          text: 'What was changed in this assessment since it was last saved is lost.',
          action: 'Leave',
        })
        .pipe(defaultIfEmpty(false))
    : true;
