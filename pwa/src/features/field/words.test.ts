import { describe, expect, it } from 'vitest';
import { clockWords, offAirWords, offsetWords, outcomeWords, spokenFrequency } from './words';
import { sunWords } from './sun-words';

const NOW = Date.UTC(2026, 10, 12, 18, 42);
const THIN = '\u202f';

describe('the words of the field', () => {
  it('should speak a frequency as a person would', () => {
    expect(spokenFrequency(6_070_000)).toBe('6070 kilohertz');
    expect(spokenFrequency(5_000_200)).toBe('5000.2 kilohertz');
    expect(spokenFrequency(98_500_000)).toBe('98.5 megahertz');
  });

  it('should say until when a row is off the air, with the date on another day', () => {
    expect(offAirWords({ kind: 'off', from: Date.UTC(2026, 10, 12, 19) }, NOW)).toBe('Off air until 19:00');
    expect(offAirWords({ kind: 'off', from: Date.UTC(2026, 10, 13, 5) }, NOW)).toBe(
      'Off air until 13 Nov, 05:00',
    );
    expect(offAirWords({ kind: 'off', from: null }, NOW)).toBe('Off air');
  });

  it('should never show a nil as a score, nor old scores as new ones', () => {
    const heard = { outcome: 'heard', nilReason: null, sinpo: null, rst: null, carried: null } as const;
    const sinpo = { s: 3, i: 5, n: 4, p: 3, o: 3 } as const;
    expect(outcomeWords({ ...heard, sinpo })).toBe('35433');
    expect(outcomeWords({ ...heard, sinpo, carried: ['sinpo'] })).toBe('Heard');
    expect(outcomeWords({ ...heard, outcome: 'nil' })).toBe('Nil');
    expect(outcomeWords({ ...heard, outcome: 'nil', nilReason: 'noise' })).toBe('Nil, noise');
  });

  it('should say what is added to the device time, and warn of what cannot be trusted', () => {
    expect(offsetWords(300)).toBe(`+0.3${THIN}s`);
    expect(offsetWords(-180_000)).toBe(`\u22123.0${THIN}min`);
    const check = { deviceId: 'a', deviceAt: NOW - 7_200_000, offsetMs: 300, uncertaintyMs: 100 };
    expect(clockWords({ kind: 'checked', check, ageMs: 7_200_000 }, NOW)).toEqual({
      text: `checked 2${THIN}h ago, +0.3${THIN}s`,
      isWarning: false,
    });
    expect(clockWords({ kind: 'unchecked' }, NOW).isWarning).toBe(true);
  });

  it('should know dusk from dawn', () => {
    const dune = { latDeg: 56.1, lonDeg: 8.1 };
    // an afternoon in November on the west coast of Jutland: the sun stands low in the south-west, then sets
    expect(sunWords(dune, Date.UTC(2026, 10, 12, 12)).state).toBe('Day');
    expect(sunWords(dune, Date.UTC(2026, 10, 12, 15, 40)).state).toBe('Dusk');
    expect(sunWords(dune, Date.UTC(2026, 10, 12, 6, 40)).state).toBe('Dawn');
    expect(sunWords(dune, Date.UTC(2026, 10, 12, 23)).state).toBe('Night');
    expect(sunWords({ latDeg: 85, lonDeg: 0 }, Date.UTC(2026, 5, 21, 12)).next).toBe('');
  });
});
