import { OptimisticLockError } from '@mikro-orm/core';
import { Catch, HttpException, type ArgumentsHost, type ExceptionFilter } from '@nestjs/common';
import type { Response } from 'express';
import type { Logger } from 'pino';
import { requestIdOf } from '../log/request-id.js';
import { answerRefusal } from './error-answer.js';
import { notFound, Refusal, RefusedError } from './refusal.js';

/** The one place where an exception becomes an answer. What is unknown is logged whole and told as a bare sentence. */
@Catch()
export class ErrorFilter implements ExceptionFilter {
  constructor(private readonly log: Logger) {}

  catch(error: unknown, host: ArgumentsHost): void {
    const response = host.switchToHttp().getResponse<Response>();
    const refusal = refusalOf(error);
    if (refusal.code === 'fault') {
      this.log.error({ err: error, requestId: requestIdOf(response) }, 'a request failed');
    }
    answerRefusal(response, refusal);
  }
}

function refusalOf(error: unknown): Refusal {
  if (error instanceof RefusedError) return error.refusal;
  if (error instanceof OptimisticLockError) {
    return new Refusal(
      'conflict',
      'Somebody else changed this at the same moment. Load it again and repeat.',
    );
  }
  if (error instanceof HttpException) return frameworkRefusal(error.getStatus());
  return fault();
}

/** Nest's own exceptions carry texts that are not ours; only their status is taken. */
function frameworkRefusal(status: number): Refusal {
  if (status === 404) return notFound();
  if (status === 401) return new Refusal('unauthenticated', 'Sign in first.');
  if (status === 403) return new Refusal('forbidden', 'You may not do this.');
  if (status === 413) return new Refusal('too-large', 'The request is too large.');
  if (status === 429)
    return new Refusal('too-many', 'Too many requests. Wait a minute and try again.', undefined, 60);
  if (status >= 400 && status < 500) return new Refusal('invalid', 'The request cannot be read.');
  return fault();
}

function fault(): Refusal {
  return new Refusal('fault', 'Something went wrong on the server. Nothing was changed; try again later.');
}
