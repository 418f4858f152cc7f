import { ROUND_BYTES_MAX } from '@harkmoor/sync-model/protocol/limits';
import { json, type NextFunction, type Request, type Response } from 'express';
import { answerRefusal } from '../errors/error-answer.js';
import { Refusal } from '../errors/refusal.js';

/** The limit counts what comes out of gzip; the margin is for the envelope of a full round. */
export const BODY_BYTES_MAX = ROUND_BYTES_MAX + 64 * 1024;

const STATE_CHANGING = new Set(['POST', 'PUT', 'PATCH', 'DELETE']);

/** Reads JSON bodies, plain or compressed; stops reading at the limit, so that a gzip bomb costs no memory. */
export const jsonBody = json({ limit: BODY_BYTES_MAX, strict: true, type: 'application/json' });

/**
 * A state change must be JSON, which no foreign page can send without a preflight, and must not say that it
 * comes from another site.
 */
export function onlyOwnJson(request: Request, response: Response, next: NextFunction): void {
  if (!STATE_CHANGING.has(request.method)) return next();
  if (request.headers['sec-fetch-site'] === 'cross-site') {
    return answerRefusal(response, new Refusal('cross-site', 'Another site may not change anything here.'));
  }
  if (!request.is('application/json')) {
    const message = 'Send JSON with the content type application/json.';
    return answerRefusal(response, new Refusal('wrong-content-type', message));
  }
  next();
}

/** Answers what the JSON reader refuses; what it does not know goes on to the exception filter. */
export function bodyErrors(error: unknown, _request: Request, response: Response, next: NextFunction): void {
  const refusal = bodyRefusal(error);
  if (refusal) answerRefusal(response, refusal);
  else next(error);
}

function bodyRefusal(error: unknown): Refusal | null {
  const { type, status } = error as { type?: string; status?: number };
  if (type === 'entity.too.large') {
    return new Refusal('too-large', `The request is larger than ${BODY_BYTES_MAX} bytes; send it in parts.`);
  }
  if (type === 'encoding.unsupported' || type === 'charset.unsupported') {
    return new Refusal('wrong-content-type', 'Send UTF-8 JSON, plain or compressed with gzip.');
  }
  if (type === 'entity.parse.failed') return new Refusal('invalid', 'The request is not readable JSON.');
  if (status !== undefined && status >= 400 && status < 500) {
    return new Refusal('invalid', 'The request did not arrive whole or is not readable.');
  }
  return null;
}
