import {
  CHANGE_BYTES_MAX,
  CLUBS_PER_ROUND_MAX,
  ROUND_BYTES_FILLED_MAX,
  type RoundLimits,
} from '../protocol/limits.js';
import type { SyncClubRequest, SyncRequest } from '../protocol/messages.js';
import { jsonBytes } from '../protocol/utf8-bytes.js';
import { PROTOCOL_VERSION } from '../protocol/version.js';
import { isWritableType, parentsOf, sendingOrder, type WritableType } from '../records/record-types.js';
import { owedChange, type OwedChange } from './owed-change.js';
import type { ClubState, StoreTransaction } from './ports.js';
import { withDebt, type StoredRecord } from './stored-record.js';

export type SentClub = {
  readonly clubId: string;
  /** In the order of the changes in the request. */
  readonly changes: readonly OwedChange[];
  /** Some change that may be sent did not fit into this round. */
  readonly hasLeftover: boolean;
  /** Some change waits for its parent and was not sent. */
  readonly hasWaiting: boolean;
};

export type PreparedRound = { readonly request: SyncRequest; readonly sent: ReadonlyMap<string, SentClub> };

type Budget = { changes: number; bytes: number };

/**
 * Builds one round from what the store holds now: parents first, within the limits of a round over all clubs.
 * A change that no server would take for its size is marked as refused here and does not travel.
 */
export async function prepareRound(
  tx: StoreTransaction,
  identity: { readonly deviceId: string },
  deviceNowMs: number,
  limits: RoundLimits,
): Promise<PreparedRound> {
  const budget: Budget = { changes: limits.changesPerRound, bytes: ROUND_BYTES_FILLED_MAX };
  const sent = new Map<string, SentClub>();
  const clubs: SyncClubRequest[] = [];
  for (const club of (await tx.clubs()).sort(longestWaitingFirst).slice(0, CLUBS_PER_ROUND_MAX)) {
    const chosen = await chooseChanges(tx, club.clubId, budget);
    sent.set(club.clubId, chosen);
    clubs.push(clubRequest(club, chosen));
  }
  const { deviceId } = identity;
  return { request: { protocol: PROTOCOL_VERSION, deviceId, sentAt: deviceNowMs, clubs }, sent };
}

/** Matters only past fifty clubs: each then has its turn. */
function longestWaitingFirst(a: ClubState, b: ClubState): number {
  return (a.completeAt ?? 0) - (b.completeAt ?? 0) || (a.clubId < b.clubId ? -1 : 1);
}

function clubRequest({ clubId, historyId, cursor }: ClubState, chosen: SentClub): SyncClubRequest {
  const changes = chosen.changes.map(({ change }) => change);
  return { clubId, historyId, cursor, ...(changes.length > 0 ? { changes } : {}) };
}

async function chooseChanges(tx: StoreTransaction, clubId: string, budget: Budget): Promise<SentClub> {
  const owed = (await tx.owed(clubId)).filter(({ debt }) => debt?.status !== 'refused').sort(parentsFirst);
  const known = await knownParents(tx, owed);
  const changes: OwedChange[] = [];
  const tooLarge: StoredRecord[] = [];
  let hasLeftover = false;
  let hasWaiting = false;
  for (const record of owed) {
    if (record.debt?.status === 'held' && !known.has(record.debt.needs ?? '')) {
      hasWaiting = true;
      continue;
    }
    if (budget.changes === 0) {
      hasLeftover = true;
      break;
    }
    const next = owedChange(record);
    const bytes = jsonBytes(next.change);
    if (bytes > CHANGE_BYTES_MAX) tooLarge.push(asTooLarge(record));
    else if (budget.bytes < bytes) {
      budget.changes = 0;
      hasLeftover = true;
    } else {
      budget.changes -= 1;
      budget.bytes -= bytes;
      changes.push(next);
      known.add(record.id);
    }
  }
  if (tooLarge.length > 0) await tx.putRecords(tooLarge);
  return { clubId, changes, hasLeftover, hasWaiting };
}

/** Sending order of the types, oldest debt first within one: a parent always stands before its children. */
function parentsFirst(a: StoredRecord, b: StoredRecord): number {
  return orderOf(a) - orderOf(b) || (a.debt?.since ?? 0) - (b.debt?.since ?? 0);
}

function orderOf({ type }: StoredRecord): number {
  return sendingOrder(type as WritableType);
}

/** Ids among those that held records wait for which the server is known to hold. */
async function knownParents(tx: StoreTransaction, owed: readonly StoredRecord[]): Promise<Set<string>> {
  const keys = owed.flatMap(({ clubId, type, fields, debt }) =>
    debt?.status === 'held' && isWritableType(type)
      ? parentsOf(type, fields)
          .filter(({ id }) => id === debt.needs)
          .map((parent) => ({ clubId, ...parent }))
      : [],
  );
  const parents = keys.length > 0 ? await tx.records(keys) : [];
  return new Set(parents.flatMap((parent) => (parent && parent.seq > 0 ? [parent.id] : [])));
}

function asTooLarge(record: StoredRecord): StoredRecord {
  if (!record.debt) throw new Error('only a record with a debt is sent');
  return withDebt(record, {
    ...record.debt,
    status: 'refused',
    code: 'too-large',
    message: 'This record is too large to be sent. Shorten its texts.',
  });
}
