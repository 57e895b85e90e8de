import { AsyncLocalStorage } from 'node:async_hooks';
import { Worker } from 'node:worker_threads';
import type { Logger } from 'pino';
import { DatabaseFailure, DatabaseUnavailable } from './database-failures';
import { Turns } from './turns';
import type { QueryResult, WorkerAnswer, WorkerHello, WorkerRequest } from './worker-messages';

interface QueryOptions {
  readonly rowMode?: 'array' | 'object';
}

/** What a query builder needs of a connection. */
export interface QueryClient {
  query(sql: string, params?: readonly unknown[], options?: QueryOptions): Promise<QueryResult>;
}

interface Pending {
  readonly resolve: (result: QueryResult) => void;
  readonly reject: (error: Error) => void;
  readonly timer: NodeJS.Timeout;
}

const MINUTE = 60_000;

/**
 * PGlite in a supervised worker thread: one statement at a time, a transaction alone, a deadline for each statement.
 * A worker that overruns or dies is ended and opened again; what was waiting on it fails with DatabaseUnavailable.
 */
export class SupervisedPglite implements QueryClient {
  private worker: Worker | undefined;
  private opening: Promise<void> | undefined;
  private readonly pending = new Map<number, Pending>();
  private readonly turns = new Turns();
  private readonly inTransaction = new AsyncLocalStorage<true>();
  private readonly restarts: number[] = [];
  private nextId = 1;
  private application = false;
  private closed = false;
  /** Longest time one statement may take [ms]. */
  deadlineMs: number;

  constructor(
    private readonly folder: string,
    private readonly log: Logger,
    deadlineMs = 5000,
    /** Asked before a statement that writes; throws when the disk is nearly full. */
    private readonly beforeWrite: () => void = () => undefined,
  ) {
    this.deadlineMs = deadlineMs;
  }

  /** Whether the worker has been steady: fewer than three restarts in the last minute. */
  healthy(): boolean {
    const since = Date.now() - MINUTE;
    return !this.closed && this.restarts.filter((time) => time > since).length < 3;
  }

  async open(): Promise<void> {
    this.opening ??= this.startWorker();
    try {
      await this.opening;
    } catch (error) {
      this.opening = undefined;
      throw error;
    }
  }

  /** From here on every statement runs without superuser rights. */
  async actAsApplication(): Promise<void> {
    this.application = true;
    await this.turns.take(() => this.send({ kind: 'act as application' }));
  }

  async query(
    sql: string,
    params: readonly unknown[] = [],
    options: QueryOptions = {},
  ): Promise<QueryResult> {
    if (this.inTransaction.getStore()) {
      throw new Error(
        'Inside a transaction only the transaction may be used; this statement would wait for ever.',
      );
    }
    if (/^\s*(insert|update|delete)\b/i.test(sql)) this.beforeWrite();
    return this.turns.take(() => this.statement(sql, params, options));
  }

  async transaction<T>(work: (client: QueryClient) => Promise<T>): Promise<T> {
    if (this.inTransaction.getStore())
      throw new Error('Transactions are not nested; pass the one you have.');
    this.beforeWrite();
    return this.turns.take(async () => {
      await this.statement('begin');
      const worker = this.worker;
      // a statement of this transaction must not run, alone, on a worker opened after the first one died
      const client: QueryClient = {
        query: (sql, params, options) => {
          if (this.worker !== worker) throw new DatabaseUnavailable('The transaction was lost.');
          return this.statement(sql, params, options);
        },
      };
      try {
        const result = await this.inTransaction.run(true, () => work(client));
        await client.query('commit');
        return result;
      } catch (error) {
        if (this.worker === worker) await this.statement('rollback').catch(() => undefined);
        throw error;
      }
    });
  }

  /** Runs statements that need full rights (checkpoint, analyze, vacuum); they have a minute. */
  async maintain(sql: string): Promise<void> {
    await this.turns.take(() => this.send({ kind: 'maintain', sql }, MINUTE));
  }

  async close(): Promise<void> {
    if (this.closed) return;
    await this.turns.take(() => this.send({ kind: 'close' }, MINUTE));
    this.closed = true;
    await this.worker?.terminate();
  }

  private statement(sql: string, params: readonly unknown[] = [], options: QueryOptions = {}) {
    return this.send({ kind: 'query', sql, params, rowMode: options.rowMode ?? 'object' });
  }

  private async send(request: Unnumbered, deadlineMs = this.deadlineMs): Promise<QueryResult> {
    if (this.closed) throw new DatabaseUnavailable('The database is closed.');
    await this.open();
    const id = this.nextId++;
    return new Promise<QueryResult>((resolve, reject) => {
      const timer = setTimeout(() => this.giveUp(`no answer within ${deadlineMs} ms`), deadlineMs);
      this.pending.set(id, { resolve, reject, timer });
      this.worker?.postMessage({ ...request, id } as WorkerRequest);
    });
  }

  private async startWorker(): Promise<void> {
    const worker = new Worker(workerFile(), { workerData: { folder: this.folder } });
    await new Promise<void>((resolve, reject) => {
      worker.once('error', (error) =>
        reject(new DatabaseFailure(`the database did not open (${error.message}).`)),
      );
      worker.once('message', (hello: WorkerHello) => {
        if (hello.ready) resolve();
        else
          reject(
            new DatabaseFailure(`the database in ${this.folder} did not open (${hello.reason}).`),
          );
      });
    });
    worker.removeAllListeners('error');
    worker.on('message', (answer: WorkerAnswer) => this.settle(answer));
    worker.on('error', (error) => this.giveUp(error.message, worker));
    worker.on('exit', () => this.giveUp('the worker ended', worker));
    this.worker = worker;
    if (this.application) {
      const id = this.nextId++;
      this.pending.set(id, {
        resolve: () => undefined,
        reject: () => undefined,
        timer: setTimeout(() => undefined, 0),
      });
      worker.postMessage({ id, kind: 'act as application' } satisfies WorkerRequest);
    }
  }

  private settle(answer: WorkerAnswer): void {
    const waiting = this.pending.get(answer.id);
    if (!waiting) return;
    this.pending.delete(answer.id);
    clearTimeout(waiting.timer);
    if ('result' in answer) waiting.resolve(answer.result);
    else waiting.reject(Object.assign(new Error(String(answer.error['message'])), answer.error));
  }

  /** Ends the worker and fails everything that waits on it; the next statement opens a new one. */
  private giveUp(why: string, worker = this.worker): void {
    if (this.closed || !worker || worker !== this.worker) return;
    this.log.error({ why }, 'database worker restarted');
    this.restarts.push(Date.now());
    this.worker = undefined;
    this.opening = worker.terminate().then(() => this.startWorker());
    this.opening.catch(() => (this.opening = undefined));
    for (const { reject, timer } of this.pending.values()) {
      clearTimeout(timer);
      reject(new DatabaseUnavailable(`The database was restarted: ${why}.`));
    }
    this.pending.clear();
  }
}

type Unnumbered = WorkerRequest extends infer R
  ? R extends WorkerRequest
    ? Omit<R, 'id'>
    : never
  : never;

/** The worker as bundled beside this file, or through tsx when running from source. */
function workerFile(): URL {
  const fromSource = import.meta.url.endsWith('.ts');
  return new URL(
    fromSource ? './pglite-worker-from-source.mjs' : './pglite-worker.js',
    import.meta.url,
  );
}
