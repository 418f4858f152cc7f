import fc from 'fast-check';
import { expect, test } from 'vitest';
import { numberText, readNumber } from './read-number';

test('should read numbers as people write them', () => {
  expect(readNumber('5 000,2')).toBe(5000.2);
  expect(readNumber('11\u202f730')).toBe(11730);
  expect(readNumber('\u221285')).toBe(-85);
  expect(readNumber('.5')).toBe(0.5);
  expect(readNumber('5000.')).toBe(5000);
});

test('should tell nothing from no number', () => {
  expect(readNumber('  ')).toBeNull();
  for (const text of ['abc', '1,000,000', '1.2.3', '--1', '1e5', '5000 kHz'])
    expect(readNumber(text)).toBeNaN();
});

test('should always read back what it wrote', () => {
  fc.assert(
    fc.property(fc.integer({ min: -1e9, max: 1e9 }), fc.integer({ min: 0, max: 4 }), (whole, decimals) => {
      const value = Number((whole / 10 ** decimals).toFixed(decimals));
      expect(readNumber(numberText(value))).toBe(value === 0 ? 0 : value);
    }),
  );
});
