// Runs PGlite in a thread of its own, so that a long statement never freezes the server.
import { parentPort, workerData } from 'node:worker_threads';
import { PGlite, types } from '@electric-sql/pglite';
import { isAllowed } from './statement-kind';
import {
  APPLICATION_ROLE,
  type QueryResult,
  type WorkerAnswer,
  type WorkerHello,
  type WorkerRequest,
  type WorkerStart,
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

const NOTHING: QueryResult = { rows: [], fields: [] };

const port = parentPort;
if (!port) throw new Error('pglite-worker runs only as a worker thread');

const { folder, asApplication } = workerData as WorkerStart;
let restricted = false;
const opening = open();

opening.then(
  () => port.postMessage({ ready: true } satisfies WorkerHello),
  (error: unknown) =>
    port.postMessage({ ready: false, reason: describe(error).message } satisfies WorkerHello),
);

port.on('message', (request: WorkerRequest) => {
  void answer(request).then((reply) => port.postMessage(reply));
});

async function open(): Promise<PGlite> {
  const database = await PGlite.create(folder === null ? 'memory://' : `file://${folder}`);
  if (asApplication) await actAsApplication(database);
  return database;
}

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
      if (restricted && !isAllowed(request.sql)) throw new Error('This statement is not allowed.');
      const options = { rowMode: request.rowMode, parsers };
      const { rows, affectedRows, fields } = await database.query(
        request.sql,
        [...request.params],
        options,
      );
      return { rows, affectedRows, fields };
    }
    case 'maintain':
      await maintain(database, request.statements);
      return NOTHING;
    case 'act as application':
      await actAsApplication(database);
      return NOTHING;
    case 'close':
      await database.exec('reset role');
      await database.exec('checkpoint');
      await database.close();
      return NOTHING;
  }
}

async function actAsApplication(database: PGlite): Promise<void> {
  const setter = 'pg_catalog.set_config(text, text, boolean)';
  const { rows } = await database.query<{ open: boolean }>(
    `select has_function_privilege('public', '${setter}', 'execute') as open`,
  );
  // with it any statement could take the superuser's role back
  if (rows[0]?.open) await database.exec(`revoke execute on function ${setter} from public`);
  await database.exec(`set role ${APPLICATION_ROLE}`);
  restricted = true;
}

async function maintain(database: PGlite, statements: readonly string[]): Promise<void> {
  try {
    await database.exec('reset role');
    for (const statement of statements) await database.exec(statement);
  } finally {
    if (restricted) await database.exec(`set role ${APPLICATION_ROLE}`);
  }
}

function describe(
  error: unknown,
): Readonly<Record<string, unknown>> & { readonly message: string } {
  if (!(error instanceof Error)) return { message: String(error) };
  const { code, constraint, detail, table, column, severity } = error as Error &
    Record<string, unknown>;
  return { message: error.message, code, constraint, detail, table, column, severity };
}
