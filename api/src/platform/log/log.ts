import { DriverException } from '@mikro-orm/core';
import type { LoggerService } from '@nestjs/common';
import { pino, stdTimeFunctions, type Logger } from 'pino';

/** The process's log: JSON lines on standard output. No bodies, tokens or addresses are ever given to it. */
export function createLog(level: string): Logger {
  return pino({
    level,
    base: null,
    timestamp: stdTimeFunctions.isoTime,
    serializers: { err: bareError },
  });
}

/** A database error's text carries the values of the row that it failed on: code, constraint and frames are kept. */
function bareError(error: unknown): object {
  if (!(error instanceof Error)) return { name: typeof error };
  const { name, message, stack } = error;
  const frames = stack?.split('\n').filter((line) => line.startsWith('    at '));
  if (!(error instanceof DriverException)) return { name, message, frames };
  const { code, constraint } = error as { code?: unknown; constraint?: unknown };
  return { name, code, constraint, frames };
}

/** Nest's own messages in the same log; its list of routes and modules is for debugging. */
export class FrameworkLog implements LoggerService {
  constructor(private readonly destination: Logger) {}

  log(message: unknown): void {
    this.destination.debug(String(message));
  }

  warn(message: unknown): void {
    this.destination.warn(String(message));
  }

  error(message: unknown, ...details: unknown[]): void {
    this.destination.error({ details: details.map(String) }, String(message));
  }
}
