import type { Response } from 'express';
import { requestIdOf } from '../log/request-id.js';
import { STATUS_BY_CODE, type ErrorAnswer, type Refusal } from './refusal.js';

/** Sends a refusal: its status, code, sentence, places, and the id under which the log knows the request. */
export function answerRefusal(response: Response, refusal: Refusal): void {
  if (response.headersSent) {
    response.destroy();
    return;
  }
  const answer: ErrorAnswer = {
    code: refusal.code,
    message: refusal.message,
    ...(refusal.where ? { where: refusal.where.map(({ path, message }) => ({ path, message })) } : {}),
    requestId: requestIdOf(response),
  };
  if (refusal.retryAfterS !== undefined) response.setHeader('Retry-After', String(refusal.retryAfterS));
  response.status(STATUS_BY_CODE[refusal.code]).json(answer);
}
