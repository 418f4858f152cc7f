import { randomUUID } from 'node:crypto';
import type { NextFunction, Request, Response } from 'express';
import type { Logger } from 'pino';
import { REQUEST_ID_HEADER } from './request-id.js';

/**
 * Gives each request an id and writes one line for each that asks the API: id, method, path without its query,
 * status, time taken. Nothing else of a request is ever read here, so no header, body or address can slip in.
 */
export function requestLog(log: Logger) {
  return (request: Request, response: Response, next: NextFunction): void => {
    const requestId = randomUUID();
    response.setHeader(REQUEST_ID_HEADER, requestId);
    if (request.path.startsWith('/api/')) {
      const { method, path } = request;
      const startedAt = performance.now();
      response.once('close', () => {
        const tookMs = Math.round(performance.now() - startedAt);
        const line = { requestId, method, path, status: response.statusCode, tookMs };
        if (!response.writableFinished) log.info(line, 'request cut off');
        else if (response.statusCode >= 500) log.error(line, 'request failed');
        else log.info(line, 'request');
      });
    }
    next();
  };
}
