import type { ClubState } from '@harkmoor/sync-model/device/ports';
import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { SERVER_TYPES, WRITABLE_TYPES, type RecordType } from '@harkmoor/sync-model/records/record-types';
import { Dexie, type Table } from 'dexie';
import type { Draft } from './draft';

export type Setting = { name: string; value: unknown };
/** Dexie's key of a record: a club and an id, so that a club can be taken out as one range. */
export type StoredKey = [clubId: string, id: string];

const KEY = '[clubId+id]';
/** Sparse: only records with a debt are in it, so the queue needs no second store and no second write. */
const OWED = '[clubId+debt.since]';

const EXTRA_INDEXES: Partial<Record<RecordType, readonly string[]>> = {
  reception: [
    '[clubId+fields.deviceAt]',
    '[clubId+fields.outingId]',
    '[clubId+fields.siteId]',
    '[clubId+fields.targetId]',
  ],
  outing: ['[clubId+fields.startedAt]'],
  target: ['[clubId+fields.listId]'],
  attachment: ['[clubId+fields.receptionId]'],
  history: ['[clubId+fields.recordId]'],
};

/**
 * Everything that one account, or the guest, keeps on this phone. One database an account: what one person
 * logged can never be sent as another's. Every transaction is strictly durable.
 */
export class HarkmoorDatabase extends Dexie {
  declare clubs: Table<ClubState, string>;
  declare settings: Table<Setting, string>;
  declare drafts: Table<Draft, string>;

  constructor(name: string) {
    super(name, { chromeTransactionDurability: 'strict' });
    this.version(1).stores({
      ...Object.fromEntries(
        WRITABLE_TYPES.map((type) => [
          type,
          [KEY, OWED, 'debt.status', ...(EXTRA_INDEXES[type] ?? [])].join(),
        ]),
      ),
      ...Object.fromEntries(SERVER_TYPES.map((type) => [type, [KEY, ...(EXTRA_INDEXES[type] ?? [])].join()])),
      clubs: 'clubId',
      settings: 'name',
      drafts: 'id',
    });
  }

  /** The table of one record type. */
  recordTable<T extends RecordType>(type: T): Table<StoredRecord<T>, StoredKey> {
    return this.table(type);
  }
}

export function accountDatabaseName(accountId: string): string {
  return `harkmoor-${accountId}`;
}

export const GUEST_DATABASE_NAME = 'harkmoor-guest';
