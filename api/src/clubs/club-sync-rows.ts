import { Injectable, type OnModuleInit } from '@nestjs/common';
import type { HubClub } from '@harkmoor/sync-model/hub/ports';
import type { ClubCard } from '@harkmoor/sync-model/protocol/messages';
import type { Role } from '@harkmoor/sync-model/records/member';
import type { FeedSource } from '../sync/feed.js';
import type { Query, Statement } from '../sync/sql-session.js';
import { SyncFeatures, type ClubRows } from '../sync/sync-features.js';

type ClubRow = {
  club_id: string;
  history_id: string;
  seq: string;
  name: string;
  kind: ClubCard['kind'];
  itu_region: ClubCard['ituRegion'];
  demo: boolean;
};

const CLUB_COLUMNS =
  'club.club_id, club.history_id, club.seq, club.name, club.kind, club.itu_region, club.demo';

const MEMBER_ROLE: Statement = {
  name: 'clubs-member-role',
  text: `select role from membership where club_id = $1 and account_id = $2 and left_at is null for share`,
};
const LOCK_CLUB: Statement = {
  name: 'clubs-lock',
  text: `select ${CLUB_COLUMNS} from club where club_id = $1 for update`,
};
const SET_SEQ: Statement = { name: 'clubs-set-seq', text: 'update club set seq = $2 where club_id = $1' };
const MEMBERSHIPS: Statement = {
  name: 'clubs-memberships',
  text: `select membership.role, ${CLUB_COLUMNS} from membership join club using (club_id)
    where membership.account_id = $1 and membership.left_at is null order by club_id`,
};

const MEMBERS_AMONG: Statement = {
  name: 'clubs-members-among',
  text: `select account_id from membership
    where club_id = $1 and account_id = any($2::uuid[]) and left_at is null`,
};

const MEMBER_FEED: FeedSource = {
  type: 'member',
  table: 'membership',
  id: 'account_id',
  ownerId: 'null::uuid',
  stamp: 'stamp::text',
  stamps: 'null::jsonb',
  fields: `json_strip_nulls(json_build_object('deleted', false, 'name', name, 'role', role,
    'joinedAt', joined_at, 'leftAt', left_at))`,
};

/** Gives the sync round the clubs and memberships: who may write where, the club's lock, and the members' feed. */
@Injectable()
export class ClubSyncRows implements ClubRows, OnModuleInit {
  readonly feed = MEMBER_FEED;

  constructor(private readonly features: SyncFeatures) {}

  onModuleInit(): void {
    this.features.registerClubs(this);
  }

  async memberRole(query: Query, clubId: string, accountId: string): Promise<Role | null> {
    const [row] = await query<{ role: Role }>(MEMBER_ROLE, [clubId, accountId]);
    return row?.role ?? null;
  }

  async lockClub(query: Query, clubId: string): Promise<HubClub> {
    const [row] = await query<ClubRow>(LOCK_CLUB, [clubId]);
    if (!row) throw new Error(`the club ${clubId} is gone although it has a membership`);
    return hubClub(row);
  }

  async setSeq(query: Query, clubId: string, seq: number): Promise<void> {
    await query(SET_SEQ, [clubId, seq]);
  }

  async membersAmong(query: Query, clubId: string, accountIds: readonly string[]): Promise<string[]> {
    const rows = await query<{ account_id: string }>(MEMBERS_AMONG, [clubId, accountIds]);
    return rows.map((row) => row.account_id);
  }

  async memberships(query: Query, accountId: string) {
    const rows = await query<ClubRow & { role: Role }>(MEMBERSHIPS, [accountId]);
    return rows.map((row) => ({ clubId: row.club_id, role: row.role, club: hubClub(row) }));
  }
}

function hubClub({ history_id, seq, name, kind, itu_region, demo }: ClubRow): HubClub {
  return { historyId: history_id, seq: Number(seq), card: { name, kind, ituRegion: itu_region, demo } };
}
