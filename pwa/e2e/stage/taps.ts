import type { Device } from './browser';

declare global {
  var harkmoorTaps: number | undefined;
}

/** From the next opening on, the page counts what fingers really tap. */
export async function countTaps({ context }: Device): Promise<void> {
  await context.addInitScript(() => {
    globalThis.harkmoorTaps = 0;
    const count = (event: Event): void => {
      if (event.isTrusted) globalThis.harkmoorTaps = (globalThis.harkmoorTaps ?? 0) + 1;
    };
    addEventListener('pointerdown', count, { capture: true });
  });
}

/** How many taps there were since the page was opened. */
export async function tapsSoFar({ page }: Device): Promise<number> {
  const taps = await page.evaluate(() => globalThis.harkmoorTaps);
  if (taps === undefined) throw new Error('no taps were counted on this page');
  return taps;
}
