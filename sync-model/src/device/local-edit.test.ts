import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { SAMPLES } from '../../simulation/sample-fields.js';
import { stampOf } from '../merge/record-state.js';
import { createStamper } from '../stamp/device-clock.js';
import { editedRecord, newRecord } from './local-edit.js';
import { isOwedWhole, owedChange } from './owed-change.js';
import type { StoredRecord } from './stored-record.js';

const made = { clubId: 'c', type: 'site', id: 'i', ownerId: 'a', deviceNowMs: 7 } as const;
const stamper = () => createStamper({ deviceId: 'devicea1', nowMs: () => 1_000 });

const texts = fc.option(fc.constantFrom('a', 'b', 'c'));
const patches = fc.array(
  fc.record(
    { notes: texts, retiredAt: fc.option(fc.constantFrom(1, 2)), deleted: fc.boolean() },
    { requiredKeys: [] },
  ),
  { maxLength: 8 },
);

/** A record as the server has told it: no debt, one stamp. */
function known(): StoredRecord<'site'> {
  const { debt: _debt, ...record } = newRecord({ ...made, fields: SAMPLES.site('Ravnklit') }, stamper());
  return { ...record, seq: 3 };
}

describe('a record that was just made', () => {
  it('should owe all its fields, and go whole with empty ones left out', () => {
    const record = newRecord({ ...made, fields: SAMPLES.site('Ravnklit') }, stamper());
    expect(Object.keys(record.debt!.fields).sort()).toEqual(Object.keys(record.fields).sort());
    const { change } = owedChange(record as StoredRecord);
    expect(change).not.toHaveProperty('base');
    expect(change.fields).not.toHaveProperty('notes');
    expect(change.fields).toMatchObject({ name: 'Ravnklit', deleted: false });
  });

  it('should keep the stamp of a field that was emptied again', () => {
    const stamp = stamper();
    const record = newRecord({ ...made, fields: { ...SAMPLES.site('x'), notes: 'a' } }, stamp);
    const emptied = editedRecord(record, { notes: null }, 8, stamp) as StoredRecord;
    const { change } = owedChange(emptied);
    expect(change.stamps).toEqual({ notes: stampOf(emptied, 'notes') });
    expect(isOwedWhole(emptied)).toBe(true);
  });
});

describe('an edit', () => {
  it('should stamp exactly the fields whose value changes, each later than what it replaces', () => {
    fc.assert(
      fc.property(patches, (all) => {
        const stamp = stamper();
        let record = known();
        for (const patch of all) {
          const before = record;
          record = editedRecord(record, patch, 8, stamp);
          for (const field of Object.keys(record.fields) as (keyof typeof record.fields)[]) {
            const isChanged = record.fields[field] !== before.fields[field];
            const [was, is] = [stampOf(before, field), stampOf(record, field)];
            if (isChanged) expect(is > was).toBe(true);
            else expect(is).toBe(was);
          }
        }
      }),
    );
  });

  it('should owe what was edited, against the value that the server knows', () => {
    fc.assert(
      fc.property(patches, (all) => {
        const stamp = stamper();
        const start = known();
        const record = all.reduce<StoredRecord<'site'>>(
          (one, patch) => editedRecord(one, patch, 8, stamp),
          start,
        );
        for (const field of Object.keys(record.fields)) {
          const isTouched = stampOf(record, field) !== stampOf(start, field);
          expect(record.debt?.fields[field]).toEqual(isTouched ? { base: start.at } : undefined);
        }
      }),
    );
  });

  it('should leave a record alone where nothing changes', () => {
    const record = known();
    expect(editedRecord(record, { notes: null, name: 'Ravnklit' }, 8, stamper())).toBe(record);
  });

  it('should make a refused record wait again, and keep what was lost', () => {
    const lost = [{ field: 'notes', value: 'x', stamp: '0000000000010000devicea1', base: null }];
    const debt = { since: 1, fields: {}, lost, status: 'refused', code: 'invalid', message: 'No.' } as const;
    const edited = editedRecord({ ...known(), debt }, { name: 'y' }, 8, stamper());
    expect(edited.debt).toEqual({
      since: 1,
      fields: { name: { base: known().at } },
      lost,
      status: 'waiting',
    });
  });
});
