import { catchError, map, type Observable, of, startWith } from 'rxjs';
import { type Problem, problemOf } from './problem';

/** What a page shows of something it asks for: still loading, here, or failed. */
export type Loadable<T> =
  | { readonly state: 'loading' }
  | { readonly state: 'ready'; readonly value: T }
  | { readonly state: 'failed'; readonly problem: Problem };

export const LOADING: Loadable<never> = { state: 'loading' };

/** Makes a request a stream of states that a template can switch over. */
export function loadable<T>(source: Observable<T>): Observable<Loadable<T>> {
  return source.pipe(
    map((value): Loadable<T> => ({ state: 'ready', value })),
    catchError((error: unknown) => of<Loadable<T>>({ state: 'failed', problem: problemOf(error) })),
    startWith<Loadable<T>>(LOADING),
  );
}

/** The value once it is there. */
export const valueOf = <T>(each: Loadable<T>): T | undefined =>
  each.state === 'ready' ? each.value : undefined;
