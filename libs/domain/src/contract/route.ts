import * as z from 'zod';
import type { Action } from './policy';

/** How a request of a route proves who it is: a signed-in person who may do the action, or nobody yet. */
export type Access = Action | 'public';

type Shape = z.ZodType;

/** One route as client, server and the OpenAPI document all know it. */
export interface RouteContract<
  P extends Shape = Shape,
  Q extends Shape = Shape,
  B extends Shape = Shape,
  R extends Shape = Shape,
> {
  readonly method: 'get' | 'post' | 'patch' | 'put' | 'delete';
  /** Express form, e.g. `/api/components/:id`. */
  readonly path: string;
  readonly summary: string;
  readonly access: Access;
  readonly params: P;
  readonly query: Q;
  readonly body: B;
  /** Status of success. */
  readonly status: 200 | 201 | 202 | 204;
  readonly response: R;
  /** Set when the request is a file upload (multipart/form-data, field `file`). */
  readonly upload?: true;
  /** Whether the request must carry If-Match with the record's version. */
  readonly versioned?: true;
  /** Whether the signed-in person must have given the password again in the last five minutes. */
  readonly proof?: true;
}

const nothing = z.strictObject({});
type Nothing = typeof nothing;

/** Declares a route; what is left out is empty. */
export function route<
  P extends Shape = Nothing,
  Q extends Shape = Nothing,
  B extends Shape = Nothing,
  R extends Shape = z.ZodVoid,
>(
  contract: Pick<RouteContract, 'method' | 'path' | 'summary' | 'access'> &
    Partial<Pick<RouteContract, 'status' | 'upload' | 'versioned' | 'proof'>> & {
      readonly params?: P;
      readonly query?: Q;
      readonly body?: B;
      readonly response?: R;
    },
): RouteContract<P, Q, B, R> {
  return {
    status: contract.response ? (contract.method === 'post' ? 201 : 200) : 204,
    ...contract,
    params: contract.params ?? (nothing as unknown as P),
    query: contract.query ?? (nothing as unknown as Q),
    body: contract.body ?? (nothing as unknown as B),
    response: contract.response ?? (z.void() as unknown as R),
  };
}

export type ParamsOf<C> =
  C extends RouteContract<infer P, Shape, Shape, Shape> ? z.input<P> : never;
export type QueryOf<C> = C extends RouteContract<Shape, infer Q, Shape, Shape> ? z.input<Q> : never;
export type BodyOf<C> = C extends RouteContract<Shape, Shape, infer B, Shape> ? z.input<B> : never;
export type ResponseOf<C> =
  C extends RouteContract<Shape, Shape, Shape, infer R> ? z.output<R> : never;
