import { randomUUID } from 'node:crypto';
import type { RequestHandler, Response } from 'express';

/** Gives every request a number that stands in the answer, the log and the history. */
export const giveRequestId: RequestHandler = (_request, response, next) => {
  response.locals['requestId'] = randomUUID();
  response.setHeader('X-Request-Id', requestId(response));
  next();
};

export const requestId = (response: Response): string => String(response.locals['requestId'] ?? '');
