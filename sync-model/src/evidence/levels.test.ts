import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { levels } from './levels.js';

const scale = (kind: 's' | 'dbm' | 'none', calibrated: boolean) => ({
  meterScale: { kind, s9Dbm: -73, dbPerS: 6, calibrated },
});
const RECEIVERS = new Map([
  ['bench', scale('s', false)],
  ['lab', scale('dbm', true)],
  ['shed', scale('dbm', true)],
  ['mute', scale('none', false)],
]);
const heard = (levelDbm: number | null, receiverId = 'bench') => ({ heard: true, levelDbm, receiverId });
const nil = (receiverId = 'bench') => ({ heard: false, levelDbm: null, receiverId });
const levelOf = (tries: Parameters<typeof levels>[0]) => levels(tries, RECEIVERS)[0]?.level;

describe('levels', () => {
  it('should be the median over all tries with nils as below', () => {
    expect(levelOf([heard(-60), heard(-70), heard(-80), nil(), nil()])).toEqual({
      kind: 'level',
      medianDbm: -80,
    });
    expect(levelOf([heard(-60), heard(-70), heard(-80), nil()])).toEqual({ kind: 'level', medianDbm: -75 });
  });

  it('should be below the floor when more than half are nil', () => {
    expect(levelOf([heard(-80), heard(-70), nil(), nil(), nil()])).toEqual({
      kind: 'below-floor',
      floorDbm: -80,
    });
    expect(levelOf([nil()])).toEqual({ kind: 'below-floor', floorDbm: null });
  });

  it('should name the lowest reading when exactly half are nil', () => {
    expect(levelOf([heard(-80), heard(-70), nil(), nil()])).toEqual({ kind: 'level', medianDbm: -80 });
  });

  it('should not take a meter that was seldom read for a weak signal', () => {
    const tries = [heard(-70), heard(-60), ...Array(8).fill(heard(null)), nil(), nil(), nil()];
    expect(levels(tries, RECEIVERS)[0]).toMatchObject({
      n: 5,
      nils: 3,
      read: 2,
      unread: 8,
      level: { kind: 'level', medianDbm: -70 },
      interval: null,
    });
  });

  it('should pool calibrated meters and nothing else', () => {
    const tries = [heard(-60, 'lab'), heard(-70, 'shed'), heard(-50), nil('mute'), heard(null, 'mute')];
    expect(levels(tries, RECEIVERS).map(({ receiverId, n }) => [receiverId, n])).toEqual([
      [null, 2],
      ['bench', 1],
    ]);
  });

  it('should leave a receiver out whose meter was never read though it mostly hears', () => {
    expect(levels([heard(null), heard(null), nil()], RECEIVERS)).toEqual([]);
  });

  it('should give an interval that may reach below the floor', () => {
    const tries = [...[-50, -55, -60, -65, -70, -75].map((dbm) => heard(dbm)), nil(), nil(), nil(), nil()];
    expect(levels(tries, RECEIVERS)[0]?.interval).toEqual({ lowDbm: null, highDbm: -55 });
    expect(levels([heard(-50), nil()], RECEIVERS)[0]?.interval).toBeNull();
  });

  it('should never rise when a heard try becomes a nil', () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: -120, max: -20 }), { minLength: 1, maxLength: 20 }),
        fc.nat(),
        (dbms, pick) => {
          const heardAll = dbms.map((dbm) => heard(dbm));
          const lost = heardAll.map((one, i) => (i === pick % dbms.length ? nil() : one));
          const before = levelOf(heardAll)!;
          const after = levelOf(lost)!;
          if (after.kind === 'below-floor' || before.kind === 'below-floor') return;
          // Half nil exactly tells the upper of the two in the middle: the lower is only known to be below.
          if (2 * lost.filter((one) => !one.heard).length === lost.length) return;
          expect(after.medianDbm).toBeLessThanOrEqual(before.medianDbm);
        },
      ),
    );
  });
});
