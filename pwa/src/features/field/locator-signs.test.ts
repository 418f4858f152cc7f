import { isLocator } from '@harkmoor/sync-model/radio/locator/locator';
import fc from 'fast-check';
import { expect, it } from 'vitest';
import { locatorSigns, typedLocator } from './locator-signs';

it('should offer at each place only what may stand there', () => {
  expect(locatorSigns('')).toHaveLength(18);
  expect(locatorSigns('JO')).toHaveLength(10);
  expect(locatorSigns('JO46')).toHaveLength(24);
  expect(locatorSigns('JO46ac25')).toEqual([]);
  expect(typedLocator('jo46AC')).toBe('JO46ac');
  expect(typedLocator('J-O 46')).toBe('JO46');
});

it('should never let anything stand that is not the beginning of a locator', () => {
  fc.assert(
    fc.property(fc.string({ maxLength: 30 }), (raw) => {
      const text = typedLocator(raw);
      if (text.length >= 2) expect(isLocator(text.slice(0, text.length - (text.length % 2)))).toBe(true);
      expect(text.length).toBeLessThanOrEqual(8);
    }),
  );
});
