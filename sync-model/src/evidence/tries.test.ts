import { describe, expect, it } from 'vitest';
import { entriesOf } from './entries.js';
import type { EvidenceInput, ReceptionFields } from './evidence-input.js';
import { anInput, aReception, DAY_MS, EVENING, HOUR_MS, MINUTE_MS } from './testing/invented-evidence.js';
import { LEFT_OUT_REASONS, LEFT_OUT_WORDS } from './tries.js';

function classified(fields: Partial<ReceptionFields>, more: Partial<EvidenceInput> = {}) {
  const [entry] = entriesOf(anInput([aReception('r1', fields)], more));
  return [entry?.counts, entry?.reason];
}

describe('a reception', () => {
  it('should be a try when its frequency was chosen before listening', () => {
    expect(classified({ basis: 'round' })).toEqual(['try', null]);
    expect(classified({ basis: 'planned', targetId: null, targetHz: null })).toEqual(['try', null]);
    expect(classified({ outcome: 'nil', durationS: 10 })).toEqual(['try', null]);
    expect(classified({ outcome: 'nil', durationS: null })).toEqual(['try', null]);
  });

  it.each(['chance', 'swap', 'import'] as const)(
    'should give scores and levels alone when it is %s',
    (basis) => {
      expect(classified({ basis })).toEqual(['scores-only', basis]);
      expect(classified({ basis, outcome: 'nil' })).toEqual(['scores-only', basis]);
    },
  );

  it('should count an import whose nils were declared planned', () => {
    expect(classified({ basis: 'planned', outcome: 'nil' })).toEqual(['try', null]);
  });

  it('should count nowhere when it was skipped, deleted or excluded', () => {
    expect(classified({ outcome: 'skipped' })).toEqual(['left-out', 'skipped']);
    expect(classified({ deleted: true })).toEqual(['left-out', 'deleted']);
    expect(classified({}, { excludedIds: new Set(['r1']) })).toEqual(['left-out', 'excluded']);
    expect(classified({ basis: 'chance' }, { excludedIds: new Set(['r1']) })).toEqual([
      'left-out',
      'excluded',
    ]);
  });

  it('should count, marked, while it is in review', () => {
    const [entry] = entriesOf(anInput([aReception('r1')], { inReviewIds: new Set(['r1']) }));
    expect(entry).toMatchObject({ counts: 'try', isInReview: true });
  });

  it('should be left out off the schedule of its target by more than two minutes, heard or nil', () => {
    const end = EVENING + 2 * HOUR_MS;
    for (const outcome of ['heard', 'nil'] as const) {
      expect(classified({ targetId: 'tern', outcome, deviceAt: end + 2 * MINUTE_MS })).toEqual(['try', null]);
      expect(classified({ targetId: 'tern', outcome, deviceAt: end + 2 * MINUTE_MS + 1 })).toEqual([
        'left-out',
        'off-schedule',
      ]);
    }
  });

  it('should be held against the schedule by its corrected time', () => {
    const check = {
      deleted: false,
      importId: null,
      deviceId: 'pebble01',
      deviceAt: EVENING,
      offsetMs: -3 * HOUR_MS,
      uncertaintyMs: 100,
      method: 'tone' as const,
      pathKm: null,
    };
    expect(classified({ targetId: 'tern' }, { clockChecks: [check] })).toEqual(['left-out', 'off-schedule']);
    expect(
      classified({ targetId: 'tern', deviceAt: EVENING + 3 * HOUR_MS }, { clockChecks: [check] }),
    ).toEqual(['try', null]);
  });

  it('should be left out during a silence of its target', () => {
    expect(classified({ targetId: 'tern', deviceAt: EVENING + 8 * DAY_MS })).toEqual(['left-out', 'silence']);
  });

  it('should be left out as a nil after less than ten seconds', () => {
    expect(classified({ outcome: 'nil', durationS: 9.9 })).toEqual(['left-out', 'short-nil']);
    expect(classified({ outcome: 'heard', durationS: 3 })).toEqual(['try', null]);
  });

  it('should count for its frequency alone when the station was not surely identified', () => {
    expect(classified({ identity: 'tentative' })).toEqual(['try', 'unsure-identity']);
    expect(classified({ identity: 'unknown' })).toEqual(['try', 'unsure-identity']);
    expect(classified({ identity: 'unknown', targetId: null })).toEqual(['try', null]);
  });

  it('should wait for a setup or target that has not arrived', () => {
    expect(classified({ setupId: 'elsewhere' })).toEqual(['left-out', 'setup-missing']);
    expect(classified({ targetId: 'elsewhere' })).toEqual(['left-out', 'target-missing']);
  });

  it('should be no entry at all once its values were blanked after the bin', () => {
    const blank = aReception('r1', { deleted: true });
    const emptied = Object.fromEntries(Object.keys(blank.fields).map((name) => [name, null]));
    const fields = { ...emptied, deleted: true } as unknown as ReceptionFields;
    expect(entriesOf(anInput([{ ...blank, fields }]))).toEqual([]);
  });
});

describe('LEFT_OUT_WORDS', () => {
  it('should have a sentence for every reason', () => {
    for (const reason of LEFT_OUT_REASONS) expect(LEFT_OUT_WORDS[reason]).toMatch(/^[A-Z].*\.$/);
  });
});
