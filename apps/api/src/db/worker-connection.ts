import { Worker } from 'node:worker_threads';
import { DatabaseFailure, DatabaseUnavailable } from './database-failures';
import { reasonOf } from './system-error';
import type {
  DatabaseRequest,
  QueryResult,
  WorkerAnswer,
  WorkerHello,
  WorkerRequest,
  WorkerStart,
} from './worker-messages';

interface Pending {
  readonly resolve: (result: QueryResult) => void;
  readonly reject: (error: Error) => void;
  readonly timer: NodeJS.Timeout;
}

/** One database worker from its start to its end; once ended it never comes back, another one takes its place. */
export class WorkerConnection {
  private readonly pending = new Map<number, Pending>();
  private nextId = 1;
  private endedBecause: string | undefined;
  private gone: Promise<unknown> = Promise.resolve();

  private constructor(
    private readonly worker: Worker,
    private readonly onEnd: (why: string) => void,
  ) {
    worker.on('message', (answer: WorkerAnswer) => this.settle(answer));
    worker.on('error', (error) => void this.end(error.message));
    worker.on('exit', (code) => void this.end(`the worker exited with code ${code}`));
  }

  /** Starts a worker and waits until its database is open; throws DatabaseFailure when it does not open in time. */
  static async open(
    start: WorkerStart,
    deadlineMs: number,
    onEnd: (why: string) => void,
  ): Promise<WorkerConnection> {
    const worker = new Worker(workerFile(), { workerData: start });
    try {
      await greeting(worker, deadlineMs);
    } catch (error) {
      await worker.terminate();
      const where = start.folder ?? 'in memory';
      throw new DatabaseFailure(`the database ${where} did not open (${reasonOf(error)}).`);
    }
    // by name: without one, Node's own listeners would go too
    for (const name of ['error', 'exit', 'message'] as const) worker.removeAllListeners(name);
    return new WorkerConnection(worker, onEnd);
  }

  get alive(): boolean {
    return this.endedBecause === undefined;
  }

  /** Sends one request; a worker that does not answer in time is ended, with everything that waits on it. */
  send(request: DatabaseRequest, deadlineMs: number): Promise<QueryResult> {
    return new Promise<QueryResult>((resolve, reject) => {
      if (this.endedBecause !== undefined) {
        reject(lost(this.endedBecause));
        return;
      }
      const id = this.nextId++;
      const timer = setTimeout(
        () => void this.end(`no answer within ${deadlineMs} ms`),
        deadlineMs,
      );
      this.pending.set(id, { resolve, reject, timer });
      try {
        this.worker.postMessage({ ...request, id } satisfies WorkerRequest);
      } catch (error) {
        // a parameter that cannot be sent is the caller's mistake, not the worker's
        this.pending.delete(id);
        clearTimeout(timer);
        reject(error instanceof Error ? error : new Error(String(error)));
      }
    });
  }

  /** Ends the worker and resolves when its thread is gone, so that the folder may be opened again. */
  async end(why: string): Promise<void> {
    if (this.alive) {
      this.endedBecause = why;
      this.gone = this.worker.terminate();
      for (const { reject, timer } of this.pending.values()) {
        clearTimeout(timer);
        reject(lost(why));
      }
      this.pending.clear();
      this.onEnd(why);
    }
    await this.gone;
  }

  private settle(answer: WorkerAnswer): void {
    const waiting = this.pending.get(answer.id);
    if (!waiting) return;
    this.pending.delete(answer.id);
    clearTimeout(waiting.timer);
    if ('result' in answer) waiting.resolve(answer.result);
    else waiting.reject(Object.assign(new Error(String(answer.error['message'])), answer.error));
  }
}

const lost = (why: string) => new DatabaseUnavailable(`The database was restarted: ${why}.`);

function greeting(worker: Worker, deadlineMs: number): Promise<void> {
  return new Promise<void>((resolve, reject) => {
    const timer = setTimeout(
      () => reject(new Error(`no answer within ${deadlineMs} ms`)),
      deadlineMs,
    );
    const settle = (problem?: string) => {
      clearTimeout(timer);
      if (problem === undefined) resolve();
      else reject(new Error(problem));
    };
    worker.once('error', (error) => settle(error.message));
    worker.once('exit', (code) => settle(`the worker exited with code ${code}`));
    worker.once('message', (hello: WorkerHello) => settle(hello.ready ? undefined : hello.reason));
  });
}

/** The worker as bundled beside this file, or through tsx when running from source. */
function workerFile(): URL {
  const fromSource = import.meta.url.endsWith('.ts');
  return new URL(
    fromSource ? './pglite-worker-from-source.mjs' : './pglite-worker.js',
    import.meta.url,
  );
}
