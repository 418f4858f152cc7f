// @vitest-environment jsdom
import { act, cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { LockKey } from './LockKey';
import { RainLock, useRainLock } from './RainLock';

function Page() {
  const rain = useRainLock();
  return (
    <>
      <LockKey onLock={rain.lock} />
      {rain.isLocked ? <RainLock onOpen={rain.unlock} /> : null}
    </>
  );
}

const lock = () => screen.queryByRole('dialog', { name: 'Locked against rain', hidden: true });
const key = () => screen.getByText('Hold for two seconds to open').closest('button')!;
const wait = (ms: number) => act(() => vi.advanceTimersByTimeAsync(ms));

beforeEach(() => {
  // the DOM of the tests has no modal dialogs; that it is modal is the browser's part
  HTMLDialogElement.prototype.showModal = function (this: HTMLDialogElement) {
    this.open = true;
  };
  HTMLDialogElement.prototype.close = function (this: HTMLDialogElement) {
    this.open = false;
  };
  vi.useFakeTimers();
  sessionStorage.clear();
  render(<Page />);
  fireEvent.click(screen.getByRole('button', { name: 'Lock the screen against rain' }));
});
afterEach(() => {
  cleanup();
  vi.useRealTimers();
});

it('should open to a hold of two seconds, and to none that is shorter', async () => {
  fireEvent.pointerDown(key());
  await wait(1900);
  fireEvent.pointerUp(key());
  await wait(1000);
  expect(lock()).not.toBeNull();
  fireEvent.pointerDown(key());
  await wait(2000);
  expect(lock()).toBeNull();
});

it('should open from a keyboard by a held key, whose repeats do not begin the hold anew', async () => {
  fireEvent.keyDown(key(), { key: ' ' });
  for (let beats = 0; beats < 20; beats += 1) {
    await wait(100);
    if (lock()) fireEvent.keyDown(key(), { key: ' ', repeat: true });
  }
  expect(lock()).toBeNull();
});

it('should stay locked over a reload', () => {
  cleanup();
  render(<Page />);
  expect(lock()).not.toBeNull();
});
