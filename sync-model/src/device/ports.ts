import type { ClubCard, SyncAnswer, SyncRequest } from '../protocol/messages.js';
import type { Role } from '../records/member.js';
import type { RecordType } from '../records/record-types.js';
import type { StoredRecord } from './stored-record.js';

export type RecordKey = { readonly clubId: string; readonly type: RecordType; readonly id: string };

/** How far this phone is with one club. */
export type ClubState = {
  readonly clubId: string;
  readonly role: Role;
  readonly card: ClubCard;
  readonly historyId: string | null;
  readonly cursor: number;
  /** Server time of the last round in which every pending change was answered and no page was left. */
  readonly completeAt: number | null;
};

/**
 * The phone's durable store. A transaction is atomic and strictly durable: when it resolves, its writes
 * survive a crash of the browser. Inside `work` only the transaction's own promises may be awaited.
 */
export type Store = {
  transaction<T>(work: (tx: StoreTransaction) => Promise<T>): Promise<T>;
};

export type StoreTransaction = {
  clubs(): Promise<ClubState[]>;
  putClub(club: ClubState): Promise<void>;
  /** Removes the club and every record of it. */
  removeClub(clubId: string): Promise<void>;
  /** In the order of the keys; undefined where nothing is stored. */
  records(keys: readonly RecordKey[]): Promise<(StoredRecord | undefined)[]>;
  putRecords(records: readonly StoredRecord[]): Promise<void>;
  /** Records with a debt, oldest debt first. */
  owed(clubId: string): Promise<StoredRecord[]>;
  setting<T>(name: string): Promise<T | undefined>;
  putSetting(name: string, value: unknown): Promise<void>;
};

export type LinkAnswer =
  | { kind: 'answer'; body: SyncAnswer }
  /** No complete answer of ours: no network, a captive portal, a truncated body, a time-out. */
  | { kind: 'unreachable' }
  | { kind: 'unauthorized' }
  | { kind: 'throttled'; retryAfterMs: number }
  | { kind: 'server-error' };

export type Link = { exchange(request: SyncRequest): Promise<LinkAnswer> };

export type Clock = {
  /** Uncorrected wall time of the device, ms UTC. */
  deviceNowMs(): number;
};

/** One syncing tab: `busy` when another holds the lock. */
export type Lock = { exclusively<T>(work: () => Promise<T>): Promise<T | 'busy'> };

export type DevicePorts = { store: Store; link: Link; clock: Clock; lock: Lock };
