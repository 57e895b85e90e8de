import { AsyncLocalStorage } from 'node:async_hooks';
import type { Logger } from 'pino';
import { BoundTransaction, type QueryClient } from './bound-transaction';
import { DatabaseUnavailable } from './database-failures';
import { mayWrite } from './statement-kind';
import { type TurnKind, Turns } from './turns';
import { WorkerConnection } from './worker-connection';
import type { DatabaseRequest, QueryResult } from './worker-messages';

export interface Supervision {
  /** Longest time one statement may take [ms]. */
  readonly deadlineMs?: number;
  /** Longest time the database may take to open, recovery included [ms]. */
  readonly openDeadlineMs?: number;
  /** Longest time a transaction may hold the connection between two statements [ms]. */
  readonly idleDeadlineMs?: number;
  /** Asked before a statement that writes; throws when the disk is nearly full. */
  readonly beforeWrite?: () => void;
}

const MINUTE = 60_000;
/** Restarts within a minute from which the database counts as unhealthy. */
const TOO_MANY = 3;

/**
 * PGlite in a supervised worker thread: one statement at a time, a transaction alone, a deadline for each statement.
 * A worker that overruns or dies is ended and opened again; what was waiting on it fails with DatabaseUnavailable.
 */
export class SupervisedPglite implements QueryClient {
  private connection: Promise<WorkerConnection> | undefined;
  private readonly turns = new Turns();
  private readonly inTransaction = new AsyncLocalStorage<BoundTransaction>();
  private readonly restarts: number[] = [];
  private readonly supervision: Required<Supervision>;
  private application = false;
  private closing = false;
  private closed: Promise<void> | undefined;
  private written = false;
  deadlineMs: number;

  constructor(
    /** Where the database lies; null keeps it in memory, empty again after a restart. */
    private readonly folder: string | null,
    private readonly log: Logger,
    supervision: Supervision = {},
  ) {
    this.supervision = {
      deadlineMs: supervision.deadlineMs ?? 5000,
      openDeadlineMs: supervision.openDeadlineMs ?? MINUTE,
      idleDeadlineMs: supervision.idleDeadlineMs ?? MINUTE / 2,
      beforeWrite: supervision.beforeWrite ?? (() => undefined),
    };
    this.deadlineMs = this.supervision.deadlineMs;
  }

  /** Whether the worker has been steady: fewer than three restarts in the last minute. */
  healthy(): boolean {
    const since = Date.now() - MINUTE;
    return !this.closing && this.restarts.filter((time) => time > since).length < TOO_MANY;
  }

  /** Opens the database, or throws DatabaseFailure saying why it does not open. */
  async open(): Promise<void> {
    await this.connect();
  }

  /** From here on every statement runs without superuser rights, also after a restart. */
  async actAsApplication(): Promise<void> {
    this.application = true;
    await this.turns.take(() => this.send({ kind: 'act as application' }));
  }

  async query(
    sql: string,
    params: readonly unknown[] = [],
    options: { readonly rowMode?: 'array' | 'object' } = {},
  ): Promise<QueryResult> {
    this.refuseInsideTransaction();
    return this.turns.take(async () => this.on(await this.reached()).query(sql, params, options));
  }

  async transaction<T>(work: (client: QueryClient) => Promise<T>): Promise<T> {
    this.refuseInsideTransaction();
    return this.turns.take(async () => {
      // bound to one worker: nothing of it may run, alone, on a worker opened after that one died
      const connection = await this.reached();
      const client = this.on(connection);
      const bound = new BoundTransaction(client, this.supervision.idleDeadlineMs);
      await client.query('begin');
      try {
        const result = await this.inTransaction.run(bound, () => bound.run(work));
        await client.query('commit');
        return result;
      } catch (error) {
        if (connection.alive) await client.query('rollback').catch(() => undefined);
        throw error;
      }
    });
  }

  /** Runs upkeep that needs full rights (checkpoint, analyze, vacuum) when nobody waits; each has two minutes. */
  async maintain(...statements: readonly string[]): Promise<void> {
    await this.exclusively(() => Promise.resolve(), statements);
  }

  /** Tells whether anything was written since it was last asked. */
  takeWritten(): boolean {
    const written = this.written;
    this.written = false;
    return written;
  }

  /** Runs upkeep and then `work` while no statement runs, for instance to copy the folder. */
  async exclusively<T>(
    work: () => Promise<T>,
    statements: readonly string[] = ['checkpoint'],
    kind: TurnKind = 'batch',
  ): Promise<T> {
    return this.turns.take(async () => {
      await this.send({ kind: 'maintain', statements }, 2 * MINUTE);
      return work();
    }, kind);
  }

  /** Lets what is under way end, writes a checkpoint and ends the worker; never throws. */
  close(): Promise<void> {
    this.closed ??= this.turns.take(async () => {
      this.closing = true;
      const connection = await this.connection?.catch(() => undefined);
      if (!connection) return;
      await connection
        .send({ kind: 'close' }, MINUTE)
        .catch((error: unknown) => this.log.error({ err: error }, 'database not closed cleanly'));
      await connection.end('closed');
    });
    return this.closed;
  }

  private refuseInsideTransaction(): void {
    if (this.inTransaction.getStore()?.isOpen) {
      throw new Error(
        'Inside a transaction only the transaction may be used; this statement would wait for ever.',
      );
    }
  }

  /** Statements sent to one worker, whatever becomes of it. */
  private on(connection: WorkerConnection): QueryClient {
    return {
      query: async (sql, params = [], { rowMode = 'object' } = {}) => {
        if (mayWrite(sql)) {
          this.supervision.beforeWrite();
          this.written = true;
        }
        return connection.send({ kind: 'query', sql, params, rowMode }, this.deadlineMs);
      },
    };
  }

  private async send(request: DatabaseRequest, deadlineMs = this.deadlineMs) {
    const connection = await this.reached();
    return connection.send(request, deadlineMs);
  }

  /** The connection for a statement: what a request meets while the database is away is always DatabaseUnavailable. */
  private async reached(): Promise<WorkerConnection> {
    if (this.closing) throw new DatabaseUnavailable('The database is closed.');
    try {
      return await this.connect();
    } catch (error) {
      throw new DatabaseUnavailable('The database could not be opened again.', { cause: error });
    }
  }

  private connect(): Promise<WorkerConnection> {
    this.connection ??= this.openConnection();
    return this.connection;
  }

  private async openConnection(): Promise<WorkerConnection> {
    try {
      return await WorkerConnection.open(
        { folder: this.folder, asApplication: this.application },
        this.supervision.openDeadlineMs,
        (why) => this.restart(why),
      );
    } catch (error) {
      this.restarts.push(Date.now());
      this.connection = undefined;
      throw error;
    }
  }

  private restart(why: string): void {
    if (this.closing) return;
    this.log.error({ why }, 'database worker restarted');
    this.restarts.push(Date.now());
    const ended = this.connection;
    // the old thread must be gone before its folder is opened again
    this.connection = (ended ?? Promise.resolve(undefined))
      .then((connection) => connection?.end(why))
      .then(() => this.openConnection());
    this.connection.catch((error: unknown) =>
      this.log.error({ err: error }, 'the database did not open again'),
    );
  }
}
