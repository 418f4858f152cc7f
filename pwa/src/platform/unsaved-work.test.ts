// @vitest-environment jsdom
import { expect, test } from 'vitest';
import { anyUnsavedWork, onAllSaved, registerUnsavedWork } from './unsaved-work';

/** Whether the browser would ask before the page is left. */
function wouldAsk(): boolean {
  return !window.dispatchEvent(new Event('beforeunload', { cancelable: true }));
}

test('should hold the page until the last form is saved, and then tell', () => {
  const told: string[] = [];
  const stop = onAllSaved(() => told.push('saved'));
  const releaseSite = registerUnsavedWork();
  const releasePad = registerUnsavedWork();
  expect([anyUnsavedWork(), wouldAsk()]).toEqual([true, true]);
  releaseSite();
  releaseSite();
  expect([anyUnsavedWork(), wouldAsk(), told]).toEqual([true, true, []]);
  releasePad();
  expect([anyUnsavedWork(), wouldAsk(), told]).toEqual([false, false, ['saved']]);
  stop();
});
