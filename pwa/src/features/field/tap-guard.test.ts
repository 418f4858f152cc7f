import { expect, it } from 'vitest';
import { createTapGuard } from './tap-guard';

it('should ignore a second tap on a row within 1.5 s, and no tap on another row', () => {
  const guard = createTapGuard();
  expect(guard.accepts('a', 1000)).toBe(true);
  expect(guard.accepts('a', 2499)).toBe(false);
  expect(guard.accepts('b', 2499)).toBe(true);
  expect(guard.accepts('a', 2500)).toBe(true);
  expect(guard.accepts('a', 4000)).toBe(true);
});

it('should not let ignored taps lengthen the wait', () => {
  const guard = createTapGuard();
  guard.accepts('a', 0);
  guard.accepts('a', 1000);
  expect(guard.accepts('a', 1500)).toBe(true);
});
