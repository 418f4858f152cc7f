import { Injectable } from '@nestjs/common';
import type { HubClub } from '@harkmoor/sync-model/hub/ports';
import type { Role } from '@harkmoor/sync-model/records/member';
import type { WritableType } from '@harkmoor/sync-model/records/record-types';
import { recordFeed, type FeedSource } from './feed.js';
import { HISTORY_FEED } from './history-statements.js';
import type { RecordTable } from './record-table.js';
import type { Query } from './sql-session.js';

/** What the sync round needs of the feature that keeps clubs and memberships. */
export type ClubRows = {
  readonly feed: FeedSource;
  /** The account's role, its membership held against change to the end of the transaction; null where there is none. */
  memberRole(query: Query, clubId: string, accountId: string): Promise<Role | null>;
  /** Locks the club to the end of the transaction; every writer of its feed takes this lock first. */
  lockClub(query: Query, clubId: string): Promise<HubClub>;
  /** Leaves the club, locked before, at `seq`. */
  setSeq(query: Query, clubId: string, seq: number): Promise<void>;
  /** Those of the accounts that are members of the club now. */
  membersAmong(query: Query, clubId: string, accountIds: readonly string[]): Promise<string[]>;
  memberships(query: Query, accountId: string): Promise<{ clubId: string; role: Role; club: HubClub }[]>;
};

/** Where features say what they bring to the sync round; this module knows none of them by name. */
@Injectable()
export class SyncFeatures {
  private readonly tables = new Map<WritableType, RecordTable>();
  private clubRows: ClubRows | undefined;

  registerTable(table: RecordTable): void {
    this.tables.set(table.type, table);
  }

  registerClubs(clubs: ClubRows): void {
    this.clubRows = clubs;
  }

  clubs(): ClubRows {
    if (!this.clubRows) throw new Error('no feature has registered clubs with the sync round');
    return this.clubRows;
  }

  table(type: WritableType): RecordTable {
    const table = this.tables.get(type);
    if (!table) throw new Error(`no feature has registered the record type ${type}`);
    return table;
  }

  allTables(): RecordTable[] {
    return [...this.tables.values()];
  }

  feeds(): FeedSource[] {
    return [...this.allTables().map(recordFeed), this.clubs().feed, HISTORY_FEED];
  }
}
