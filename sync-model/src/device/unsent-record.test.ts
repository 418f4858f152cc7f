import { describe, expect, it } from 'vitest';
import { stampOf } from '../merge/record-state.js';
import { formatStamp } from '../stamp/stamp.js';
import type { StoredRecord } from './stored-record.js';
import { withUnsent } from './unsent-record.js';

const stamp = (wallMs: number, deviceId = 'phoneaaa') => formatStamp({ wallMs, counter: 0, deviceId });
const BASE = stamp(1000);

function record(over: Partial<StoredRecord>): StoredRecord {
  return {
    clubId: 'club',
    type: 'reception',
    id: 'r',
    ownerId: 'a',
    seq: 5,
    at: BASE,
    fields: { remarks: 'as sent', stationName: null },
    ...over,
  } as StoredRecord;
}
const edited = (value: string, wallMs: number): StoredRecord =>
  record({
    fields: { remarks: value, stationName: null },
    stamps: { remarks: stamp(wallMs, 'phonebbb') },
    debt: { since: wallMs, fields: { remarks: { base: BASE } }, status: 'waiting' },
  });

describe('unsent values of another device', () => {
  it('should take over an edit of a record that this phone holds, and owe it', () => {
    const taken = withUnsent(record({}), edited('written on the hill', 2000));
    expect(taken.fields).toMatchObject({ remarks: 'written on the hill' });
    expect(taken.debt).toMatchObject({ status: 'waiting', fields: { remarks: { base: BASE } } });
    expect(stampOf(taken, 'stationName')).toBe(BASE);
  });

  it('should keep a later value of this phone and still owe the earlier to the history', () => {
    const later = record({
      fields: { remarks: 'later', stationName: null },
      stamps: { remarks: stamp(3000) },
    });
    const taken = withUnsent(later, edited('written on the hill', 2000));
    expect(taken.fields).toMatchObject({ remarks: 'later' });
    expect(taken.debt?.lost).toMatchObject([{ field: 'remarks', value: 'written on the hill', base: BASE }]);
  });

  it('should add nothing the second time', () => {
    for (const known of [record({}), record({ stamps: { remarks: stamp(3000) } })]) {
      const once = withUnsent(known, edited('written on the hill', 2000));
      expect(withUnsent(once, edited('written on the hill', 2000))).toBe(once);
    }
  });
});
