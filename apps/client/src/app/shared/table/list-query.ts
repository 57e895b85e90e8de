import { inject, Injectable } from '@angular/core';
import { type ActivatedRoute, Router } from '@angular/router';

/** Keeps a list's search, filters, sort and page in the address, so that it can be bookmarked and shared. */
@Injectable({ providedIn: 'root' })
export class ListQuery {
  private readonly router = inject(Router);

  /** Changes some of the query parameters of a page; an empty value takes one out. A changed filter starts at the first page. */
  set(route: ActivatedRoute, change: Readonly<Record<string, string | null | undefined>>): void {
    const queryParams = Object.fromEntries(
      Object.entries({ cursor: null, ...change }).map(([name, value]) => [name, value || null]),
    );
    void this.router.navigate([], {
      relativeTo: route,
      queryParams,
      queryParamsHandling: 'merge',
      replaceUrl: true,
    });
  }
}
