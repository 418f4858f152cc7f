import { Module } from '@nestjs/common';
import { AccountsModule } from './accounts/accounts.module.js';
import { ClubSyncModule } from './clubs/club-sync.module.js';
import { ClubsModule } from './clubs/clubs.module.js';
import { LogbookModule } from './logbook/logbook.module.js';
import { DatabaseModule } from './platform/database/database.module.js';
import { RequestLimitModule } from './platform/http/request-limit.module.js';
import { PlatformModule } from './platform/platform.module.js';
import { SyncModule } from './sync/sync.module.js';

@Module({
  imports: [
    PlatformModule,
    DatabaseModule,
    RequestLimitModule,
    AccountsModule,
    ClubsModule,
    ClubSyncModule,
    LogbookModule,
    SyncModule,
  ],
})
export class AppModule {}
