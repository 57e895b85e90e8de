/** What the main thread asks of the database worker. */
export type WorkerRequest =
  | {
      readonly id: number;
      readonly kind: 'query';
      readonly sql: string;
      readonly params: readonly unknown[];
      readonly rowMode: 'array' | 'object';
    }
  | { readonly id: number; readonly kind: 'maintain'; readonly sql: string }
  | { readonly id: number; readonly kind: 'act as application' }
  | { readonly id: number; readonly kind: 'close' };

export interface QueryResult {
  readonly rows: unknown[];
  readonly affectedRows?: number;
  readonly fields: readonly { readonly name: string; readonly dataTypeID: number }[];
}

/** What the worker answers; a database error keeps its code and constraint. */
export type WorkerAnswer =
  | { readonly id: number; readonly result: QueryResult }
  | { readonly id: number; readonly error: Readonly<Record<string, unknown>> };

/** First message of the worker: open, or why not. */
export type WorkerHello =
  { readonly ready: true } | { readonly ready: false; readonly reason: string };

/** Name of the role without superuser rights that every request works under. */
export const APPLICATION_ROLE = 'ligament_app';
