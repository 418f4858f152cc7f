import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import type { WritableType } from '@harkmoor/sync-model/records/record-types';
import { HistoryRow } from './history.row.js';

/** The replaced values of single records, also those that do not travel in the feed. */
@Injectable()
export class RecordHistory {
  constructor(private readonly em: EntityManager) {}

  /** Newest first; the caller has made sure that whoever asks may see the club. */
  async of(clubId: string, recordType: WritableType, recordId: string): Promise<HistoryRow[]> {
    return this.em.find(
      HistoryRow,
      { clubId, recordType, recordId },
      { orderBy: { at: 'desc', id: 'desc' } },
    );
  }
}
