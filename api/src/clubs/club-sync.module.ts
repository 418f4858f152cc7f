import { Module } from '@nestjs/common';
import { SyncModule } from '../sync/sync.module.js';
import { ClubSyncRows } from './club-sync-rows.js';

/** Registers clubs and memberships with the sync round. */
@Module({ imports: [SyncModule], providers: [ClubSyncRows] })
export class ClubSyncModule {}
