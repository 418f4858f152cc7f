// @vitest-environment jsdom
import { act, cleanup, render, screen } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { useMinute } from '../../platform/tick';
import { UtcClock } from './UtcClock';

/** As on an idle Field: the clock on the screen, and what asks for the minute beside it. */
function IdleField() {
  return (
    <>
      <UtcClock aheadMs={300} />
      <UtcClock aheadMs={300} />
      <Minute />
    </>
  );
}

function Minute() {
  return <span>{useMinute()}</span>;
}

function setVisible(isVisible: boolean): void {
  vi.spyOn(document, 'visibilityState', 'get').mockReturnValue(isVisible ? 'visible' : 'hidden');
  act(() => void document.dispatchEvent(new Event('visibilitychange')));
}

function timersWithin(ms: number): number {
  const endMs = Date.now() + ms;
  let fired = 0;
  act(() => {
    for (; vi.getTimerCount() > 0 && Date.now() < endMs; fired += 1) vi.advanceTimersToNextTimer();
  });
  return fired;
}

beforeEach(() => {
  vi.useFakeTimers({ now: Date.UTC(2026, 10, 12, 18, 42, 7, 400) });
});
afterEach(() => {
  cleanup();
  vi.useRealTimers();
  vi.restoreAllMocks();
});

it('should cost an idle Field no more than two timers a second, and none while nobody looks', () => {
  render(<IdleField />);
  expect(timersWithin(60_000) / 60).toBeLessThanOrEqual(2);
  setVisible(false);
  expect(vi.getTimerCount()).toBe(0);
});

it('should show the right second at once when it is looked at again', () => {
  render(<UtcClock />);
  setVisible(false);
  vi.setSystemTime(Date.UTC(2026, 10, 12, 19, 0, 1));
  setVisible(true);
  expect(screen.getByText(/19:00:01/)).toBeTruthy();
});
