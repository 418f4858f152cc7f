import { Module } from '@nestjs/common';
import { ClubListener } from './notices/club-listener.js';
import { ClubNotices } from './notices/club-notices.js';
import { NoticesController } from './notices/notices.controller.js';
import { RecordHistory } from './record-history.js';
import { SyncController } from './sync.controller.js';
import { SyncFeatures } from './sync-features.js';
import { SyncRounds } from './sync-rounds.js';

/** The sync round. It imports no feature: features register their tables with `SyncFeatures`. */
@Module({
  controllers: [SyncController, NoticesController],
  providers: [SyncFeatures, SyncRounds, RecordHistory, ClubListener, ClubNotices],
  exports: [SyncFeatures, RecordHistory],
})
export class SyncModule {}
