import { fromRegisters, stampOf, type FieldValue } from '../merge/record-state.js';
import { nextStamp, STAMP_AHEAD_MS_MAX, stampWallMs, type Stamp } from '../stamp/stamp.js';
import { withDebt, withState, type StoredRecord } from './stored-record.js';

/**
 * Gives new stamps to exactly those unsent values whose stamps the server would refuse as ahead; nobody else
 * has seen them. Their order stays, and each stays later than what it replaced. Answers the changed records.
 */
export function restampedAhead(
  records: readonly StoredRecord[],
  deviceId: string,
  serverTimeMs: number,
): StoredRecord[] {
  const isAhead = (stamp: Stamp) => stampWallMs(stamp) > serverTimeMs + STAMP_AHEAD_MS_MAX;
  const replacedBy = new Map<Stamp, Stamp[]>();
  for (const record of records) {
    for (const { stamp, after } of unsentStamps(record)) {
      if (isAhead(stamp)) replacedBy.set(stamp, [...(replacedBy.get(stamp) ?? []), ...after]);
    }
  }
  const renamed = new Map<Stamp, Stamp>();
  let last: Stamp | undefined;
  for (const stamp of [...replacedBy.keys()].sort()) {
    last = nextStamp(deviceId, serverTimeMs, [
      last,
      ...replacedBy.get(stamp)!.filter((one) => !isAhead(one)),
    ]);
    renamed.set(stamp, last);
  }
  return records.flatMap((record) => restamped(record, renamed) ?? []);
}

/** The stamps of what a record owes, each with the stamps that it must stay later than. */
function unsentStamps(record: StoredRecord): { stamp: Stamp; after: Stamp[] }[] {
  const owed = Object.entries(record.debt?.fields ?? {}).map(([field, { base, over }]) => ({
    stamp: stampOf(record, field),
    after: [base, over].filter((stamp): stamp is Stamp => typeof stamp === 'string'),
  }));
  const lost = (record.debt?.lost ?? []).map(({ stamp }) => ({ stamp, after: [] }));
  return [...owed, ...lost];
}

function restamped(record: StoredRecord, renamed: ReadonlyMap<Stamp, Stamp>): StoredRecord | null {
  if (!record.debt || !unsentStamps(record).some(({ stamp }) => renamed.has(stamp))) return null;
  const registers: Record<string, { value: FieldValue; stamp: Stamp }> = {};
  for (const [field, value] of Object.entries(record.fields)) {
    const stamp = stampOf(record, field);
    const isOwed = field in record.debt.fields;
    registers[field] = { value, stamp: isOwed ? (renamed.get(stamp) ?? stamp) : stamp };
  }
  const lost = record.debt.lost?.map((one) => ({ ...one, stamp: renamed.get(one.stamp) ?? one.stamp }));
  const debt = lost ? { ...record.debt, lost } : record.debt;
  return withDebt(withState(record, fromRegisters(registers)), debt);
}
