import { Global, Module } from '@nestjs/common';
import { Clock, SystemClock } from './clock/clock.js';
import { Configuration, loadConfiguration } from './configuration/configuration.js';
import { HealthController } from './health/health.controller.js';
import { Secrets } from './secrets/secrets.js';

/** What every feature may ask for: configuration, clock, and keys. */
@Global()
@Module({
  controllers: [HealthController],
  providers: [
    { provide: Configuration, useFactory: () => loadConfiguration(process.env) },
    { provide: Clock, useClass: SystemClock },
    Secrets,
  ],
  exports: [Configuration, Clock, Secrets],
})
export class PlatformModule {}
