import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { ActivatedRoute } from '@angular/router';
import { MatButtonModule } from '@angular/material/button';
import { ENTITIES } from '@ligament/domain/contract/vocabulary';
import { ListQuery } from '../../shared/table/list-query';
import type { HistoryFilters } from './history-client';

/** Filters of the history; they live in the address. */
@Component({
  selector: 'app-history-filter-bar',
  imports: [MatButtonModule],
  template: `
    <form
      class="toolbar no-print"
      role="search"
      aria-label="Filter the history"
      (submit)="$event.preventDefault()"
    >
      <label class="field words"
        ><span class="label">Words</span>
        <input
          #words
          class="plain"
          type="search"
          placeholder="in summary, reason, person, tag"
          [value]="filters().search ?? ''"
          (change)="set({ search: words.value })"
        />
      </label>
      <label class="field"
        ><span class="label">Record</span>
        <select #entity class="plain" (change)="set({ entity: entity.value })">
          <option value="" [selected]="!filters().entity">every kind</option>
          @for (each of kinds; track each) {
            <option [value]="each" [selected]="each === filters().entity">{{ each }}</option>
          }
        </select>
      </label>
      <label class="field"
        ><span class="label">Person</span>
        <select #actor class="plain" (change)="set({ actor: actor.value })">
          <option value="" [selected]="!filters().actor">everybody</option>
          @for (each of actors(); track each.id + each.name) {
            <option [value]="each.id" [selected]="each.id === filters().actor">
              {{ each.name }}
            </option>
          }
        </select>
      </label>
      <label class="field"
        ><span class="label">From</span>
        <input
          #from
          class="plain"
          type="date"
          [value]="filters().from ?? ''"
          (change)="set({ from: from.value })"
        />
      </label>
      <label class="field"
        ><span class="label">To</span>
        <input
          #to
          class="plain"
          type="date"
          [value]="filters().to ?? ''"
          (change)="set({ to: to.value })"
        />
      </label>
      @if (isFiltered()) {
        <button mat-button type="button" (click)="clear()">Show all</button>
      }
    </form>
  `,
  styles: `
    .toolbar {
      align-items: end;
    }
    .words {
      flex: 1 1 220px;
      max-width: 340px;
    }
    .field {
      min-width: 130px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HistoryFilterBar {
  readonly filters = input.required<HistoryFilters>();
  readonly actors = input<readonly { readonly id: string; readonly name: string }[]>([]);
  readonly isFiltered = input(false);
  private readonly route = inject(ActivatedRoute);
  private readonly listQuery = inject(ListQuery);
  protected readonly kinds = ENTITIES;

  protected set(change: Readonly<Record<string, string>>): void {
    this.listQuery.set(this.route, change);
  }

  protected clear(): void {
    this.set({ search: '', entity: '', actor: '', from: '', to: '', flaw: '' });
  }
}
