import type { RecordState } from '../merge/record-state.js';
import type { ReplacedValue } from '../merge/replaced-values.js';
import type { ClubCard, FeedRecord } from '../protocol/messages.js';
import type { Role } from '../records/member.js';
import type { WritableType } from '../records/record-types.js';
import type { Stamp } from '../stamp/stamp.js';

export type HubRecord = RecordState & {
  readonly type: WritableType;
  readonly id: string;
  readonly ownerId: string;
  readonly seq: number;
};

export type HubKey = { readonly type: WritableType; readonly id: string };

export type HistoryRow = ReplacedValue & {
  readonly id: string;
  readonly recordType: WritableType;
  readonly recordId: string;
  readonly byId: string;
  /** Set where the row travels in the feed. */
  readonly seq: number | null;
  readonly at: number;
};

/** A value of one field, named by its stamp. */
export type ReplacedKey = HubKey & { readonly field: string; readonly stamp: Stamp };

export type HubClub = { readonly card: ClubCard; readonly historyId: string; readonly seq: number };

export type HubStore = {
  /**
   * Runs `work` in one database transaction. Its order is fixed: membership, club lock, reads, one write of
   * everything, `club.seq`, commit. A failure of any step leaves nothing behind.
   */
  write<T>(clubId: string, work: (tx: HubWrite) => Promise<T>): Promise<T>;
  /** One REPEATABLE READ snapshot. */
  read<T>(work: (snapshot: HubSnapshot) => Promise<T>): Promise<T>;
};

export type HubWrite = {
  /** The caller's role, held until the end of the transaction; null where there is no membership. */
  memberRole(accountId: string): Promise<Role | null>;
  /** Locks the club row: the only lock. */
  lockClub(): Promise<HubClub>;
  records(keys: readonly HubKey[]): Promise<(HubRecord | undefined)[]>;
  /** Those of the keys that anything of this club refers to, deleted records included: they can be restored. */
  referredTo(keys: readonly HubKey[]): Promise<HubKey[]>;
  /**
   * Those of the values that the history already holds as `replaced` (same record, field and stamp), so that
   * a change that comes twice makes no second row. Called only where a change meets a later value.
   */
  replacedBefore(values: readonly ReplacedKey[]): Promise<ReplacedKey[]>;
  /**
   * Writes records and history rows, and leaves the club at `seq`. Called at most once, last, and only where
   * something changed. The `seq` of records and of rows that travel are old + 1 … `seq`, each used once.
   */
  save(records: readonly HubRecord[], history: readonly HistoryRow[], seq: number): Promise<void>;
};

export type HubSnapshot = {
  memberships(accountId: string): Promise<{ clubId: string; role: Role; club: HubClub }[]>;
  /** Feed records with `seq` above the cursor, in order of `seq`. */
  page(clubId: string, cursor: number, limit: number): Promise<FeedRecord[]>;
};

export type HubPorts = {
  store: HubStore;
  nowMs(): number;
  newId(): string;
};
