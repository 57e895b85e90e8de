type Request =
  | {
      readonly kind: 'query';
      readonly sql: string;
      readonly params: readonly unknown[];
      readonly rowMode: 'array' | 'object';
    }
  /** Upkeep with full rights; statements separated, since a vacuum must stand alone. */
  | { readonly kind: 'maintain'; readonly statements: readonly string[] }
  | { readonly kind: 'act as application' }
  | { readonly kind: 'close' };

/** What the main thread asks of the database worker. */
export type DatabaseRequest = Request;
export type WorkerRequest = Request & { readonly id: number };

/** What a worker is started with. */
export interface WorkerStart {
  /** Where the database lies; null keeps it in memory. */
  readonly folder: string | null;
  /** Give up superuser rights before the first statement. */
  readonly asApplication: boolean;
}

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
