import { HttpErrorResponse } from '@angular/common/http';
import { Subject, throwError } from 'rxjs';
import { type Loadable, loadable, LOADING, valueOf } from './loadable';

describe('loadable', () => {
  it('is loading first, then ready with the value', () => {
    const source = new Subject<number>();
    const seen: Loadable<number>[] = [];
    loadable(source).subscribe((each) => seen.push(each));
    expect(seen).toEqual([{ state: 'loading' }]);
    source.next(4.6);
    expect(seen[1]).toEqual({ state: 'ready', value: 4.6 });
  });

  it('fails with a problem in words, and ends', () => {
    const seen: Loadable<never>[] = [];
    let ended = false;
    loadable(throwError(() => new HttpErrorResponse({ status: 0 }))).subscribe({
      next: (each) => seen.push(each),
      complete: () => (ended = true),
    });
    expect(seen[1]).toMatchObject({ state: 'failed', problem: { title: 'No connection' } });
    expect(ended).toBe(true);
  });

  it('has a value only when ready', () => {
    expect(valueOf(LOADING)).toBeUndefined();
    expect(valueOf({ state: 'ready', value: 7 })).toBe(7);
  });
});
