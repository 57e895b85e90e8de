import type { RequestHandler } from 'express';
import { Failure } from './failure';

const DEEPEST = 20;

/** Refuses input nested deeper than any of ours is, before anything walks it. */
export const shallowBody: RequestHandler = (request, _response, next) => {
  if (isDeeper(request.body, DEEPEST)) {
    throw new Failure(
      'body.too-deep',
      400,
      'Request not readable',
      `The input is nested more than ${DEEPEST} levels deep.`,
    );
  }
  next();
};

function isDeeper(value: unknown, levels: number): boolean {
  if (typeof value !== 'object' || value === null) return false;
  if (levels === 0) return true;
  return Object.values(value).some((member) => isDeeper(member, levels - 1));
}
