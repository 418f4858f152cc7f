import { randomUUID } from 'node:crypto';

const PASSWORD = 'marram-demo-2026';
const FIRST_ROUND_LIMIT_MS = 120_000;

/**
 * Who looks at the screens. Each is made once for a size, by `arrive(page, size)`, which resolves to the addresses found for
 * that person. The walker is another one for each size, since an outing runs for its owner on every device.
 */
export const PEOPLE = {
  nobody: async () => ({}),
  guest: startGuestLog,
  member: async (page) => {
    await signIn(page, 'asta');
    return {
      site: await firstLink(page, '/field/sites', 'a[href^="/field/sites/0"]'),
      reception: await firstLink(
        page,
        '/logbook',
        'a.log-row, .log-main table a, .log-main a[href*="open="]',
      ),
      square: await firstLink(page, '/coverage/table', 'a[href^="/coverage/square/"]'),
      antenna: await firstLink(page, '/antennas', 'a[href^="/antennas/antennas/0"]'),
    };
  },
  admin: async (page) => {
    await signIn(page, 'marthe');
    return { targetList: await firstLink(page, '/desk/target-lists', 'a[href^="/desk/target-lists/0"]') };
  },
  walker: async (page, size) => {
    await signIn(page, size === 'phone' ? 'silje' : 'vibeke');
    await startOuting(page);
    return { pad: padAddress };
  },
};

async function startGuestLog(page) {
  await page.goto('/');
  await page.getByRole('button', { name: 'Start a log on this phone' }).click();
  await page.getByText('Start listening').waitFor();
  return {};
}

async function signIn(page, key) {
  await page.goto('/account/sign-in');
  await page.getByRole('textbox', { name: 'Mail address' }).fill(`${key}@marram.invalid`);
  await page.getByRole('textbox', { name: 'Password' }).fill(PASSWORD);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await page.waitForURL('**/field');
  await page
    .getByRole('link', { name: /^Sent / })
    .first()
    .waitFor({ timeout: FIRST_ROUND_LIMIT_MS });
}

/** The address of the first matching link of a page, or null where there is none. */
async function firstLink(page, address, selector) {
  await page.goto(address);
  const link = page.locator(selector).first();
  const isThere = await link.waitFor({ timeout: 15_000 }).then(
    () => true,
    () => false,
  );
  return isThere ? link.getAttribute('href') : null;
}

/** An outing with the longest target list and some answers, one of each kind. */
async function startOuting(page) {
  await page.goto('/field/start');
  const lists = page.getByRole('group', { name: 'Target list' }).getByRole('radio');
  await lists.first().waitFor();
  await page.getByRole('group', { name: 'Site' }).getByRole('radio').first().check({ force: true });
  const setups = page.getByRole('group', { name: /^Taken along/ }).getByRole('checkbox');
  for (const index of [0, 1])
    if ((await setups.count()) > index) await setups.nth(index).check({ force: true });
  await lists.first().check({ force: true });
  await page.getByRole('button', { name: 'Start the outing' }).click();
  await page.locator('.fd-rows').waitFor();
  await answerSomeRows(page);
}

async function answerSomeRows(page) {
  const nil = page.locator('.fd-rows').getByRole('button', { name: /^Nil, / });
  const heard = page.locator('.fd-rows').getByRole('button', { name: /^Heard, / });
  for (const figures of ['44433', '32222']) {
    if ((await heard.count()) === 0) return;
    await heard.first().click();
    await touchCells(page, figures);
    await page.getByRole('button', { name: /^Save / }).click();
    await page.locator('.fd-rows').waitFor();
  }
  if ((await nil.count()) > 0) await nil.first().click();
}

async function touchCells(page, figures) {
  await page.locator('.hm-pad').waitFor();
  for (const [column, figure] of [...figures].entries())
    await page.locator(`[data-cell="${'sinpo'[column]}${figure}"]`).click();
}

/** A pad of a planned try; each opening is a new entry. */
function padAddress() {
  const query = {
    frequencyHz: 6_070_000,
    mode: 'AM',
    means: 'planned',
    atMs: Date.now(),
    draft: randomUUID(),
  };
  return `/field/pad?${new URLSearchParams(query)}`;
}
