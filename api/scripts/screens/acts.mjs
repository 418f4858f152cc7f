/** Taps a button by its name. */
export function press(name) {
  return (page) =>
    page
      .getByRole('button', { name, exact: typeof name === 'string' })
      .first()
      .click();
}

export const openSetups = press('Setups: add or mend');

export async function chooseFilters(page) {
  await page.locator('.cov-bar button, .cov-screen button').first().click();
}

export async function chooseHours(page) {
  await page
    .getByRole('button', { name: /hours, UTC/ })
    .first()
    .click();
}

export function typeFrequency(text) {
  return (page) => page.getByRole('textbox', { name: /^Frequency in kHz/ }).fill(text);
}

/** The pad takes no tap before: a script that tries makes the page scroll. */
const PAD_WAKES_MS = 450;
const COLUMNS = ['strength', 'interference', 'noise', 'propagation', 'overall'];

/** Touches the first columns of the score pad. */
export function scorePad(figures) {
  return async (page) => {
    await page.waitForTimeout(PAD_WAKES_MS);
    for (const [index, figure] of [...figures].entries())
      await page
        .getByRole('radiogroup', { name: COLUMNS[index], exact: true })
        .getByRole('radio', { name: new RegExp(` ${figure},`) })
        .click();
  };
}
