import 'reflect-metadata';
import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { AppModule } from './app.module.js';
import { loadConfiguration } from './platform/configuration/configuration.js';
import { closeOnSignals } from './platform/http/close-on-signals.js';
import { createLog, FrameworkLog } from './platform/log/log.js';
import { APP_OPTIONS, setupApp } from './setup.js';

async function main(): Promise<void> {
  const { port, host, publicUrl, logLevel } = loadConfiguration(process.env);
  const log = createLog(logLevel);
  const options = { ...APP_OPTIONS, logger: new FrameworkLog(log), abortOnError: false };
  const app = await NestFactory.create<NestExpressApplication>(AppModule, options);
  setupApp(app, log);
  closeOnSignals(app, log);
  await app.listen(port, host);
  log.info({ listening: await app.getUrl(), publicUrl }, 'ready');
}

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exit(1);
});
