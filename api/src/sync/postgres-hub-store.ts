import type { Knex } from '@mikro-orm/postgresql';
import type { HubSnapshot, HubStore, HubWrite } from '@harkmoor/sync-model/hub/ports';
import type { FeedRecord } from '@harkmoor/sync-model/protocol/messages';
import type { RecordType } from '@harkmoor/sync-model/records/record-types';
import { pageStatement } from './feed.js';
import { PostgresHubWrite } from './postgres-hub-write.js';
import { inTransaction, type Query } from './sql-session.js';
import type { SyncFeatures } from './sync-features.js';

const BEGIN_WRITE = 'begin isolation level read committed';
const BEGIN_SNAPSHOT = 'begin isolation level repeatable read read only';

type FeedRow = {
  type: RecordType;
  id: string;
  owner_id: string | null;
  seq: string;
  stamp: string;
  stamps: Record<string, string> | null;
  fields: Record<string, unknown>;
};

/** The hub's storage in PostgreSQL: bound, set-based statements, no object mapping on the way. */
export class PostgresHubStore implements HubStore {
  constructor(
    private readonly knex: Knex,
    private readonly features: SyncFeatures,
  ) {}

  write<T>(clubId: string, work: (tx: HubWrite) => Promise<T>): Promise<T> {
    return inTransaction(this.knex, BEGIN_WRITE, (query) =>
      work(new PostgresHubWrite(query, clubId, this.features)),
    );
  }

  read<T>(work: (snapshot: HubSnapshot) => Promise<T>): Promise<T> {
    return inTransaction(this.knex, BEGIN_SNAPSHOT, (query) => work(this.snapshotOn(query)));
  }

  private snapshotOn(query: Query): HubSnapshot {
    return {
      memberships: (accountId) => this.features.clubs().memberships(query, accountId),
      page: async (clubId, cursor, limit) => {
        const rows = await query<FeedRow>(pageStatement(this.features.feeds()), [clubId, cursor, limit]);
        return rows.map(feedRecord);
      },
    };
  }
}

function feedRecord({ type, id, owner_id, seq, stamp, stamps, fields }: FeedRow): FeedRecord {
  const record = { type, id, ownerId: owner_id, seq: Number(seq), at: stamp, fields };
  return stamps ? { ...record, stamps } : record;
}
