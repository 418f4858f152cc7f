import { describe, expect, it } from 'vitest';
import { ALL_HOURS, hoursOf, middleOfDayMs, movedBy, rangeWords, readRangeCode } from './hour-range';

describe('a range of UTC hours', () => {
  it('should run over midnight in the order of the night', () => {
    const range = readRangeCode('22-2');
    expect(hoursOf(range)).toEqual([22, 23, 0, 1]);
    expect(rangeWords(range)).toBe('22:00–02:00 UTC');
  });

  it('should have its middle half an hour after the start of a single hour', () => {
    expect(middleOfDayMs(readRangeCode('15'))).toBe(15.5 * 3_600_000);
    expect(middleOfDayMs(readRangeCode('23-2'))).toBe(0.5 * 3_600_000);
  });

  it('should move round the clock', () => {
    expect(movedBy({ fromUtc: 23, lengthH: 2 }, 1).fromUtc).toBe(0);
    expect(movedBy({ fromUtc: 0, lengthH: 2 }, -1).fromUtc).toBe(23);
  });

  it('should be all hours where the address names none', () => {
    for (const code of [null, '', 'all', '24', '5-5', '-3', '7-99'])
      expect(readRangeCode(code)).toBe(ALL_HOURS);
  });
});
