import type { MikroORM } from '@mikro-orm/postgresql';
import { v7 } from 'uuid';
import { answerRound } from '@harkmoor/sync-model/hub/answer-round';
import type { HubPorts } from '@harkmoor/sync-model/hub/ports';
import type { Change, SyncAnswer, SyncClubAnswer } from '@harkmoor/sync-model/protocol/messages';
import { PROTOCOL_VERSION } from '@harkmoor/sync-model/protocol/version';
import type { Role } from '@harkmoor/sync-model/records/member';
import { formatStamp, SERVER_DEVICE_ID, type Stamp } from '@harkmoor/sync-model/stamp/stamp';
import { ClubSyncRows } from '../../src/clubs/club-sync-rows.js';
import { recordTables } from '../../src/logbook/record-tables.js';
import { PostgresHubStore } from '../../src/sync/postgres-hub-store.js';
import { SyncFeatures } from '../../src/sync/sync-features.js';
import { testDatabase } from './test-database.js';

/** 2026-11-12T19:00Z: before the day on which tests run, so that no stamp is ahead. */
export const EVENING_MS = Date.UTC(2026, 10, 12, 19);

export function stampAt(ms: number, deviceId = 'phone001', counter = 0): Stamp {
  return formatStamp({ wallMs: ms, counter, deviceId });
}

export function clubPart(answer: SyncAnswer, clubId: string): SyncClubAnswer {
  const part = answer.clubs.find((club) => club.clubId === clubId);
  if (!part) throw new Error(`the answer has no club ${clubId}: ${JSON.stringify(answer).slice(0, 400)}`);
  return part;
}

/** The hub on a database of its own: accounts and clubs made by hand, rounds answered as the server answers them. */
export class TestHub {
  private constructor(
    readonly orm: MikroORM,
    readonly ports: HubPorts,
  ) {}

  static async open(): Promise<TestHub> {
    const orm = await testDatabase();
    const features = new SyncFeatures();
    for (const table of recordTables(orm.getMetadata())) features.registerTable(table);
    new ClubSyncRows(features).onModuleInit();
    const store = new PostgresHubStore(orm.em.getKnex(), features);
    return new TestHub(orm, { store, nowMs: () => Date.now(), newId: () => v7() });
  }

  async close(): Promise<void> {
    await this.orm.schema.dropDatabase();
    await this.orm.close(true);
  }

  async rows<Row>(sql: string, values: readonly unknown[] = []): Promise<Row[]> {
    return this.orm.em.getConnection().execute<Row[]>(sql, [...values]);
  }

  async addAccount(name: string): Promise<string> {
    const id = v7();
    await this.rows(
      `insert into account (id, email, name, password_hash, created_at) values (?, ?, ?, 'none', 0)`,
      [id, `${id}@harkmoor.test`, name],
    );
    return id;
  }

  async addClub(kind: 'club' | 'my-log' = 'club'): Promise<string> {
    const id = v7();
    await this.rows(
      `insert into club (club_id, kind, name, itu_region, demo, seq, history_id, created_at, join_code_uses_left)
       values (?, ?, 'Moor listeners', 1, false, 0, ?, 0, 0)`,
      [id, kind, v7()],
    );
    return id;
  }

  async addMember(clubId: string, accountId: string, role: Role = 'member'): Promise<void> {
    await this.rows(
      `with raised as (update club set seq = seq + 1 where club_id = ? returning club_id, seq)
       insert into membership (club_id, account_id, name, role, joined_at, seq, stamp)
       select club_id, ?, 'Somebody', ?, ?, seq, ? from raised`,
      [clubId, accountId, role, EVENING_MS, stampAt(EVENING_MS, SERVER_DEVICE_ID)],
    );
  }

  /** A member with an account of their own. */
  async newMember(clubId: string, role: Role = 'member'): Promise<TestPhone> {
    const accountId = await this.addAccount('Somebody');
    await this.addMember(clubId, accountId, role);
    return new TestPhone(this, accountId, clubId);
  }

  async seqOf(clubId: string): Promise<number> {
    const [row] = await this.rows<{ seq: string }>('select seq from club where club_id = ?', [clubId]);
    return Number(row!.seq);
  }
}

/** One phone's side of the conversation about one club, with its cursor. */
export class TestPhone {
  cursor = 0;

  constructor(
    readonly hub: TestHub,
    readonly accountId: string,
    readonly clubId: string,
  ) {}

  async round(changes: Change[] = []): Promise<SyncAnswer> {
    return answerRound(
      this.hub.ports,
      { accountId: this.accountId },
      {
        protocol: PROTOCOL_VERSION,
        deviceId: 'phone001',
        sentAt: Date.now(),
        clubs: [{ clubId: this.clubId, historyId: null, cursor: this.cursor, changes }],
      },
    );
  }

  async push(...changes: Change[]): Promise<SyncClubAnswer> {
    const part = clubPart(await this.round(changes), this.clubId);
    this.cursor = part.cursor;
    return part;
  }

  /** All that is new in the feed, page after page. */
  async pull(): Promise<SyncClubAnswer['records']> {
    const records: SyncClubAnswer['records'] = [];
    for (;;) {
      const part = await this.push();
      records.push(...part.records);
      if (!part.more) return records;
    }
  }
}
