import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { MeterScale } from '../../records/receiver.js';
import { dbmToDbMicrovolts, dbmToMicrovolts, formatMeter, levelDbm, sUnitsOf } from './meter.js';

const R1: MeterScale = { kind: 's', s9Dbm: -73, dbPerS: 6, calibrated: false };
const HABIT: MeterScale = { kind: 's', s9Dbm: -67, dbPerS: 5, calibrated: true };
const NONE: MeterScale = { ...R1, kind: 'none' };
const HF = 6_070_000;
const VHF = 145_000_000;

describe('the level of a meter reading', () => {
  // IARU Region 1 Technical Recommendation R.1 (VHF Managers Handbook 8.6.1; HF handbook 9.0, 4.1.3, as quoted
  // by an amateur's page; encyclopedia "S meter"): S9 −73 dBm below 30 MHz, −93 dBm above, 6 dB an S-unit.
  it.each([
    [9, 0, HF, -73],
    [8, 0, HF, -79],
    [1, 0, HF, -121],
    [9, 10, HF, -63],
    [9, 0, VHF, -93],
    [9, 20, VHF, -73],
    [9, 14, VHF, -79],
    [9, 0, 30_000_000, -73],
    [9, 0, 30_000_001, -93],
  ])('should follow R.1 for S%i+%i at %i Hz', (s, overDb, frequencyHz, dbm) => {
    expect(levelDbm({ s, overDb }, R1, frequencyHz)).toBe(dbm);
  });

  it('should follow the receiver where its S9 is another, at every frequency', () => {
    // An old habit of makers: S9 = 100 µV = −67 dBm (the notes of a published HF prediction program).
    expect(levelDbm({ s: 9, overDb: 0 }, HABIT, HF)).toBe(-67);
    expect(levelDbm({ s: 7, overDb: 0 }, HABIT, HF)).toBe(-77);
    expect(levelDbm({ s: 9, overDb: 0 }, HABIT, VHF)).toBe(-67);
  });

  it('should take dBm as read, and know nothing where there is no meter', () => {
    expect(levelDbm({ dbm: -85.5 }, R1, VHF)).toBe(-85.5);
    expect(levelDbm({ dbm: -85.5 }, NONE, HF)).toBeNull();
    expect(levelDbm({ s: 9, overDb: 0 }, NONE, HF)).toBeNull();
    expect(sUnitsOf(-73, NONE, HF)).toBeNull();
  });
});

describe('a level in S-units', () => {
  // −80 dBm is calculated from the formula of R.1; the rest as above.
  it.each([
    [-73, HF, 9, 0],
    [-80, HF, 7.83, 0],
    [-93, HF, 5.67, 0],
    [-121, HF, 1, 0],
    [-63, HF, 9, 10],
    [-121, VHF, 4.33, 0],
    [-80, VHF, 9, 13],
    [-63, VHF, 9, 30],
  ])('should be as R.1 says for %f dBm at %i Hz', (dbm, frequencyHz, s, overDb) => {
    const shown = sUnitsOf(dbm, R1, frequencyHz);
    expect(shown?.s).toBeCloseTo(s, 2);
    expect(shown?.overDb).toBeCloseTo(overDb, 9);
  });

  it('should not go below S0', () => {
    expect(sUnitsOf(-150, R1, HF)).toEqual({ s: 0, overDb: 0 });
  });

  it('should always come back to the same level from S0 up', () => {
    const scale = fc.record({
      kind: fc.constant('s' as const),
      s9Dbm: fc.integer({ min: -110, max: -40 }),
      dbPerS: fc.integer({ min: 3, max: 10 }),
      calibrated: fc.boolean(),
    });
    const level = fc.double({ min: -150, max: 20, noNaN: true });
    const frequency = fc.integer({ min: 1000, max: 3_000_000_000 });
    fc.assert(
      fc.property(level, scale, frequency, (dbm, anyScale, frequencyHz) => {
        const shown = sUnitsOf(dbm, anyScale, frequencyHz);
        fc.pre(shown !== null && shown.s > 0);
        expect(levelDbm(shown!, anyScale, frequencyHz)).toBeCloseTo(dbm, 9);
      }),
    );
  });
});

describe('a level as a voltage across 50 Ω', () => {
  // Printed by the encyclopedia's S-meter table, rounded by repeated doubling: held within 1 %.
  it.each([
    [-73, 50.2],
    [-79, 25.1],
    [-121, 0.2],
  ])('should be the printed %f dBm = %f µV within 1 %%', (dbm, microvolts) => {
    expect(Math.abs(dbmToMicrovolts(dbm) / microvolts - 1)).toBeLessThan(0.01);
  });

  // IARU R.1: −73 dBm is 50 µV and −93 dBm 5 µV; the further digits, −63, −107 and 0 dBm calculated from V = √(R·P).
  it.each([
    [-73, 50.06, 2],
    [-93, 5.006, 3],
    [-63, 158.3, 1],
    [-107, 0.99881, 5],
    [0, 223_607, 0],
  ])('should be %f dBm = %f µV', (dbm, microvolts, digits) => {
    expect(dbmToMicrovolts(dbm)).toBeCloseTo(microvolts, digits);
  });

  // The encyclopedia's table prints 34, 28, −14 and 44 dBµV; two decimals calculated.
  it.each([
    [-73, 33.99],
    [-79, 27.99],
    [-121, -14.01],
    [-63, 43.99],
    [0, 106.99],
  ])('should be %f dBm = %f dBµV', (dbm, dbMicrovolts) => {
    expect(dbmToDbMicrovolts(dbm)).toBeCloseTo(dbMicrovolts, 2);
  });

  it('should be the same voltage in both units', () => {
    fc.assert(
      fc.property(fc.double({ min: -150, max: 20, noNaN: true }), (dbm) => {
        expect(20 * Math.log10(dbmToMicrovolts(dbm))).toBeCloseTo(dbmToDbMicrovolts(dbm), 8);
      }),
    );
  });
});

describe('a meter reading as text', () => {
  it('should be as the trade writes it', () => {
    expect(formatMeter({ s: 7, overDb: 0 })).toBe('S7');
    expect(formatMeter({ s: 9, overDb: 20 })).toBe('S9+20');
    expect(formatMeter({ dbm: -85 })).toBe('\u221285\u2009dBm');
    expect(formatMeter({ dbm: 0 })).toBe('0\u2009dBm');
  });
});
