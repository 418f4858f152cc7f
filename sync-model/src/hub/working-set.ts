import type { RecordState } from '../merge/record-state.js';
import type { ReplacedValue } from '../merge/replaced-values.js';
import type { HubKey, HubRecord, ReplacedKey } from './ports.js';

/** A history row before it has an id and a place in the feed. */
export type PendingRow = ReplacedValue & { readonly key: HubKey };

type Entry = {
  record: HubRecord | undefined;
  readonly storedSeq: number | null;
  isChanged: boolean;
  /** The caller now holds exactly the merged form, if it held the stored one. */
  isAsSent: boolean;
};

/** What one write transaction has read, and what it is going to write. Nothing leaves it before the end. */
export class WorkingSet {
  private readonly entries = new Map<string, Entry>();
  private readonly replaced = new Set<string>();
  readonly rows: PendingRow[] = [];

  /** Takes in what was read; a key that is already there keeps its merged form. */
  addRead(keys: readonly HubKey[], records: readonly (HubRecord | undefined)[]): void {
    keys.forEach((key, index) => {
      if (this.entries.has(keyText(key))) return;
      const record = records[index];
      this.entries.set(keyText(key), {
        record,
        storedSeq: record?.seq ?? null,
        isChanged: false,
        isAsSent: true,
      });
    });
  }

  has(key: HubKey): boolean {
    return this.entries.has(keyText(key));
  }

  record(key: HubKey): HubRecord | undefined {
    return this.entries.get(keyText(key))?.record;
  }

  /** The record as the store held it before this transaction; null where it is new. */
  storedSeq(key: HubKey): number | null {
    return this.entry(key).storedSeq;
  }

  put(record: HubRecord, isAsSent: boolean): void {
    const entry = this.entry(record);
    entry.record = record;
    entry.isChanged = true;
    entry.isAsSent &&= isAsSent;
  }

  /** A change that lost a field: the caller does not hold what the server holds. */
  markDifferent(key: HubKey): void {
    this.entry(key).isAsSent = false;
  }

  isAsSent(key: HubKey): boolean {
    return this.entry(key).isAsSent;
  }

  merged(key: HubKey, state: RecordState, isAsSent: boolean): void {
    const { type, id, ownerId, seq } = this.entry(key).record!;
    this.put({ type, id, ownerId, seq, ...state }, isAsSent);
  }

  addRows(key: HubKey, values: readonly ReplacedValue[]): void {
    for (const value of values) {
      this.rows.push({ ...value, key });
      this.addReplaced([{ ...key, field: value.field, stamp: value.replaced.stamp }]);
    }
  }

  addReplaced(values: readonly ReplacedKey[]): void {
    for (const value of values) this.replaced.add(replacedText(value));
  }

  wasReplaced(value: ReplacedKey): boolean {
    return this.replaced.has(replacedText(value));
  }

  /** In the order in which they were first read or made: parents before children. */
  changed(): HubRecord[] {
    return [...this.entries.values()].flatMap(({ record, isChanged }) =>
      record && isChanged ? [record] : [],
    );
  }

  all(): HubRecord[] {
    return [...this.entries.values()].flatMap(({ record }) => (record ? [record] : []));
  }

  private entry(key: HubKey): Entry {
    const entry = this.entries.get(keyText(key));
    if (!entry) throw new Error(`the record ${keyText(key)} was not read before it was used`);
    return entry;
  }
}

export function keyText({ type, id }: HubKey): string {
  return `${type}/${id}`;
}

function replacedText({ type, id, field, stamp }: ReplacedKey): string {
  return `${type}/${id}/${field}/${stamp}`;
}
