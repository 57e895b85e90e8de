import express, { type Express } from 'express';
import type { Deps } from './deps';
import { answerFailure } from './http/answer-failure';
import { clientFiles } from './http/client-files';
import { Failure } from './http/failure';
import { openApiDocument } from './http/openapi';
import { limitPerMinute } from './http/rate-limit';
import { giveRequestId } from './http/request-id';
import { sameOriginOnly } from './http/same-origin';
import { securityHeaders } from './http/security-headers';
import { shallowBody } from './http/shallow-body';
import { Api } from './http/serve';
import { databaseIdempotency } from './modules/auth/idempotency-store';
import { authenticateWith } from './modules/auth/authenticate';
import { serveModules } from './modules/serve-modules';

/** A whole site may sit behind one network address; this only stops a flood. */
const REQUESTS_PER_MINUTE = 30_000;

/** Builds the product's HTTP side from its dependencies; it neither listens nor reads the environment. */
export function createApp(
  deps: Deps,
  clientFolder: string,
): { readonly app: Express; readonly api: Api } {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', deps.config.trustProxy ? 1 : false);
  app.set('query parser', 'simple');
  app.use(giveRequestId, ...securityHeaders(deps.config.publicUrl.startsWith('https:')));
  app.use('/api', (_request, response, next) => {
    response.setHeader('Cache-Control', 'no-store');
    next();
  });
  app.use('/api', limitPerMinute(REQUESTS_PER_MINUTE));
  app.use(
    '/api',
    sameOriginOnly(deps.config.publicUrl),
    express.json({ limit: '256kb' }),
    shallowBody,
  );
  const api = new Api(authenticateWith(deps), deps.clock, databaseIdempotency(deps.db));
  serveModules(api, deps);
  app.use(api.router);
  app.get('/api/openapi.json', (_request, response) => {
    response.json(openApiDocument(api.contracts, deps.config.publicUrl));
  });
  app.use('/api', unknownRoute(api));
  app.use(clientFiles(clientFolder));
  app.use(answerFailure(deps.log));
  return { app, api };
}

/** A known path with another method is 405, anything else under /api is 404. */
function unknownRoute(api: Api): express.RequestHandler {
  return (request, response, next) => {
    const path = `/api${request.path}`;
    const methods = api.contracts
      .filter((contract) => pathPattern(contract.path).test(path))
      .map((contract) => contract.method.toUpperCase());
    if (methods.length === 0) {
      return next(
        new Failure('route.unknown', 404, 'Not found', 'There is nothing at this address.'),
      );
    }
    response.setHeader('Allow', methods.join(', '));
    return next(
      new Failure(
        'method.unsupported',
        405,
        'Method not supported',
        `This address answers ${methods.join(', ')}.`,
      ),
    );
  };
}

const pathPattern = (path: string) => new RegExp(`^${path.replaceAll(/:\w+/g, '[^/]+')}$`);
