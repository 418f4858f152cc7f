// @vitest-environment jsdom
import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { formatStamp } from '@harkmoor/sync-model/stamp/stamp';
import { receptionSchema, type Reception } from '@harkmoor/sync-model/records/reception';
import { FIELD_NAMES } from '@harkmoor/sync-model/records/field-names';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { aReception } from '../../../store/test-log';
import { allChanges, changedAtMs, heldChanges, putBackPatch, type Change } from './changes';
import { fieldWords, valueWords } from './change-words';

const stamp = (minute: number, deviceId = 'aaaaaaaa') =>
  formatStamp({ wallMs: Date.UTC(2026, 10, 12, 18, minute), counter: 0, deviceId });
const nobody = () => null;

function stored(fields: Partial<Reception> = {}, over: Partial<StoredRecord<'reception'>> = {}) {
  return {
    clubId: 'club',
    type: 'reception',
    id: 'r1',
    ownerId: 'me',
    seq: 4,
    at: stamp(0),
    fields: aReception(fields),
    ...over,
  } as StoredRecord<'reception'>;
}

function aChange(over: Partial<Change> = {}): Change {
  return {
    id: 'h1',
    field: 'remarks',
    replaced: { value: 'faint', stamp: stamp(1) },
    kept: { value: 'clear', stamp: stamp(2) },
    byId: 'me',
    clash: true,
    ...over,
  };
}

describe('the changes of a reception', () => {
  it('should also tell an own value that was overtaken before it was sent', () => {
    const lost = [{ field: 'remarks', value: 'mine', stamp: stamp(3), base: null }];
    const record = stored(
      { remarks: 'clear' },
      { debt: { since: 0, fields: {}, lost, status: 'waiting' }, stamps: { remarks: stamp(5) } },
    );
    const [change] = heldChanges(record, []);
    expect(change).toMatchObject({ field: 'remarks', replaced: { value: 'mine' }, kept: { value: 'clear' } });
    expect(changedAtMs(change!)).toBe(Date.UTC(2026, 10, 12, 18, 5));
  });

  it('should tell once what the server and this device both know, newest first', () => {
    const later = aChange({
      id: 'h2',
      replaced: { value: 'a', stamp: stamp(7) },
      kept: { value: 'b', stamp: stamp(8) },
    });
    const all = allChanges([aChange()], [aChange({ id: 'server' }), later]);
    expect(all.map(({ id }) => id)).toEqual(['h2', 'server']);
  });
});

describe('putting a value back', () => {
  it('should be an edit of that field alone', () => {
    expect(putBackPatch(aChange(), stored({ remarks: 'clear' }))).toEqual({
      kind: 'patch',
      patch: { remarks: 'faint' },
    });
  });

  it.each<[string, Partial<Change>, Partial<Reception>, string]>([
    ['it is the value it has now', {}, { remarks: 'faint' }, 'same'],
    [
      'only its size was kept',
      { replaced: { value: { leftOutBytes: 5000 }, stamp: stamp(1) } },
      {},
      'not-kept',
    ],
    ['the field is not known', { field: 'mood' }, {}, 'no-such-field'],
  ])('should be refused where %s', (_, change, fields, code) => {
    expect(putBackPatch(aChange(change), stored(fields))).toMatchObject({ kind: 'refused', code });
  });
});

describe('a change in words', () => {
  it.each<[string, unknown, string]>([
    ['tuning', { dialHz: 6_070_000, mode: 'AM' }, '6\u2009070\u2009kHz AM'],
    ['sinpo', { s: 4, i: 4, n: 3, p: 3, o: 'X' }, '4433X'],
    ['meter', { s: 9, overDb: 20 }, 'S9+20'],
    ['outcome', 'nil', 'Nil'],
    ['deleted', true, 'in the bin'],
    ['deviceAt', Date.UTC(2026, 10, 12, 18, 43, 7), '12 Nov 2026, 18:43:07 UTC'],
    ['remarks', null, 'empty'],
    ['remarks', { leftOutBytes: 5000 }, 'a text of 5\u202f000 bytes, too long to be kept'],
  ])('should name %s', (field, value, words) => {
    expect(valueWords(field, value, nobody)).toBe(words);
  });

  it('should have a word for every field of a reception', () => {
    for (const field of FIELD_NAMES.reception) expect(fieldWords(field)).not.toBe(field);
    expect(Object.keys(receptionSchema.shape).sort()).toEqual([...FIELD_NAMES.reception].sort());
  });

  it('should never fail at a value that an older version may have left', () => {
    fc.assert(
      fc.property(fc.constantFrom(...FIELD_NAMES.reception), fc.jsonValue(), (field, value) => {
        expect(typeof valueWords(field, value, nobody)).toBe('string');
      }),
    );
  });
});
