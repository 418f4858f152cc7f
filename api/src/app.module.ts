import { Module } from '@nestjs/common';
import { AccountsModule } from './accounts/accounts.module.js';
import { ClubsModule } from './clubs/clubs.module.js';
import { DatabaseModule } from './platform/database/database.module.js';
import { RequestLimitModule } from './platform/http/request-limit.module.js';
import { PlatformModule } from './platform/platform.module.js';

@Module({
  imports: [PlatformModule, DatabaseModule, RequestLimitModule, AccountsModule, ClubsModule],
})
export class AppModule {}
