import { createHash } from 'node:crypto';
import type { Request, Response } from 'express';
import type { Actor } from './actor';
import { Failure } from './failure';

export interface KeptAnswer {
  readonly requestHash: string;
  readonly status: number;
  readonly answer: string;
}

/** Where answers to repeated requests are kept. */
export interface IdempotencyStore {
  find(personId: string, key: string): Promise<KeptAnswer | undefined>;
  keep(personId: string, key: string, route: string, answer: KeptAnswer): Promise<void>;
}

interface Outcome {
  readonly status: number;
  readonly body: unknown;
}

/** Runs a POST with an Idempotency-Key once; a repeat gets the first answer, another body under the same key is refused. */
export async function idempotent(
  store: IdempotencyStore,
  actor: Actor | null,
  request: Request,
  response: Response,
  work: () => Promise<Outcome>,
): Promise<void> {
  const key = request.method === 'POST' && actor ? request.get('idempotency-key') : undefined;
  if (key === undefined || !actor) return send(response, await work());
  if (!/^[\w-]{8,100}$/.test(key)) {
    throw new Failure(
      'idempotency-key',
      400,
      'Key not usable',
      'An Idempotency-Key is 8 to 100 letters, digits, _ or -.',
    );
  }
  const asked = { personId: actor.personId, key, request };
  return send(response, await inTurn(`${actor.personId} ${key}`, () => once(store, asked, work)));
}

const underWay = new Map<string, Promise<unknown>>();

/** A second click waits for the first, so that it finds the answer instead of doing the work again. */
async function inTurn<T>(name: string, work: () => Promise<T>): Promise<T> {
  const before = underWay.get(name) ?? Promise.resolve();
  const mine = before.then(work, work);
  underWay.set(name, mine);
  try {
    return await mine;
  } finally {
    if (underWay.get(name) === mine) underWay.delete(name);
  }
}

async function once(
  store: IdempotencyStore,
  {
    personId,
    key,
    request,
  }: { readonly personId: string; readonly key: string; readonly request: Request },
  work: () => Promise<Outcome>,
): Promise<Outcome> {
  const hash = requestHash(request);
  const kept = await store.find(personId, key);
  if (kept && kept.requestHash !== hash) {
    throw new Failure(
      'idempotency-key.reused',
      422,
      'Key already used',
      'This Idempotency-Key was used for a different request.',
    );
  }
  if (kept) return { status: kept.status, body: JSON.parse(kept.answer) as unknown };
  const outcome = await work();
  await store.keep(personId, key, request.path, {
    requestHash: hash,
    status: outcome.status,
    answer: JSON.stringify(outcome.body ?? null),
  });
  return outcome;
}

function send(response: Response, { status, body }: Outcome): void {
  if (response.headersSent) return;
  if (status === 204) response.status(204).end();
  else response.status(status).json(body);
}

/** Hash of what was asked, to tell a repeat from a different request with the same key. */
const requestHash = (request: Request): string =>
  createHash('sha256')
    .update(`${request.method} ${request.originalUrl}\n${JSON.stringify(request.body ?? null)}`)
    .digest('hex');
