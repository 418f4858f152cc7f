import { randomUUID } from 'node:crypto';
import type { Request, Response } from 'express';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';
import { REQUEST_ID_HEADER, requestIdOf } from './request-id.js';

/**
 * One line a request: id, method, path without its query, status and time. Headers, bodies and addresses of
 * people or machines are left out.
 */
export function requestLog(log: Logger) {
  return pinoHttp<Request, Response>({
    logger: log,
    genReqId: (_request, response) => {
      const id = randomUUID();
      response.setHeader(REQUEST_ID_HEADER, id);
      return id;
    },
    quietReqLogger: true,
    customLogLevel: (_request, response) => (response.statusCode >= 500 ? 'error' : 'info'),
    customSuccessObject: (request, response, value: { responseTime: number }) =>
      line(request, response, value),
    customErrorObject: (request, response, _error, value: { responseTime: number }) =>
      line(request, response, value),
    customSuccessMessage: () => 'request',
    customErrorMessage: () => 'request',
    wrapSerializers: false,
    serializers: {},
    autoLogging: { ignore: (request) => !request.originalUrl.startsWith('/api/') },
  });
}

function line(request: Request, response: Response, { responseTime }: { responseTime: number }): object {
  return {
    requestId: requestIdOf(response),
    method: request.method,
    path: request.originalUrl.split('?', 1)[0],
    status: response.statusCode,
    tookMs: Math.round(responseTime),
  };
}
