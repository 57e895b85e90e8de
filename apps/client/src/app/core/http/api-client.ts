import { HttpClient, HttpHeaders, HttpParams } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type {
  BodyOf,
  ParamsOf,
  QueryOf,
  ResponseOf,
  RouteContract,
} from '@ligament/domain/contract/route';
import type { Observable } from 'rxjs';

/** What a call of a route can carry besides its contract. */
export interface CallOptions<C extends RouteContract> {
  readonly params?: ParamsOf<C>;
  readonly query?: QueryOf<C>;
  readonly body?: BodyOf<C> | FormData;
  /** Version of the record as it was seen; sent as If-Match. */
  readonly version?: number;
  /** Makes a repeated request do its work once. */
  readonly idempotencyKey?: string;
}

/** Calls the API by its contracts, so that addresses and types are written once. */
@Injectable({ providedIn: 'root' })
export class ApiClient {
  private readonly http = inject(HttpClient);

  call<C extends RouteContract>(
    contract: C,
    options: CallOptions<C> = {},
  ): Observable<ResponseOf<C>> {
    return this.http.request<ResponseOf<C>>(
      contract.method,
      this.address(contract, options.params),
      {
        body: options.body,
        params: queryOf(options.query),
        headers: headersOf(options),
      },
    );
  }

  /** Address of a route with its parameters filled in, for links that download. */
  address<C extends RouteContract>(contract: C, params?: ParamsOf<C>): string {
    const values = (params ?? {}) as Readonly<Record<string, unknown>>;
    return contract.path.replaceAll(/:(\w+)/g, (_whole, name: string) =>
      encodeURIComponent(String(values[name] ?? '')),
    );
  }
}

function queryOf(query: unknown): HttpParams {
  const given = Object.entries((query ?? {}) as Readonly<Record<string, unknown>>)
    .filter(([, value]) => value !== undefined && value !== null && value !== '')
    .map(([name, value]) => [name, String(value)] as const);
  return new HttpParams({ fromObject: Object.fromEntries(given) });
}

function headersOf(options: CallOptions<RouteContract>): HttpHeaders {
  let headers = new HttpHeaders();
  if (options.version !== undefined) headers = headers.set('If-Match', `"${options.version}"`);
  if (options.idempotencyKey) headers = headers.set('Idempotency-Key', options.idempotencyKey);
  return headers;
}
