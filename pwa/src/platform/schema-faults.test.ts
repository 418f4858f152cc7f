import { antennaSchema } from '@harkmoor/sync-model/records/antenna';
import { receiverSchema } from '@harkmoor/sync-model/records/receiver';
import { describe, expect, it } from 'vitest';
import { schemaFaults } from './schema-faults';

const ANTENNA = {
  deleted: false,
  importId: null,
  name: 'Long wire',
  kind: 'wire',
  lengthM: 22,
  heightM: 4,
  azimuthDeg: null,
  gainDb: null,
  sharedUse: false,
  replaces: null,
  notes: null,
  retiredAt: null,
};

describe('the faults of a form', () => {
  it('should find none in what the schema takes', () => {
    expect(schemaFaults(antennaSchema, ANTENNA)).toEqual([]);
  });

  it.each([
    ['name', { name: ' ' }, 'Must not be empty'],
    ['name', { name: 'x'.repeat(61) }, 'Use at most 60 characters'],
    ['lengthM', { lengthM: 5001 }, 'At most 5\u202f000'],
    ['gainDb', { gainDb: -41 }, 'At least \u221240'],
    ['heightM', { heightM: Number.NaN }, 'Write a number'],
    ['kind', { kind: 'curtain' }, 'Choose one of the list'],
  ])('should say of %s what to do', (field, wrong, message) => {
    expect(schemaFaults(antennaSchema, { ...ANTENNA, ...wrong })).toEqual([{ field, message }]);
  });

  it('should name a field inside a composite one by its path', () => {
    const faults = schemaFaults(receiverSchema.pick({ meterScale: true }), {
      meterScale: { kind: 's', s9Dbm: -200, dbPerS: 6, calibrated: false },
    });
    expect(faults).toEqual([{ field: 'meterScale.s9Dbm', message: 'At least \u2212110' }]);
  });
});
