import { Global, Module } from '@nestjs/common';
import { Attempts } from './attempts/attempts.js';
import { Clock, SystemClock } from './clock/clock.js';
import { Configuration, loadConfiguration } from './configuration/configuration.js';
import { HealthController } from './health/health.controller.js';
import { Secrets } from './secrets/secrets.js';

/** What every feature may ask for: configuration, clock, keys, counts of tries. */
@Global()
@Module({
  controllers: [HealthController],
  providers: [
    { provide: Configuration, useFactory: () => loadConfiguration(process.env) },
    { provide: Clock, useClass: SystemClock },
    Secrets,
    Attempts,
  ],
  exports: [Configuration, Clock, Secrets, Attempts],
})
export class PlatformModule {}
