import { inject, Injectable } from '@angular/core';
import { readComponent } from '@ligament/domain/contract/components';
import {
  exportHistory,
  listComponentHistory,
  listHistory,
  listHistoryActors,
  verifyHistory,
} from '@ligament/domain/contract/history';
import type { QueryOf } from '@ligament/domain/contract/route';
import { map, type Observable } from 'rxjs';
import { ApiClient } from '../../core/http/api-client';

export type HistoryFilters = QueryOf<typeof listComponentHistory>;

/** The history as the server keeps it. */
@Injectable({ providedIn: 'root' })
export class HistoryClient {
  private readonly api = inject(ApiClient);

  /** A page of everything, or of the life of one component. */
  list(component: string | undefined, query: HistoryFilters) {
    return component
      ? this.api.call(listComponentHistory, { params: { id: component }, query })
      : this.api.call(listHistory, { query });
  }

  actors(component: string | undefined): Observable<readonly { id: string; name: string }[]> {
    return this.api
      .call(listHistoryActors, { query: component ? { component } : {} })
      .pipe(map(({ rows }) => rows));
  }

  verify(noted: string) {
    return this.api.call(verifyHistory, { query: noted ? { noted } : {} });
  }

  componentTag(id: string): Observable<string> {
    return this.api.call(readComponent, { params: { id } }).pipe(map(({ tag }) => tag));
  }

  /** Address of the export of what is filtered. */
  exportAddress(component: string | undefined, filters: HistoryFilters): string {
    const given = Object.entries({ ...filters, component }).filter(([, value]) => value);
    const query = new URLSearchParams(given.map(([name, value]) => [name, String(value)]));
    return `${this.api.address(exportHistory)}${given.length > 0 ? `?${query}` : ''}`;
  }
}
