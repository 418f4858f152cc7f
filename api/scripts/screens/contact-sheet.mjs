import fs from 'node:fs';
import path from 'node:path';
import { pathToFileURL } from 'node:url';

const SHOWN_WIDTH_PX = { phone: 260, laptop: 480 };
const COLUMNS = { phone: 7, laptop: 5 };

/** Puts the pictures of one theme and size on one sheet, drawn by the browser. Resolves to the path of its PNG. */
export async function makeContactSheet(browser, { folder, theme, size, pictures }) {
  const width = SHOWN_WIDTH_PX[size];
  const figures = pictures
    .map(
      ({ name, file }) =>
        `<figure><img src="${path.basename(file)}"><figcaption>${name}</figcaption></figure>`,
    )
    .join('\n');
  const html = `<!doctype html><meta charset="utf-8"><title>${theme}, ${size}</title><style>
    body { margin: 16px; background: #777; color: #fff; font: 15px sans-serif;
      display: grid; grid-template-columns: repeat(${COLUMNS[size]}, ${width}px); gap: 16px; }
    figure { margin: 0 } img { width: 100%; display: block } figcaption { padding: 4px 0 }</style>
    ${figures}`;
  const page = await browser.newPage({
    viewport: { width: COLUMNS[size] * (width + 16) + 16, height: 900 },
  });
  const source = path.join(folder, 'sheet.html');
  fs.writeFileSync(source, html);
  await page.goto(pathToFileURL(source).href);
  const sheet = path.join(path.dirname(folder), `${theme}-${size}.png`);
  await page.screenshot({ path: sheet, fullPage: true });
  await page.close();
  return sheet;
}
