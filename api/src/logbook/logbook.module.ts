import { MikroORM } from '@mikro-orm/postgresql';
import { Module, type OnModuleInit } from '@nestjs/common';
import { ClubsModule } from '../clubs/clubs.module.js';
import { SyncFeatures } from '../sync/sync-features.js';
import { SyncModule } from '../sync/sync.module.js';
import { RecordHistoryController } from './record-history.controller.js';
import { recordTables } from './record-tables.js';

/** The records of the field: their tables, given to the sync round, and what is asked of them one by one. */
@Module({
  imports: [ClubsModule, SyncModule],
  controllers: [RecordHistoryController],
})
export class LogbookModule implements OnModuleInit {
  constructor(
    private readonly orm: MikroORM,
    private readonly features: SyncFeatures,
  ) {}

  onModuleInit(): void {
    for (const table of recordTables(this.orm.getMetadata())) this.features.registerTable(table);
  }
}
