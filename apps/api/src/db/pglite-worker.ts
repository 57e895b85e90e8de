// Runs PGlite in a thread of its own, so that a long statement never freezes the server.
import { parentPort, workerData } from 'node:worker_threads';
import { PGlite, types } from '@electric-sql/pglite';
import {
  APPLICATION_ROLE,
  type QueryResult,
  type WorkerAnswer,
  type WorkerHello,
  type WorkerRequest,
} from './worker-messages';

const asText = (value: string) => value;
// dates and instants stay text: the query builder turns them into what each column declares
const parsers = Object.fromEntries(
  [
    types.TIMESTAMP,
    types.TIMESTAMPTZ,
    types.INTERVAL,
    types.DATE,
    1231,
    1115,
    1185,
    1187,
    1182,
  ].map((type) => [type, asText]),
);

/** Ways back to superuser rights, and the one statement that hangs the engine for ever. */
const FORBIDDEN =
  /\b(re)?set\s+(local\s+|session\s+)*(role|session\s+authorization)\b|\breset\s+all\b|\bdiscard\s+all\b|\bcopy\b[\s\S]*\bprogram\b/i;

const port = parentPort;
if (!port) throw new Error('pglite-worker runs only as a worker thread');

const { folder } = workerData as { readonly folder: string };
const opening = PGlite.create(`file://${folder}`);

opening.then(
  () => port.postMessage({ ready: true } satisfies WorkerHello),
  (error: unknown) =>
    port.postMessage({ ready: false, reason: String(error) } satisfies WorkerHello),
);

port.on('message', (request: WorkerRequest) => {
  void answer(request).then((reply) => port.postMessage(reply));
});

async function answer(request: WorkerRequest): Promise<WorkerAnswer> {
  try {
    return { id: request.id, result: await perform(await opening, request) };
  } catch (error) {
    return { id: request.id, error: describe(error) };
  }
}

async function perform(database: PGlite, request: WorkerRequest): Promise<QueryResult> {
  switch (request.kind) {
    case 'query': {
      if (FORBIDDEN.test(request.sql)) throw new Error('This statement is not allowed.');
      const { rows, affectedRows, fields } = await database.query(
        request.sql,
        [...request.params],
        {
          rowMode: request.rowMode,
          parsers,
        },
      );
      return { rows, affectedRows, fields };
    }
    case 'maintain':
      await database.exec(`reset role; ${request.sql}`);
      await database.exec(`set role ${APPLICATION_ROLE}`);
      return { rows: [], fields: [] };
    case 'act as application':
      await database.exec(`set role ${APPLICATION_ROLE}`);
      return { rows: [], fields: [] };
    case 'close':
      await database.exec('reset role; checkpoint');
      await database.close();
      return { rows: [], fields: [] };
  }
}

function describe(error: unknown): Readonly<Record<string, unknown>> {
  if (!(error instanceof Error)) return { message: String(error) };
  const { code, constraint, detail, table, column, severity } = error as Error &
    Record<string, unknown>;
  return { message: error.message, code, constraint, detail, table, column, severity };
}
