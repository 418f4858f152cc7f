import { isTypeScript } from './source-files.mjs';

const LINES_MAX = 200;
const COUNTED = /^(sync-model|api|pwa)\/.*\.(ts|tsx|mjs|css)$/;
const EXEMPT = /^api\/migrations\/|-table\.ts$|\/tables\//; // a migration is history, and a table of facts is read by its rows

/** Files that are longer, with their lines and the reason. The list may only shrink. */
export const LONGER = {};

export const fileLength = {
  why: `a file has at most ${LINES_MAX} lines: split it by meaning (a longer one is named with its reason in borders/sizes.mjs)`,
  breaches(files) {
    const counted = files.filter(({ path }) => COUNTED.test(path) && !EXEMPT.test(path));
    const tooLong = counted
      .map(({ path, text }) => ({ path, lines: text.trimEnd().split('\n').length }))
      .filter(({ path, lines }) => lines > (LONGER[path]?.lines ?? LINES_MAX))
      .map(({ path, lines }) => `${path} has ${lines} lines`);
    const outgrown = Object.keys(LONGER)
      .filter(
        (path) =>
          !counted.some((file) => file.path === path && file.text.trimEnd().split('\n').length > LINES_MAX),
      )
      .map((path) => `${path} is not longer than ${LINES_MAX} lines any more: take it off the list`);
    return [...tooLong, ...outgrown];
  },
};

export const folders = {
  why: 'a folder is named for what it is about, and a file says what is in it: no utils, helpers or common, no barrels',
  breaches(files) {
    return files
      .filter(
        (file) =>
          /(^|\/)(utils?|helpers?|common|misc)\//.test(file.path) ||
          (isTypeScript(file) && isBarrel(file.path)),
      )
      .map(({ path }) => path);
  },
};

function isBarrel(path) {
  return /\/index\.tsx?$/.test(path);
}

const TOP_LEVEL =
  /^(pwa|api|sync-model|\.ci|README\.md|DEVELOPERS\.md|package(-lock)?\.json|tsconfig(\.base)?\.json|\.browserslistrc|\.gitignore|\.npmrc|\.prettierrc\.json|\.prettierignore|eslint\.config\.mjs)$/;

export const topLevel = {
  why: 'the house has the top-level names of its drawing and no others',
  breaches(files) {
    const names = [...new Set(files.map(({ path }) => path.split('/')[0]))];
    return names.filter((name) => !TOP_LEVEL.test(name));
  },
};
