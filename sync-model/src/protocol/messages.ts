import type { FieldValue } from '../merge/record-state.js';
import type { Role } from '../records/member.js';
import type { RecordType, WritableType } from '../records/record-types.js';
import type { Stamp } from '../stamp/stamp.js';

/**
 * The messages of the sync round as types alone, so that the phone's first chunk needs no schema library.
 * `message-schemas.ts` says the same in zod for the server's border; a test holds one against the other.
 */

/**
 * Absent fields are unchanged in a change with `base`; a new record has no `base` and absent fields are empty,
 * with the stamp that `stamps` gives them. A value that was lost on the phone is sent with its own, earlier stamp.
 */
export type Change = {
  type: WritableType;
  id: string;
  at: Stamp;
  fields: Record<string, FieldValue>;
  stamps?: Record<string, Stamp>;
  /** The stamp of the value that each changed field replaced, as the writer knew it. */
  base?: Record<string, Stamp>;
};

export type SyncClubRequest = {
  clubId: string;
  historyId: string | null;
  /** The `seq` up to which this phone holds the club's feed. */
  cursor: number;
  changes?: Change[];
};

export type SyncRequest = { protocol: number; deviceId: string; sentAt: number; clubs: SyncClubRequest[] };

export type ChangeResult =
  | { type: WritableType; id: string; status: 'applied'; seq: number }
  | { type: WritableType; id: string; status: 'held'; needs: string }
  | { type: WritableType; id: string; status: 'refused'; code: RefusalCode; message: string };

/** A record of the club's feed; fields that are null are left out, their stamps are not. */
export type FeedRecord = {
  type: RecordType;
  id: string;
  ownerId: string | null;
  seq: number;
  at: Stamp;
  fields: Record<string, FieldValue>;
  stamps?: Record<string, Stamp>;
};

/** What a phone must know of a club beside its records. */
export type ClubCard = { name: string; kind: ClubKind; ituRegion: 1 | 2 | 3; demo: boolean };
export type ClubKind = 'club' | 'my-log';

export type SyncClubAnswer = {
  clubId: string;
  role: Role;
  card: ClubCard;
  historyId: string;
  headSeq: number;
  /** One for each change of the request, in its order. */
  results: ChangeResult[];
  records: FeedRecord[];
  cursor: number;
  more: boolean;
};

export type SyncAnswer = {
  protocol: number;
  serverTime: number;
  code?: 'clock-ahead' | 'protocol-too-old';
  clubs: SyncClubAnswer[];
  /** Clubs that were asked for and are not, or no longer, this account's. */
  goneClubs: string[];
};

/** Why the server does not take a change. The phone keeps the text and shows *needs attention*. */
export type RefusalCode = 'invalid' | 'forbidden' | 'not-found' | 'too-large' | 'whole-record-needed';

export type Refusal = { readonly code: RefusalCode; readonly message: string };
