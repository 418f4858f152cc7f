import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatStamp } from '../stamp/stamp.js';
import { canonicalJson, sameValue } from './canonical-json.js';
import { historyValue, isLeftOut } from './history-value.js';
import { mergeRecord } from './merge-record.js';
import { fromRegisters, stampOf, type RecordState } from './record-state.js';
import { replacedValues } from './replaced-values.js';

/** Few fields, few stamps and few values, so that every kind of meeting happens, ties by fault included. */
const stamps = fc
  .tuple(fc.integer({ min: 1, max: 4 }), fc.constantFrom('devicea1', 'deviceb1'))
  .map(([wallMs, deviceId]) => formatStamp({ wallMs, counter: 0, deviceId }));
const values = fc.constantFrom<unknown>(null, 1, 'a', true, [1, 2], { s: 4, i: 3 }, { i: 3, s: 4 });
const registers = fc.dictionary(
  fc.constantFrom('remarks', 'sinpo', 'deleted', 'heardBy'),
  fc.record({ value: values, stamp: stamps }),
  { minKeys: 1 },
);
const states: fc.Arbitrary<RecordState> = registers.map((one) => fromRegisters(one));

const text = (state: RecordState) => canonicalJson(state);

describe('merging a record', () => {
  it('should not depend on which side is asked', () => {
    fc.assert(
      fc.property(states, states, (a, b) => {
        expect(text(mergeRecord(a, b))).toBe(text(mergeRecord(b, a)));
      }),
    );
  });

  it('should not depend on the order of arrival', () => {
    fc.assert(
      fc.property(states, states, states, (a, b, c) => {
        expect(text(mergeRecord(mergeRecord(a, b), c))).toBe(text(mergeRecord(a, mergeRecord(b, c))));
      }),
    );
  });

  it('should change nothing when it comes again', () => {
    fc.assert(
      fc.property(states, states, (a, b) => {
        const merged = mergeRecord(a, b);
        expect(text(mergeRecord(merged, b))).toBe(text(merged));
        expect(text(mergeRecord(a, a))).toBe(text(a));
      }),
    );
  });

  it('should give each field the value of its latest stamp', () => {
    fc.assert(
      fc.property(fc.array(states, { minLength: 1, maxLength: 5 }), (all) => {
        const merged = all.reduce(mergeRecord);
        for (const field of Object.keys(merged.fields)) {
          const having = all.filter(({ fields }) => field in fields);
          const latest = having
            .map((state) => stampOf(state, field))
            .sort()
            .at(-1)!;
          expect(stampOf(merged, field)).toBe(latest);
          const candidates = having.filter((state) => stampOf(state, field) === latest);
          expect(candidates.some(({ fields }) => sameValue(fields[field], merged.fields[field]))).toBe(true);
        }
      }),
    );
  });

  it('should keep a record deleted when another field is edited later, and restore it by that field alone', () => {
    const [first, second, third] = [1, 2, 3].map((wallMs) =>
      formatStamp({ wallMs, counter: 0, deviceId: 'devicea1' }),
    ) as [string, string, string];
    const deleted = { at: first, fields: { deleted: true, remarks: 'a' } };
    const edited = mergeRecord(deleted, { at: second, fields: { remarks: 'b' } });
    expect(edited.fields).toEqual({ deleted: true, remarks: 'b' });
    expect(mergeRecord(edited, { at: third, fields: { deleted: false } }).fields.deleted).toBe(false);
  });
});

describe('the history of a merge', () => {
  it('should hold every value that does not stand any more', () => {
    fc.assert(
      fc.property(states, states, (stored, change) => {
        const merged = mergeRecord(stored, change);
        const rows = replacedValues(stored, change, undefined);
        for (const state of [stored, change]) {
          for (const field of Object.keys(state.fields)) {
            if (!(field in stored.fields) || sameValue(state.fields[field], merged.fields[field])) continue;
            const row = rows.find(
              (one) => one.field === field && sameValue(one.replaced.value, state.fields[field]),
            );
            expect(row?.replaced.stamp).toBe(stampOf(state, field));
            expect(row?.kept.value).toEqual(merged.fields[field]);
          }
        }
      }),
    );
  });

  it('should be empty for a repeat', () => {
    fc.assert(
      fc.property(states, (state) => {
        expect(replacedValues(state, state, undefined)).toEqual([]);
      }),
    );
  });

  const stored = { at: '0000000000010000devicea1', fields: { remarks: 'a', place: 'JO45' } };

  it('should call it a clash only where the writer had not seen the value', () => {
    const change = { at: '0000000000020000deviceb1', fields: { remarks: 'b' } };
    const seen = { remarks: stored.at };
    expect(replacedValues(stored, change, seen)[0]?.clash).toBe(false);
    expect(replacedValues(stored, change, { remarks: '0000000000000000devicea1' })[0]?.clash).toBe(true);
  });

  it('should call no value of the same device a clash, though its arrival was never told', () => {
    const change = { at: '0000000000020000devicea1', fields: { remarks: 'b' } };
    expect(replacedValues(stored, change, undefined)[0]?.clash).toBe(false);
  });

  it('should never hold a place', () => {
    const change = { at: '0000000000020000deviceb1', fields: { place: 'JO' } };
    expect(replacedValues(stored, change, undefined)).toEqual([]);
  });

  it('should keep the size alone of a value over 4 KiB', () => {
    const long = 'ø'.repeat(2100);
    expect(historyValue(long)).toEqual({ leftOutBytes: 4202 });
    expect(isLeftOut(historyValue(long))).toBe(true);
    expect(historyValue('short')).toBe('short');
  });
});
