import type {
  HistoryRow,
  HubClub,
  HubKey,
  HubRecord,
  HubWrite,
  ReplacedKey,
} from '@harkmoor/sync-model/hub/ports';
import type { Role } from '@harkmoor/sync-model/records/member';
import { WRITABLE_TYPES, type WritableType } from '@harkmoor/sync-model/records/record-types';
import {
  HISTORY_INSERT,
  HISTORY_REPLACED,
  HISTORY_TRIM,
  historyInsertValue,
  historyReplacedValue,
  historyTrimValues,
} from './history-statements.js';
import { readStatement, referredStatement, upsertStatement } from './record-statements.js';
import type { RecordTable } from './record-table.js';
import type { Query } from './sql-session.js';
import type { SyncFeatures } from './sync-features.js';

type StoredRow = {
  type: WritableType;
  id: string;
  owner_id: string;
  seq: string;
  stamp: string;
  stamps: Record<string, string> | null;
  fields: Record<string, unknown>;
};

/** One write transaction of the sync round; the hub's code keeps the order of the steps. */
export class PostgresHubWrite implements HubWrite {
  constructor(
    private readonly query: Query,
    private readonly clubId: string,
    private readonly features: SyncFeatures,
  ) {}

  memberRole(accountId: string): Promise<Role | null> {
    return this.features.clubs().memberRole(this.query, this.clubId, accountId);
  }

  lockClub(): Promise<HubClub> {
    return this.features.clubs().lockClub(this.query, this.clubId);
  }

  async records(keys: readonly HubKey[]): Promise<(HubRecord | undefined)[]> {
    const tables = this.features.allTables();
    const ids = idsByType(keys);
    const rows = await this.query<StoredRow>(readStatement(tables), [
      this.clubId,
      ...tables.map(({ type }) => ids.get(type) ?? []),
    ]);
    const found = new Map(rows.map((row) => [`${row.type} ${row.id}`, hubRecord(row)]));
    return keys.map(({ type, id }) => found.get(`${type} ${id}`));
  }

  async referredTo(keys: readonly HubKey[]): Promise<HubKey[]> {
    const referred: HubKey[] = [];
    for (const [type, ids] of idsByType(keys)) {
      const statement = referredStatement(this.features.allTables(), type);
      if (!statement) continue;
      const rows = await this.query<{ id: string }>(statement, [this.clubId, ids]);
      referred.push(...rows.map(({ id }) => ({ type, id })));
    }
    return referred;
  }

  replacedBefore(values: readonly ReplacedKey[]): Promise<ReplacedKey[]> {
    return this.query<ReplacedKey>(HISTORY_REPLACED, [this.clubId, historyReplacedValue(values)]);
  }

  async save(records: readonly HubRecord[], history: readonly HistoryRow[], seq: number): Promise<void> {
    // parents before what refers to them: foreign keys are checked at the end of each statement
    for (const type of WRITABLE_TYPES) {
      const ofType = records.filter((record) => record.type === type);
      if (ofType.length === 0) continue;
      const table = this.features.table(type);
      const rows = JSON.stringify(ofType.map((record) => columnValues(table, record)));
      await this.query(upsertStatement(table), [this.clubId, rows]);
    }
    if (history.length > 0) {
      await this.query(HISTORY_INSERT, [this.clubId, historyInsertValue(history)]);
      await this.query(HISTORY_TRIM, [this.clubId, ...historyTrimValues(history)]);
    }
    await this.features.clubs().setSeq(this.query, this.clubId, seq);
  }
}

function idsByType(keys: readonly HubKey[]): Map<WritableType, string[]> {
  const groups = new Map<WritableType, string[]>();
  for (const { type, id } of keys) {
    const group = groups.get(type);
    if (group) group.push(id);
    else groups.set(type, [id]);
  }
  return groups;
}

function hubRecord(row: StoredRow): HubRecord {
  const { type, id, owner_id, seq, stamp, stamps, fields } = row;
  const record = { type, id, ownerId: owner_id, seq: Number(seq), at: stamp, fields };
  return stamps ? { ...record, stamps } : record;
}

/** The row of a record by column; what is null is left out, which the upsert reads as null. */
function columnValues(table: RecordTable, record: HubRecord): Record<string, unknown> {
  const row: Record<string, unknown> = {
    id: record.id,
    owner_id: record.ownerId,
    seq: record.seq,
    stamp: record.at,
    stamps: record.stamps,
  };
  for (const { field, column } of table.columns) {
    const value = record.fields[field];
    if (value !== null) row[column] = value;
  }
  return row;
}
