import fs from 'node:fs';
import { createRequire } from 'node:module';
import { sidewaysFaults, smallTextFaults } from './page-faults.mjs';

const AXE = fs.readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');
const NARROWEST_PX = 320;

/** What is wrong with the page as it stands, each as one line: axe, sideways scrolling, text under 12 px. */
export async function faultsOfPage(page) {
  return [
    ...(await axeFaults(page)),
    ...(await page.evaluate(sidewaysFaults)),
    ...(await page.evaluate(smallTextFaults)),
  ];
}

/** The same page on the narrowest phone. */
export async function faultsWhenNarrow(page) {
  const size = page.viewportSize();
  await page.setViewportSize({ ...size, width: NARROWEST_PX });
  await page.waitForTimeout(150);
  const faults = await page.evaluate(sidewaysFaults);
  await page.setViewportSize(size);
  return faults.map((fault) => `at ${NARROWEST_PX} px: ${fault}`);
}

async function axeFaults(page) {
  await page.evaluate(AXE); // through the debugger: the content policy allows no foreign script in the page
  const violations = await page.evaluate(async () => {
    const { violations: found } = await globalThis.axe.run(document, { resultTypes: ['violations'] });
    return found.map(({ id, help, nodes }) => ({
      id,
      help,
      at: nodes.map(({ target }) => target.join(' ')),
    }));
  });
  return violations.map(({ id, help, at }) => `axe ${id}: ${help} (${at.length}: ${at[0]})`);
}

/**
 * How many pixels of a PNG have more than 8 of 255 in green or blue, decoded by the browser itself on a page of its own.
 * Resolves to one line, or none where all is red.
 */
export async function redNightFaults(workPage, png) {
  const worst = await workPage.evaluate(
    async (picture) => {
      const blob = await (await fetch(picture)).blob();
      const bitmap = await createImageBitmap(blob, { colorSpaceConversion: 'none' });
      const canvas = new OffscreenCanvas(bitmap.width, bitmap.height);
      const context = canvas.getContext('2d');
      context.drawImage(bitmap, 0, 0);
      const { data } = context.getImageData(0, 0, bitmap.width, bitmap.height);
      let [count, at, most] = [0, 0, 0];
      for (let i = 0; i < data.length; i += 4) {
        const other = Math.max(data[i + 1], data[i + 2]);
        if (other > 8) count += 1;
        if (other > most) [most, at] = [other, i / 4];
      }
      return { count, most, x: at % bitmap.width, y: Math.floor(at / bitmap.width) };
    },
    `data:image/png;base64,${png.toString('base64')}`,
  );
  const { count, most, x, y } = worst;
  return count === 0 ? [] : [`${count} pixels are not red; the worst has ${most} at ${x}, ${y}`];
}
