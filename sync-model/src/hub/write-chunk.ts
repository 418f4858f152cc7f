import type { Writer } from '../access/write-refusal.js';
import { historyValue } from '../merge/history-value.js';
import type { Role } from '../records/member.js';
import { applyChange, type ChangeOutcome } from './apply-change.js';
import type { CheckedChange } from './check-change.js';
import type { HistoryRow, HubPorts, HubRecord, HubWrite } from './ports.js';
import { readWorkingSet } from './read-working-set.js';
import { retireReferred } from './retire-referred.js';
import { keyText, type PendingRow, type WorkingSet } from './working-set.js';

export type WrittenChange = {
  readonly outcome: ChangeOutcome;
  /** The record's place in the feed where the change is `applied`. */
  readonly seq: number | null;
};

export type WrittenChunk = {
  /** One for each change, in their order. */
  readonly changes: readonly WrittenChange[];
  /** Records written here, with what the no-echo rule must know of each. */
  readonly written: readonly WrittenRecord[];
};

export type WrittenRecord = {
  readonly keyText: string;
  readonly seq: number;
  /** Null where the record is new. */
  readonly storedSeq: number | null;
  readonly isAsSent: boolean;
};

/**
 * One write transaction in its one order: membership, club lock, reads, merge in memory, one save with the
 * club's new `seq`. Null where the caller is no member: nothing was read, nothing is said.
 */
export async function writeChunk(
  ports: HubPorts,
  clubId: string,
  accountId: string,
  changes: readonly CheckedChange[],
): Promise<WrittenChunk | null> {
  return ports.store.write(clubId, async (tx) => {
    const role = await tx.memberRole(accountId);
    if (role === null) return null;
    return writeLocked(ports, tx, { accountId, role }, changes);
  });
}

async function writeLocked(
  ports: HubPorts,
  tx: HubWrite,
  caller: { accountId: string; role: Role },
  changes: readonly CheckedChange[],
): Promise<WrittenChunk> {
  const club = await tx.lockClub();
  const writer: Writer = { ...caller, clubKind: club.card.kind };
  const set = await readWorkingSet(tx, changes);
  const outcomes = changes.map((change) => applyChange(set, writer, change));
  const nowMs = ports.nowMs();
  await retireReferred(tx, set, nowMs);
  const records = numbered(set.changed(), club.seq);
  const history = historyRows(ports, set.rows, writer.accountId, nowMs, club.seq + records.length);
  const seq = history.reduce((last, row) => row.seq ?? last, club.seq + records.length);
  if (records.length > 0 || history.length > 0) await tx.save(records, history, seq);
  return summary(set, changes, outcomes, records);
}

function numbered(records: readonly HubRecord[], seqBefore: number): HubRecord[] {
  return records.map((record, index) => ({ ...record, seq: seqBefore + index + 1 }));
}

function historyRows(
  ports: HubPorts,
  rows: readonly PendingRow[],
  byId: string,
  at: number,
  seqBefore: number,
): HistoryRow[] {
  let last = seqBefore;
  return rows.map(({ key, field, replaced, kept, clash }) => ({
    id: ports.newId(),
    recordType: key.type,
    recordId: key.id,
    field,
    replaced: { value: historyValue(replaced.value), stamp: replaced.stamp },
    kept: { value: historyValue(kept.value), stamp: kept.stamp },
    clash,
    byId,
    seq: clash ? (last += 1) : null,
    at,
  }));
}

function summary(
  set: WorkingSet,
  changes: readonly CheckedChange[],
  outcomes: readonly ChangeOutcome[],
  records: readonly HubRecord[],
): WrittenChunk {
  const seqs = new Map(records.map((record) => [keyText(record), record.seq]));
  return {
    changes: outcomes.map((outcome, index) => {
      const { key } = changes[index]!;
      const seq = seqs.get(keyText(key)) ?? set.record(key)?.seq ?? null;
      return { outcome, seq: outcome.status === 'applied' ? seq : null };
    }),
    written: records.map((record) => ({
      keyText: keyText(record),
      seq: record.seq,
      storedSeq: set.storedSeq(record),
      isAsSent: set.isAsSent(record),
    })),
  };
}
