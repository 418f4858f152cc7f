import { describe, expect, it } from 'vitest';
import { receptionFromTap, withoutScores, type Tap } from './reception-from-tap.js';
import { receptionSchema } from './reception.js';

const id = (n: number) => `01920000-0000-7000-8000-${String(n).padStart(12, '0')}`;
const AT = Date.UTC(2026, 10, 12, 18, 43, 20);
const target = { name: 'Radio Lindholt', frequencyHz: 6_070_000, mode: 'AM' } as const;
const tap: Tap = {
  outcome: 'heard',
  subject: { kind: 'row', targetId: id(1), target, roundNo: 3 },
  outingId: id(2),
  outing: { siteId: id(3), currentSetupId: id(4), eventId: null },
  deviceAtMs: AT,
};

describe('a reception made by one tap', () => {
  it('should take the moment of the tap, the setup in use and the frequency of the target as it is now', () => {
    const made = receptionFromTap(tap);
    expect(made).toMatchObject({
      outcome: 'heard',
      basis: 'round',
      roundNo: 3,
      deviceAt: AT,
      setupId: id(4),
      siteId: id(3),
      targetId: id(1),
      targetHz: 6_070_000,
      tuning: { dialHz: 6_070_000, mode: 'AM' },
      identity: 'sure',
      sinpo: null,
      carried: null,
    });
    expect(receptionSchema.safeParse(made).success).toBe(true);
  });

  it('should keep the reason of a nil, and drop one that is given with anything else', () => {
    expect(receptionFromTap({ ...tap, outcome: 'nil', nilReason: 'noise' }).nilReason).toBe('noise');
    expect(receptionFromTap({ ...tap, outcome: 'nil' }).nilReason).toBeNull();
    expect(receptionFromTap({ ...tap, outcome: 'heard', nilReason: 'noise' }).nilReason).toBeNull();
  });

  it('should make a planned try of an entered frequency, of no target and no round', () => {
    const subject = { kind: 'frequency', dialHz: 5_000_000, mode: 'AM', basis: 'planned' } as const;
    const made = receptionFromTap({ ...tap, outcome: 'nil', subject });
    expect(made).toMatchObject({
      basis: 'planned',
      roundNo: null,
      targetId: null,
      targetHz: null,
      identity: 'unknown',
    });
    expect(receptionSchema.safeParse(made).success).toBe(true);
  });

  it('should bind an entered frequency to the target that stands on it', () => {
    const subject = {
      kind: 'frequency',
      dialHz: 6_070_000,
      mode: 'AM',
      basis: 'planned',
      target: { id: id(1), fields: target },
    } as const;
    expect(receptionFromTap({ ...tap, subject })).toMatchObject({
      targetId: id(1),
      targetHz: 6_070_000,
      roundNo: null,
      basis: 'planned',
    });
  });

  it('should never make a nil of a chance find', () => {
    const subject = { kind: 'frequency', dialHz: 6_100_000, mode: 'AM', basis: 'chance' } as const;
    expect(receptionFromTap({ ...tap, subject }).basis).toBe('chance');
    expect(() => receptionFromTap({ ...tap, outcome: 'nil', subject })).toThrow('met by chance');
  });

  it('should leave no score of the signal on an entry that turns into a nil', () => {
    expect(withoutScores()).toEqual({ sinpo: null, rst: null, meter: null, carried: null });
  });
});
