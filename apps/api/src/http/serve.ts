import { Router, type Request, type RequestHandler, type Response } from 'express';
import { may } from '@ligament/domain/contract/policy';
import type { RouteContract } from '@ligament/domain/contract/route';
import type { z } from 'zod';
import type { Clock } from '../clock';
import type { Actor } from './actor';
import { Failure, forbidden } from './failure';
import { idempotent, type IdempotencyStore } from './idempotency';
import { requestId } from './request-id';

const PROOF_MILLISECONDS = 5 * 60_000;

/** What a handler is given: checked input, who asks, and the version the client has seen. */
export interface Call<C extends RouteContract, A> {
  readonly params: z.output<C['params']>;
  readonly query: z.output<C['query']>;
  readonly body: z.output<C['body']>;
  readonly actor: A;
  /** The version in If-Match; only on versioned routes. */
  readonly seen: number;
  readonly request: Request;
  readonly response: Response;
}

type Answer<C extends RouteContract> = z.input<C['response']> | z.output<C['response']>;
type ActorOf<C extends RouteContract> = C['access'] extends 'public' ? Actor | null : Actor;

export type Authenticate = (request: Request, response: Response) => Promise<Actor | null>;

/** The API being put together: each contract is served once, checked the same way, and listed for the OpenAPI document. */
export class Api {
  readonly router = Router({ caseSensitive: true, strict: true });
  readonly contracts: RouteContract[] = [];

  constructor(
    private readonly authenticate: Authenticate,
    private readonly clock: Clock,
    private readonly idempotency: IdempotencyStore,
  ) {}

  /** Serves a route: who may, what came, one call, the answer. */
  serve<C extends RouteContract>(
    contract: C,
    handle: (call: Call<C, ActorOf<C>>) => Promise<Answer<C>>,
    ...before: RequestHandler[]
  ): void {
    this.contracts.push(contract);
    this.router[contract.method](contract.path, async (request, response) => {
      const actor = await this.admit(contract, request, response);
      for (const step of before) await run(step, request, response);
      const call = { ...readInput(contract, request), actor, request, response } as Call<
        C,
        ActorOf<C>
      >;
      await idempotent(this.idempotency, actor, request, response, async () => {
        const answer = await handle(call);
        return { status: contract.status, body: answerBody(contract, answer) };
      });
    });
  }

  /** Serves bytes (a download); the handler writes the answer itself. */
  stream<C extends RouteContract>(
    contract: C,
    handle: (call: Call<C, Actor>) => Promise<void>,
  ): void {
    this.contracts.push(contract);
    this.router[contract.method](contract.path, async (request, response) => {
      const actor = await this.admit(contract, request, response);
      await handle({ ...readInput(contract, request), actor, request, response } as Call<C, Actor>);
    });
  }

  private async admit(
    contract: RouteContract,
    request: Request,
    response: Response,
  ): Promise<Actor | null> {
    const actor = await this.authenticate(request, response);
    if (contract.access === 'public') return actor;
    if (!actor) throw new Failure('unauthenticated', 401, 'Not signed in', 'Sign in to go on.');
    if (!may(actor.role, contract.access)) {
      throw forbidden(`Your role (${actor.role}) may not do this.`);
    }
    if (
      contract.proof &&
      this.clock.now().getTime() - actor.provedAt.getTime() > PROOF_MILLISECONDS
    ) {
      throw new Failure(
        'proof-required',
        403,
        'Give your password again',
        'A sign-off needs your password given again within the last five minutes.',
      );
    }
    return { ...actor, requestId: requestId(response) };
  }
}

async function run(step: RequestHandler, request: Request, response: Response): Promise<void> {
  await new Promise<void>((resolve, reject) => {
    void step(request, response, (error?: unknown) => (error ? reject(error) : resolve()));
  });
}

function readInput(contract: RouteContract, request: Request) {
  refuseRepeatedKeys(request);
  return {
    params: check(contract.params, request.params, 'The address'),
    query: check(contract.query, request.query, 'The address'),
    body: contract.upload ? {} : check(contract.body, request.body ?? {}, 'The input'),
    seen: contract.versioned ? seenVersion(request) : 0,
  };
}

function refuseRepeatedKeys(request: Request): void {
  for (const [name, value] of Object.entries(request.query)) {
    if (typeof value !== 'string') {
      throw new Failure(
        'query.repeated',
        400,
        'Address not understood',
        `"${name}" stands in the address more than once.`,
      );
    }
  }
}

function check(schema: z.ZodType, value: unknown, what: string): unknown {
  const read = schema.safeParse(value);
  if (read.success) return read.data;
  const errors = read.error.issues.map((issue) => ({
    field:
      issue.path.join('.') || (issue.code === 'unrecognized_keys' ? issue.keys.join(', ') : ''),
    message: issue.message,
  }));
  const first = errors[0];
  throw new Failure(
    'input',
    400,
    `${what} cannot be used`,
    first ? `${first.field ? `${first.field}: ` : ''}${first.message}` : 'Check the input.',
    { errors },
  );
}

function seenVersion(request: Request): number {
  const header = request.get('if-match');
  const version = /^"(\d{1,9})"$/.exec(header ?? '')?.[1];
  if (version === undefined) {
    throw new Failure(
      'if-match',
      428,
      'Version missing',
      'Send If-Match with the version of the record you have seen, for example If-Match: "3".',
    );
  }
  return Number(version);
}

/** Only what the contract names leaves the server. */
function answerBody(contract: RouteContract, answer: unknown): unknown {
  return contract.status === 204 ? undefined : contract.response.parse(answer);
}

/** The ETag of a record's version. */
export const etag = (version: number): string => `"${version}"`;
