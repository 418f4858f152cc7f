import type { INestApplication } from '@nestjs/common';
import type { Logger } from 'pino';

const CLOSING_MS_MAX = 10_000;

/** Ends the process cleanly on a signal, or when the process that started it over a channel is gone. */
export function closeOnSignals(app: INestApplication, log: Logger): void {
  let isClosing = false;
  const close = (reason: string) => {
    if (isClosing) return;
    isClosing = true;
    log.info({ reason }, 'closing');
    setTimeout(() => process.exit(1), CLOSING_MS_MAX).unref();
    app.close().then(
      () => process.exit(0),
      (error: unknown) => {
        log.error({ err: error }, 'closing failed');
        process.exit(1);
      },
    );
  };
  for (const signal of ['SIGINT', 'SIGTERM'] as const) process.on(signal, () => close(signal));
  process.on('disconnect', () => close('the starting process is gone'));
}
