import type { StoredRecord } from '../src/device/stored-record.js';
import { canonicalJson, sameValue } from '../src/merge/canonical-json.js';
import { stampOf } from '../src/merge/record-state.js';
import { hasHistory } from '../src/merge/replaced-values.js';
import { isWritableType, parentsOf, RETIRABLE_TYPES } from '../src/records/record-types.js';
import type { HubRecord } from '../src/hub/ports.js';
import type { DiskState } from './disk.js';
import { hubKeyText, type HubClubState, type MemoryHub } from './memory-hub.js';
import type { Oracle } from './oracle.js';

/** I4, I5, I9 at the hub, after each of its commits. */
export function checkSave(oracle: Oracle, before: HubClubState, after: HubClubState): void {
  const seqs: number[] = [];
  for (const [key, record] of after.records) {
    const old = before.records.get(key);
    if (old === record) continue;
    seqs.push(record.seq);
    if (old) checkFieldsAdvance(oracle, old, record, after);
    for (const parent of parentsOf(record.type, record.fields)) {
      if (!after.records.has(hubKeyText(parent)))
        oracle.violate('I9', `${key} without its parent ${parent.id}`);
    }
  }
  const rows = after.history.slice(before.history.length);
  seqs.push(...rows.flatMap(({ seq }) => seq ?? []));
  const expected = Array.from({ length: after.seq - before.seq }, (_, index) => before.seq + index + 1);
  if (
    !sameValue(
      seqs.sort((a, b) => a - b),
      expected,
    )
  ) {
    oracle.violate('I7', `seqs ${seqs.join(',')} after ${before.seq} up to ${after.seq}`);
  }
  checkHistory(oracle, after);
}

function checkFieldsAdvance(oracle: Oracle, old: HubRecord, record: HubRecord, club: HubClubState): void {
  for (const field of Object.keys(record.fields)) {
    const [was, is] = [stampOf(old, field), stampOf(record, field)];
    if (is < was) oracle.violate('I5', `${field} of ${record.id} went back from ${was} to ${is}`);
    if (is === was && !sameValue(old.fields[field], record.fields[field])) {
      oracle.violate('I5', `${field} of ${record.id} changed under one stamp`);
    }
    const isKept = club.history.some(
      (row) => row.recordId === record.id && row.field === field && row.replaced.stamp === was,
    );
    if (is !== was && hasHistory(field) && !isKept) {
      oracle.violate('I1', `the replaced ${field} of ${record.id} is not in the history`);
    }
  }
}

/** I4: no value is replaced twice; I5: none that was replaced is later than the one that stands. */
function checkHistory(oracle: Oracle, club: HubClubState): void {
  const seen = new Set<string>();
  for (const { recordType: type, recordId: id, field, replaced, kept } of club.history) {
    const key = `${type}/${id}/${field}/${replaced.stamp}`;
    if (seen.has(key)) oracle.violate('I4', `${key} is twice in the history`);
    seen.add(key);
    const record = club.records.get(hubKeyText({ type, id }))!;
    const latest = replaced.stamp > kept.stamp ? replaced.stamp : kept.stamp;
    if (latest > stampOf(record, field)) oracle.violate('I5', `${key} is later than the value that stands`);
  }
}

/** I7 and I9 on a phone: it holds all that its cursor says, and no child without its parent once it has all. */
export function checkCursors(
  oracle: Oracle,
  deviceId: string,
  before: DiskState,
  disk: DiskState,
  hub: MemoryHub,
): void {
  for (const state of disk.clubs.values()) {
    if (before.clubs.get(state.clubId) === state) continue;
    const { clubId, cursor } = state;
    const club = hub.clubs.get(clubId)!;
    if (cursor < (before.clubs.get(clubId)?.cursor ?? 0))
      oracle.violate('I7', `${deviceId}: cursor went back`);
    if (cursor > club.seq) oracle.violate('I7', `${deviceId}: cursor ${cursor} past the head ${club.seq}`);
    for (const [key, record] of club.records) {
      if (record.seq <= cursor) checkHeld(oracle, deviceId, disk.records.get(`${clubId}/${key}`), record);
    }
    for (const { id, seq } of club.history) {
      if (seq !== null && seq <= cursor && !disk.records.has(`${clubId}/history/${id}`)) {
        oracle.violate('I7', `${deviceId}: history ${id} of seq ${seq} is missing at cursor ${cursor}`);
      }
    }
  }
}

function checkHeld(
  oracle: Oracle,
  deviceId: string,
  held: StoredRecord | undefined,
  record: HubRecord,
): void {
  if (!held) {
    oracle.violate('I7', `${deviceId}: ${record.type}/${record.id} of seq ${record.seq} is missing`);
    return;
  }
  for (const field of Object.keys(record.fields)) {
    if (stampOf(held, field) < stampOf(record, field)) {
      oracle.violate('I7', `${deviceId}: ${field} of ${record.id} is older than its cursor says`);
    }
  }
}

/** I3: when all is quiet, every phone and the hub hold the same, byte for byte. */
export function checkConverged(
  oracle: Oracle,
  phone: { deviceId: string; accountId: string; disk: { state: DiskState } },
  hub: MemoryHub,
): void {
  const { deviceId, accountId } = phone;
  for (const club of hub.clubs.values()) {
    const held = [...phone.disk.state.records.values()].filter(({ clubId }) => clubId === club.clubId);
    if (!club.members.has(accountId)) {
      if (held.length > 0) oracle.violate('I10', `${deviceId} holds records of ${club.clubId}`);
      continue;
    }
    const settled = held.filter(({ debt }) => !debt);
    // What the server has refused stands on the phone as its person wrote it.
    const refused = new Set(held.filter(({ debt }) => debt).map(({ type, id }) => `${type}/${id}`));
    const ours = new Map(settled.map((record) => [`${record.type}/${record.id}`, textOf(record)]));
    const theirs = textsOf(club);
    for (const key of new Set([...ours.keys(), ...theirs.keys()])) {
      if (refused.has(key) || key.startsWith('history/')) continue;
      if (ours.get(key) !== theirs.get(key)) {
        oracle.violate(
          'I3',
          `${deviceId} ${key}: ${ours.get(key) ?? 'nothing'} but hub ${theirs.get(key) ?? 'nothing'}`,
        );
      }
    }
    for (const { type, id, fields } of settled.filter(({ type }) => isWritableType(type))) {
      const parents = isWritableType(type) ? parentsOf(type, fields) : [];
      const missing = parents.find((parent) => !club.records.has(hubKeyText(parent)));
      if (missing) oracle.violate('I9', `${deviceId} ${id} has no parent ${missing.id}`);
    }
  }
}

const textsByState = new WeakMap<HubClubState, ReadonlyMap<string, string>>();

/** Once for all phones. */
function textsOf(club: HubClubState): ReadonlyMap<string, string> {
  const texts =
    textsByState.get(club) ?? new Map([...club.records].map(([key, record]) => [key, textOf(record)]));
  textsByState.set(club, texts);
  return texts;
}

function textOf({ at, fields, stamps, ownerId, seq }: StoredRecord | HubRecord): string {
  return canonicalJson({ at, fields, stamps, ownerId, seq });
}

/** I6: sites and gear that anything refers to are never deleted. */
export function checkNothingReferredDeleted(oracle: Oracle, hub: MemoryHub): void {
  for (const club of hub.clubs.values()) {
    for (const { type, id, fields } of club.records.values()) {
      for (const parent of parentsOf(type, fields)) {
        const record = club.records.get(hubKeyText(parent));
        if (record?.fields.deleted === true && RETIRABLE_TYPES.includes(parent.type)) {
          oracle.violate('I6', `${parent.type} ${parent.id} is deleted, yet ${type} ${id} refers to it`);
        }
      }
    }
  }
}
