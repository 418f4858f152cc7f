import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { PassportModule } from '@nestjs/passport';
import { AccessGuard } from './access.guard.js';
import { AccessTokenStrategy } from './access-token.strategy.js';

@Module({
  imports: [PassportModule],
  providers: [AccessTokenStrategy, { provide: APP_GUARD, useClass: AccessGuard }],
})
export class AccountsModule {}
