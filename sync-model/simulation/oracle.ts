import { sameValue } from '../src/merge/canonical-json.js';
import { stampOf } from '../src/merge/record-state.js';
import type { StoredRecord } from '../src/device/stored-record.js';
import type { DiskState } from './disk.js';
import { hubKeyText, type HubClubState, type MemoryHub } from './memory-hub.js';
import { TEXT_FIELDS } from './sample-fields.js';

/** A value that a person has written on a phone. Each text is written once, so it can be followed everywhere. */
type Written = {
  readonly deviceId: string;
  readonly key: string;
  readonly clubId: string;
  readonly record: { readonly type: StoredRecord['type']; readonly id: string };
  readonly field: string;
  readonly value: unknown;
};

export type Violation = { readonly invariant: string; readonly what: string };

/** Knows what every person has written, and says where a value has gone that must be somewhere. */
export class Oracle {
  readonly violations: Violation[] = [];
  private written: Written[] = [];

  violate(invariant: string, what: string): void {
    this.violations.push({ invariant, what });
  }

  /** Takes note of a person's commit. A value of one's own that was not sent yet may be written over. */
  noteActs(deviceId: string, before: DiskState, after: DiskState): void {
    for (const [key, record] of after.records) {
      const old = before.records.get(key);
      if (old === record) continue;
      for (const field of TEXT_FIELDS[record.type] ?? []) {
        const value = record.fields[field];
        if (value === null || sameValue(value, old?.fields[field])) continue;
        if (old?.debt?.fields[field]) this.forget(deviceId, key, field, old.fields[field]);
        const { clubId, type, id } = record;
        this.written.push({ deviceId, key, clubId, record: { type, id }, field, value });
      }
    }
  }

  /** What was written in a club that has left the phone is not followed any more (see leave-club.ts). */
  noteLeft(deviceId: string, clubId: string, hub: MemoryHub): void {
    this.written = this.written.filter(
      (one) => one.deviceId !== deviceId || one.clubId !== clubId || isAtHub(hub.clubs.get(clubId), one),
    );
  }

  /** I1 and I2: each value is still owed on its phone, or the hub holds it, as current or in the history. */
  checkNothingLost(deviceId: string, disk: DiskState, hub: MemoryHub): void {
    for (const one of this.written) {
      if (one.deviceId !== deviceId || isOwed(disk.records.get(one.key), one)) continue;
      if (isAtHub(hub.clubs.get(one.clubId), one)) continue;
      this.violate(
        'I1/I2',
        `${deviceId}: ${String(one.value)} of ${one.key} ${one.field} is neither owed nor held`,
      );
    }
  }

  private forget(deviceId: string, key: string, field: string, value: unknown): void {
    this.written = this.written.filter(
      (one) => one.deviceId !== deviceId || one.key !== key || one.field !== field || one.value !== value,
    );
  }
}

function isOwed(record: StoredRecord | undefined, { field, value }: Written): boolean {
  if (!record?.debt) return false;
  if (record.debt.fields[field] && record.fields[field] === value) return true;
  return record.debt.lost?.some((lost) => lost.field === field && lost.value === value) === true;
}

function isAtHub(club: HubClubState | undefined, { record, field, value }: Written): boolean {
  if (club?.records.get(hubKeyText(record as never))?.fields[field] === value) return true;
  return (
    club?.history.some(
      (row) =>
        row.recordId === record.id &&
        row.field === field &&
        (row.replaced.value === value || row.kept.value === value),
    ) === true
  );
}

/** I8, after a commit of the engine: the engine replaces what a person sees by a later value only, never by an older one. */
export function checkReadsOwnWrites(
  oracle: Oracle,
  deviceId: string,
  before: DiskState,
  after: DiskState,
): void {
  for (const [key, record] of after.records) {
    const old = before.records.get(key);
    if (!old || old === record) continue;
    for (const field of Object.keys(old.fields)) {
      if (sameValue(old.fields[field], record.fields[field])) continue;
      if (stampOf(record, field) > stampOf(old, field)) continue;
      oracle.violate('I8', `${deviceId}: ${field} of ${key} went back`);
    }
  }
}
