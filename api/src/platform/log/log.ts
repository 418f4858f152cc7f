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

/** A database error carries the values of the row that it failed on; only names, codes and the stack are kept. */
function bareError(error: unknown): object {
  if (!(error instanceof Error)) return { name: typeof error };
  const { code, constraint } = error as { code?: unknown; constraint?: unknown };
  return { name: error.name, code, constraint, stack: error.stack };
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
