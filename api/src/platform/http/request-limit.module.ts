import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { ThrottlerGuard, ThrottlerModule } from '@nestjs/throttler';
import { Configuration } from '../configuration/configuration.js';
import { networkOf } from './network-of.js';

const MINUTE_MS = 60_000;

/** A ceiling for all requests of one network; what guards passwords and mails is counted in accounts/. */
@Module({
  imports: [
    ThrottlerModule.forRootAsync({
      inject: [Configuration],
      useFactory: ({ requestsPerMinute }: Configuration) => ({
        // how many are left is nobody's business; a refusal says how long to wait
        setHeaders: false,
        throttlers: [{ ttl: MINUTE_MS, limit: requestsPerMinute }],
        getTracker: (request: Record<string, unknown>) => networkOf(String(request.ip)),
        // one count for all routes: the default counts each route by itself
        generateKey: (_context: unknown, tracker: string) => tracker,
      }),
    }),
  ],
  providers: [{ provide: APP_GUARD, useClass: ThrottlerGuard }],
})
export class RequestLimitModule {}
