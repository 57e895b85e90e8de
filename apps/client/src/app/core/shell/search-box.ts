import { HttpClient } from '@angular/common/http';
import {
  ChangeDetectionStrategy,
  Component,
  type ElementRef,
  inject,
  signal,
  viewChild,
} from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import {
  MatAutocompleteModule,
  type MatAutocompleteSelectedEvent,
} from '@angular/material/autocomplete';
import { Router } from '@angular/router';
import { catchError, debounceTime, map, of, switchMap } from 'rxjs';

interface Hit {
  readonly kind: string;
  readonly id: string;
  readonly title: string;
  readonly subtitle: string;
  readonly link: string;
}

/** Search over everything; the slash key brings the cursor here. */
@Component({
  selector: 'app-search-box',
  imports: [MatAutocompleteModule],
  template: `
    <input
      #field
      type="search"
      placeholder="Find a component, weld, flaw or report  ( / )"
      aria-label="Find a component, weld, flaw or report"
      [matAutocomplete]="hits"
      [value]="words()"
      (input)="words.set(field.value)"
    />
    <mat-autocomplete #hits="matAutocomplete" (optionSelected)="open($event)">
      @for (hit of found(); track hit.kind + hit.id) {
        <mat-option [value]="hit.link">
          {{ hit.title }} <span class="caption">{{ hit.kind }} · {{ hit.subtitle }}</span>
        </mat-option>
      }
      @if (words().trim().length > 1 && found().length === 0) {
        <mat-option disabled>Nothing found for “{{ words() }}”</mat-option>
      }
    </mat-autocomplete>
  `,
  styles: `
    input {
      width: 100%;
      height: 34px;
      padding: 0 2px;
      border: 0;
      border-bottom: 1px solid var(--rule-strong);
      background: none;
      color: var(--ink);
      font: inherit;
    }
    input::placeholder {
      color: var(--ink-2);
    }
  `,
  host: { '(document:keydown)': 'shortcut($event)' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SearchBox {
  private readonly http = inject(HttpClient);
  private readonly router = inject(Router);
  private readonly field = viewChild.required<ElementRef<HTMLInputElement>>('field');
  protected readonly words = signal('');

  protected readonly found = toSignal(
    toObservable(this.words).pipe(
      debounceTime(150),
      switchMap((words) => (words.trim().length < 2 ? of([]) : this.search(words.trim()))),
    ),
    { initialValue: [] as readonly Hit[] },
  );

  protected shortcut(event: KeyboardEvent): void {
    const target = event.target as HTMLElement | null;
    if (
      event.key !== '/' ||
      event.ctrlKey ||
      event.metaKey ||
      target?.closest('input, textarea, select')
    )
      return;
    event.preventDefault();
    this.field().nativeElement.focus();
  }

  protected open(event: MatAutocompleteSelectedEvent): void {
    this.words.set('');
    this.field().nativeElement.value = '';
    void this.router.navigateByUrl(String(event.option.value));
  }

  private search(q: string) {
    return this.http.get<{ items: readonly Hit[] }>('/api/search', { params: { q } }).pipe(
      map(({ items }) => items),
      catchError(() => of([])),
    );
  }
}
