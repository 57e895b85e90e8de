import { DOCUMENT, inject, Injectable } from '@angular/core';
import { NavigationEnd, Router } from '@angular/router';
import { filter, pairwise } from 'rxjs';

/** After going to another page the focus is on its heading, so that a screen reader starts there. */
@Injectable({ providedIn: 'root' })
export class FocusOnNavigation {
  private readonly document = inject(DOCUMENT);

  constructor() {
    inject(Router)
      .events.pipe(
        filter((event) => event instanceof NavigationEnd),
        pairwise(),
        filter(([from, to]) => pathOf(from) !== pathOf(to)),
      )
      .subscribe(() => setTimeout(() => this.focusHeading()));
  }

  private focusHeading(): void {
    const heading = this.document.querySelector<HTMLElement>('main h1');
    if (!heading) return;
    heading.tabIndex = -1;
    heading.focus({ preventScroll: true });
    this.document.defaultView?.scrollTo({ top: 0 });
  }
}

const pathOf = (event: NavigationEnd): string => event.urlAfterRedirects.split('?')[0] ?? '';
