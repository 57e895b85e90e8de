import type { ErrorRequestHandler } from 'express';
import { MulterError } from 'multer';
import type { Logger } from 'pino';
import { DatabaseUnavailable, StorageFull } from '../db/database-failures';
import { Failure } from './failure';
import { requestId } from './request-id';
import { logSecurity } from './security-log';

/** The one place that answers failures, as RFC 9457 problem details; unknown ones are logged whole and answered blandly. */
export function answerFailure(log: Logger): ErrorRequestHandler {
  return (error: unknown, request, response, next) => {
    if (response.headersSent) {
      next(error);
      return;
    }
    const failure = asFailure(error);
    if (failure.status >= 500)
      log.error({ err: error, requestId: requestId(response) }, failure.code);
    if (failure.status === 403 || failure.status === 429) {
      const { method, path } = request;
      logSecurity(log, 'denied', {
        code: failure.code,
        method,
        path,
        requestId: requestId(response),
      });
    }
    if (failure.more.retryAfterSeconds !== undefined) {
      response.setHeader('Retry-After', String(failure.more.retryAfterSeconds));
    }
    response
      .status(failure.status)
      .type('application/problem+json')
      .send(
        JSON.stringify({
          type: `urn:ligament:problem:${failure.code}`,
          title: failure.title,
          status: failure.status,
          detail: failure.detail,
          instance: `urn:ligament:request:${requestId(response)}`,
          errors: failure.more.errors,
          current: failure.more.current,
        }),
      );
  };
}

function asFailure(error: unknown): Failure {
  if (error instanceof Failure) return error;
  if (error instanceof MulterError) return uploadFailure(error);
  const cause = causeChain(error);
  if (cause.some((each) => each instanceof StorageFull)) {
    return new Failure(
      'storage.full',
      507,
      'Storage is full',
      'The server’s disk is nearly full; nothing was saved. Tell your administrator.',
    );
  }
  if (cause.some((each) => each instanceof DatabaseUnavailable)) {
    return new Failure(
      'database.unavailable',
      503,
      'Busy',
      'The database did not answer in time; nothing was saved. Try again in a few seconds.',
      { retryAfterSeconds: 3 },
    );
  }
  return (
    bodyFailure(error) ??
    new Failure(
      'internal',
      500,
      'Something went wrong',
      'The request could not be completed and nothing was saved. Try again; if it happens again, give your administrator the request number.',
    )
  );
}

function causeChain(error: unknown): unknown[] {
  const chain: unknown[] = [];
  for (let each = error; each instanceof Error && chain.length < 5; each = each.cause)
    chain.push(each);
  return chain;
}

function uploadFailure(error: MulterError): Failure {
  if (error.code === 'LIMIT_FILE_SIZE') {
    return new Failure(
      'upload.too-large',
      413,
      'File too large',
      'The file is larger than this server accepts. Split it, or ask your administrator to raise the limit.',
    );
  }
  return new Failure(
    'upload.refused',
    400,
    'Upload refused',
    `Send one file in the field "file" (${error.message}).`,
  );
}

/** Failures of Express' own body parser: too large, not JSON, aborted. */
function bodyFailure(error: unknown): Failure | undefined {
  if (!(error instanceof Error) || !('status' in error) || typeof error.status !== 'number')
    return undefined;
  if (error.status === 413) {
    return new Failure(
      'body.too-large',
      413,
      'Request too large',
      'The request is larger than 256 kB.',
    );
  }
  if (error.status >= 400 && error.status < 500) {
    return new Failure(
      'body.unreadable',
      400,
      'Request not readable',
      'The request could not be read as JSON.',
    );
  }
  return undefined;
}
