import { feedRecordOf, feedRecordOfHistory } from '../src/hub/feed-record.js';
import type {
  HistoryRow,
  HubKey,
  HubRecord,
  HubSnapshot,
  HubStore,
  HubWrite,
  ReplacedKey,
} from '../src/hub/ports.js';
import type { ClubCard } from '../src/protocol/messages.js';
import type { Role } from '../src/records/member.js';
import { parentsOf } from '../src/records/record-types.js';
import type { Life, Steps } from './scheduler.js';

export type HubClubState = {
  readonly clubId: string;
  readonly card: ClubCard;
  readonly historyId: string;
  readonly seq: number;
  readonly members: ReadonlyMap<string, Role>;
  readonly records: ReadonlyMap<string, HubRecord>;
  readonly history: readonly HistoryRow[];
};

export type SaveWatcher = (before: HubClubState, after: HubClubState) => void;

export const hubKeyText = ({ type, id }: HubKey) => `${type}/${id}`;

/** The hub's database in memory: one lock a club, atomic commits, snapshots; each call is a step. */
export class MemoryHub implements HubStore {
  clubs: ReadonlyMap<string, HubClubState> = new Map();
  private locks = new Map<string, Promise<void>>();
  /** How often a write had to wait for another of the same club. */
  waits = 0;

  constructor(
    private readonly scheduler: Steps,
    private readonly onSave: SaveWatcher,
    public life: Life,
  ) {}

  put(club: HubClubState): void {
    this.clubs = new Map(this.clubs).set(club.clubId, club);
  }

  /** A new process: open transactions are gone with their locks, what was committed stays. */
  restart(life: Life): void {
    this.life = life;
    this.locks = new Map();
  }

  async write<T>(clubId: string, work: (tx: HubWrite) => Promise<T>): Promise<T> {
    const { life } = this;
    const open: OpenWrite = { clubId, draft: undefined, release: undefined };
    try {
      const result = await work(this.writeOn(open, life));
      await this.scheduler.step(life, 'hub commit');
      if (open.draft) this.commit(open.draft);
      return result;
    } finally {
      open.release?.();
    }
  }

  async read<T>(work: (snapshot: HubSnapshot) => Promise<T>): Promise<T> {
    const { life, clubs } = this;
    return work({
      memberships: async (accountId) => {
        await this.scheduler.step(life, 'hub memberships');
        return [...clubs.values()].flatMap((club) => {
          const role = club.members.get(accountId);
          return role ? [{ clubId: club.clubId, role, club }] : [];
        });
      },
      page: async (clubId, cursor, limit) => {
        await this.scheduler.step(life, 'hub page');
        return feedOf(clubs.get(clubId)!, cursor).slice(0, limit);
      },
    });
  }

  private commit(draft: HubClubState): void {
    const before = this.club(draft.clubId);
    // Memberships are not part of this transaction's writes.
    const after = { ...draft, members: before.members };
    this.put(after);
    this.onSave(before, after);
  }

  private club(clubId: string): HubClubState {
    const club = this.clubs.get(clubId);
    if (!club) throw new Error(`no club ${clubId}`);
    return club;
  }

  private writeOn(open: OpenWrite, life: Life): HubWrite {
    const step = (label: string) => this.scheduler.step(life, `hub ${label}`);
    const club = () => this.club(open.clubId);
    return {
      memberRole: async (accountId) => {
        await step('memberRole');
        return this.clubs.get(open.clubId)?.members.get(accountId) ?? null;
      },
      lockClub: async () => {
        await step('lockClub');
        open.release = await this.lock(open.clubId);
        return club();
      },
      records: async (keys) => {
        await step('records');
        return keys.map((key) => club().records.get(hubKeyText(key)));
      },
      referredTo: async (keys) => {
        await step('referredTo');
        const named = new Set(
          [...club().records.values()].flatMap(({ type, fields }) => parentsOf(type, fields).map(hubKeyText)),
        );
        return keys.filter((key) => named.has(hubKeyText(key)));
      },
      replacedBefore: async (values) => {
        await step('replacedBefore');
        const known = new Set(club().history.map(historyKey));
        return values.filter((value) => known.has(replacedKey(value)));
      },
      save: async (records, history, seq) => {
        await step('save');
        const before = club();
        const after = new Map(before.records);
        for (const record of records) after.set(hubKeyText(record), record);
        open.draft = { ...before, seq, records: after, history: [...before.history, ...history] };
      },
    };
  }

  private async lock(clubId: string): Promise<() => void> {
    for (let holder = this.locks.get(clubId); holder; holder = this.locks.get(clubId)) {
      this.waits += 1;
      await holder;
    }
    let release = () => {};
    const held = new Promise<void>((resolve) => {
      release = resolve;
    });
    const { locks } = this;
    locks.set(clubId, held);
    return () => {
      locks.delete(clubId);
      release();
    };
  }
}

type OpenWrite = {
  readonly clubId: string;
  draft: HubClubState | undefined;
  release: (() => void) | undefined;
};

function feedOf(club: HubClubState, cursor: number) {
  const records = [...club.records.values()].map(feedRecordOf);
  const rows = club.history.filter(({ seq }) => seq !== null).map(feedRecordOfHistory);
  return [...records, ...rows].filter(({ seq }) => seq > cursor).sort((a, b) => a.seq - b.seq);
}

function replacedKey({ type, id, field, stamp }: ReplacedKey): string {
  return `${type}/${id}/${field}/${stamp}`;
}

function historyKey({ recordType, recordId, field, replaced }: HistoryRow): string {
  return `${recordType}/${recordId}/${field}/${replaced.stamp}`;
}
