import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatFrequency, frequencyText, readFrequency } from './frequency-text.js';

const frequency = (frequencyHz: number, alternativeHz: number | null = null) => ({
  kind: 'frequency',
  frequencyHz,
  alternativeHz,
});

describe('a typed frequency', () => {
  // The rules are the product's own; that plain numbers are kHz is common practice, no source.
  it.each([
    ['5000', 5_000_000],
    ['5000.2', 5_000_200],
    ['5000,2', 5_000_200],
    ['5 000', 5_000_000],
    ['5\u2009000', 5_000_000],
    ['1017', 1_017_000],
    ['198', 198_000],
    ['6070k', 6_070_000],
    ['6070 kHz', 6_070_000],
    ['6070KHZ', 6_070_000],
    ['6.07M', 6_070_000],
    ['6,07 MHz', 6_070_000],
    ['101.5mhz', 101_500_000],
    ['145M', 145_000_000],
    ['60M', 60_000_000],
    ['1', 1000],
    ['3000M', 3_000_000_000],
    ['5000.', 5_000_000],
    ['1234.567', 1_234_567],
    ['5000.2000000', 5_000_200],
  ])('should be read as meant: %j', (text, hz) => {
    expect(readFrequency(text)).toEqual(frequency(hz));
  });

  it.each([
    ['7.255', 7255, 7_255_000],
    ['101.5', 101_500, 101_500_000],
    ['5,000', 5000, 5_000_000],
    ['999.9', 999_900, 999_900_000],
  ])('should offer MHz for the decimal %j below 1 000', (text, kHz, mHz) => {
    expect(readFrequency(text)).toEqual(frequency(kHz, mHz));
  });

  it('should still offer MHz where kHz cannot be meant', () => {
    expect(readFrequency('0.648')).toMatchObject({
      kind: 'refused',
      code: 'out-of-range',
      alternativeHz: 648_000,
    });
    expect(readFrequency('3.9551')).toMatchObject({
      kind: 'refused',
      code: 'finer-than-1-hz',
      alternativeHz: 3_955_100,
    });
  });

  it('should not offer MHz where a unit was written, or no decimal', () => {
    expect(readFrequency('101.5k')).toEqual(frequency(101_500));
    expect(readFrequency('198')).toEqual(frequency(198_000));
    expect(readFrequency('1000.5')).toEqual(frequency(1_000_500));
  });

  it.each([
    ['49m', 49],
    ['49 m', 49],
    ['160m', 160],
  ])('should take a lower-case m after a whole number for the metre band: %j', (text, metres) => {
    expect(readFrequency(text)).toEqual({ kind: 'metre-band', metres });
  });

  it.each([
    ['', 'empty'],
    ['  ', 'empty'],
    ['abc', 'not-a-frequency'],
    ['.', 'not-a-frequency'],
    ['M', 'not-a-frequency'],
    ['m', 'not-a-frequency'],
    ['0m', 'not-a-frequency'],
    ['7.2m', 'not-a-frequency'],
    ['-5000', 'not-a-frequency'],
    ['1,234.5', 'not-a-frequency'],
    ['5000 Hz', 'not-a-frequency'],
    ['5e3', 'not-a-frequency'],
    ['5000k2', 'not-a-frequency'],
    ['<b>5000</b>', 'not-a-frequency'],
    ['0', 'out-of-range'],
    ['3000.000001M', 'out-of-range'],
    ['3000001', 'out-of-range'],
    ['5000.2345', 'finer-than-1-hz'],
    ['99999999999999999999999', 'out-of-range'],
  ])('should be refused with a sentence: %j', (text, code) => {
    const reading = readFrequency(text);
    expect(reading).toMatchObject({ kind: 'refused', code });
    expect(reading.kind === 'refused' && reading.message).toMatch(/\.$/);
  });

  it('should never throw and never leave the range, whatever was typed', () => {
    const typed = fc.oneof(fc.string(), fc.stringMatching(/^[0-9., kKmMHz]{0,14}$/));
    fc.assert(
      fc.property(typed, (text) => {
        const reading = readFrequency(text);
        if (reading.kind === 'metre-band') return;
        const read = reading.kind === 'frequency' ? [reading.frequencyHz] : [];
        const offered = reading.alternativeHz === null ? [] : [reading.alternativeHz];
        for (const hz of [...read, ...offered]) {
          expect(Number.isInteger(hz) && hz >= 1000 && hz <= 3_000_000_000).toBe(true);
        }
      }),
      { numRuns: 2000 },
    );
  });
});

describe('a frequency as text', () => {
  it.each([
    [6_070_000, '6\u2009070\u2009kHz'],
    [5_000_200, '5\u2009000.2\u2009kHz'],
    [198_000, '198\u2009kHz'],
    [1000, '1\u2009kHz'],
    [1001, '1.001\u2009kHz'],
    [29_999_999, '29\u2009999.999\u2009kHz'],
    [30_000_000, '30\u2009MHz'],
    [101_500_000, '101.5\u2009MHz'],
    [1_296_200_000, '1\u2009296.2\u2009MHz'],
  ])('should be grouped and carry its unit: %i Hz', (hz, text) => {
    expect(frequencyText(hz)).toBe(text);
  });

  it('should always read back to the same hertz', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1000, max: 3_000_000_000 }), (hz) => {
        expect(readFrequency(frequencyText(hz))).toEqual(frequency(hz));
        const { figure, unit } = formatFrequency(hz);
        if (unit === 'kHz') expect(readFrequency(figure)).toMatchObject({ frequencyHz: hz });
      }),
    );
  });
});
