import { describe, expect, it } from 'vitest';
import { middleDayMs, monthsWords } from './months';

describe('months', () => {
  it('should have 31 December in the middle of November to February', () => {
    expect(middleDayMs(['2027-02', '2026-11'])).toBe(Date.UTC(2026, 11, 31));
  });

  it('should have the middle of the month where it is one, and none where there is no month', () => {
    expect(middleDayMs(['2026-11'])).toBe(Date.UTC(2026, 10, 16));
    expect(middleDayMs([])).toBeNull();
  });

  it('should be told as runs, with years only where they could be mistaken', () => {
    expect(monthsWords(['2026-11', '2026-12', '2027-01', '2027-02'])).toBe('Nov–Feb');
    expect(monthsWords(['2026-09', '2026-11'])).toBe('Sep, Nov');
    expect(monthsWords(['2025-11', '2026-11'])).toBe('Nov 2025, Nov 2026');
  });
});
