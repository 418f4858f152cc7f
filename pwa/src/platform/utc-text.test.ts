import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  agoWords,
  durationWords,
  figureText,
  timeOrDate,
  utcDate,
  utcDateTime,
  utcTime,
  withUnit,
} from './utc-text';

const AT = Date.UTC(2026, 11, 1, 18, 42, 7);
const S = '\u202f';

describe('times', () => {
  test('should be UTC wherever the device stands', () => {
    expect([utcTime(AT), utcDate(AT), utcDateTime(AT)]).toEqual([
      '18:42:07',
      '1 Dec 2026',
      '1 Dec 2026, 18:42 UTC',
    ]);
  });

  test('should carry the date once it is another UTC day', () => {
    expect(timeOrDate(AT, AT + 60_000)).toBe('18:42');
    expect(timeOrDate(AT, AT + 6 * 3_600_000)).toBe('1 Dec, 18:42');
  });

  test('should say durations in the largest unit that fits', () => {
    expect([42_000, 7 * 60_000, 130 * 60_000, 47 * 3_600_000, 72 * 3_600_000].map(durationWords)).toEqual([
      `42${S}s`,
      `7${S}min`,
      `2${S}h`,
      `47${S}h`,
      '3 days',
    ]);
    expect(agoWords(AT, AT + 2 * 3_600_000)).toBe(`2${S}h ago`);
    expect(agoWords(AT, AT - 5 * 60_000)).toBe(`in 5${S}min`);
    expect(agoWords(AT, AT + 30_000)).toBe('just now');
  });
});

describe('figures', () => {
  test('should have thin spaces and a true minus', () => {
    expect(figureText(11730)).toBe(`11${S}730`);
    expect(figureText(5000.2, 1)).toBe(`5${S}000.2`);
    expect(withUnit(-85, 'dBm')).toBe(`\u221285${S}dBm`);
    expect(figureText(-0.04, 1)).toBe('0.0');
  });

  test('should always give back the number when the spaces are taken out', () => {
    fc.assert(
      fc.property(fc.integer(), (value) => {
        expect(Number(figureText(value).replaceAll(S, '').replace('\u2212', '-'))).toBe(
          value === 0 ? 0 : value,
        );
      }),
    );
  });
});
