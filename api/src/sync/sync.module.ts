import { Module } from '@nestjs/common';
import { RecordHistory } from './record-history.js';
import { SyncController } from './sync.controller.js';
import { SyncFeatures } from './sync-features.js';
import { SyncRounds } from './sync-rounds.js';

/** The sync round. It imports no feature: features register their tables with `SyncFeatures`. */
@Module({
  controllers: [SyncController],
  providers: [SyncFeatures, SyncRounds, RecordHistory],
  exports: [SyncFeatures, RecordHistory],
})
export class SyncModule {}
