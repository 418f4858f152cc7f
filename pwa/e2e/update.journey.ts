import { describe, expect, it } from 'vitest';
import { useBrowser, type Device } from './stage/browser';
import { serverWithNewerVersion } from './stage/newer-version';

describe('a newer version', () => {
  const browser = useBrowser();

  it('should be offered, wait for an open form and lose nothing of it, and come when it is taken', async () => {
    const server = await serverWithNewerVersion();
    const phone = await browser.device();
    const { page } = phone;
    await phone.open(`${server.address}/settings`);
    await page.getByText('Ready without signal.', { exact: true }).waitFor();
    await phone.open(`${server.address}/field`);
    await page.getByRole('button', { name: 'Start a log on this phone' }).click();
    await page.getByRole('heading', { name: 'Start listening' }).waitFor();
    await phone.open(`${server.address}/antennas/antennas/new`);
    await page.getByRole('textbox', { name: 'Name' }).fill('Half-typed wire');

    server.release();
    await lookForNewVersion(phone);
    await page.getByText('A new version is ready.', { exact: true }).waitFor();
    await page.getByRole('button', { name: 'Use it now' }).click();
    await page.getByText('Save or leave the open form first').waitFor();
    expect(await page.getByRole('textbox', { name: 'Name' }).inputValue()).toBe('Half-typed wire');

    await page.getByRole('button', { name: 'Save', exact: true }).click();
    await page.getByRole('link', { name: /^Half-typed wire/ }).waitFor();
    const reloaded = page.waitForEvent('load');
    await page.getByRole('button', { name: 'Use it now' }).click();
    await reloaded;
    await page.getByRole('link', { name: /^Half-typed wire/ }).waitFor();
    expect(await page.getByText('A new version is ready').isVisible()).toBe(false);
    expect(phone.faults).toEqual([]);
  });

  /** What the application does by itself when it comes back to the front after an hour. */
  async function lookForNewVersion({ page }: Device): Promise<void> {
    await page.evaluate(async () => {
      const registration = await navigator.serviceWorker.getRegistration();
      await registration?.update();
    });
  }
});
