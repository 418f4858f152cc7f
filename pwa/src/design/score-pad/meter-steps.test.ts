import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { keysOf, nudged, sameReading } from './meter-steps';

describe('the meter keys', () => {
  it('should be two rows of six on either kind of meter', () => {
    expect(
      keysOf('s')
        .map(({ label }) => label)
        .join(' '),
    ).toBe('S1 S2 S3 S4 S5 S6 S7 S8 S9 +10 +20 +40');
    expect(keysOf('dbm')).toHaveLength(12);
  });

  it('should reach S0 below and 5 dB steps above', () => {
    expect(nudged({ s: 1, overDb: 0 }, 's', -1)).toEqual({ s: 0, overDb: 0 });
    expect(nudged({ s: 9, overDb: 0 }, 's', 1)).toEqual({ s: 9, overDb: 5 });
    expect(nudged({ s: 9, overDb: 5 }, 's', -1)).toEqual({ s: 9, overDb: 0 });
    expect(nudged({ s: 9, overDb: 0 }, 's', -1)).toEqual({ s: 8, overDb: 0 });
    expect(nudged({ dbm: -80 }, 'dbm', 1)).toEqual({ dbm: -79 });
    expect(nudged(null, 's', 1)).toBeNull();
  });

  it('should never leave what a reading may hold', () => {
    const step = fc.constantFrom(-1 as const, 1 as const);
    fc.assert(
      fc.property(
        fc.constantFrom('s' as const, 'dbm' as const),
        fc.nat(11),
        fc.array(step),
        (kind, key, steps) => {
          const reading = steps.reduce(
            (now, one) => nudged(now, kind, one) ?? now,
            keysOf(kind)[key]!.reading,
          );
          if ('dbm' in reading) expect(Math.abs(reading.dbm + 65)).toBeLessThanOrEqual(85);
          else {
            expect(reading.s >= 0 && reading.s <= 9 && reading.overDb >= 0 && reading.overDb <= 80).toBe(
              true,
            );
            expect(reading.s === 9 || reading.overDb === 0).toBe(true);
          }
          expect(sameReading(reading, { ...reading })).toBe(true);
        },
      ),
    );
  });
});
