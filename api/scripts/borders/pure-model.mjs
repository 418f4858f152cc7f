import ts from 'typescript';
import { eachNode, importsOf, isTest, isTypeScript, lineOf } from './source-files.mjs';

const HOME = /^sync-model\/(src|simulation)\//;
const BANNED_READS = [
  'Date.now',
  'Math.random',
  'performance.now',
  'crypto.randomUUID',
  'crypto.getRandomValues',
];

/** The packages that the model may use are those that its package.json names; no framework and no built-in is among them. */
export const modelImports = {
  why: 'sync-model runs on the phone and on the server, so it knows neither: its own files and its few packages are all it imports',
  breaches(files) {
    const manifest = JSON.parse(files.find(({ path }) => path === 'sync-model/package.json')?.text ?? '{}');
    const shipped = Object.keys(manifest.dependencies ?? {});
    const forTests = [...shipped, ...Object.keys(manifest.devDependencies ?? {})];
    return modelFiles(files).flatMap((file) => {
      const packages = isTest(file) ? forTests : shipped;
      const mayImport = ({ name, target }) => {
        if (target !== null) return target.startsWith('sync-model/');
        return packages.includes(packageOf(name)) || (isTest(file) && name.startsWith('node:'));
      };
      return importsOf(file)
        .filter((each) => !mayImport(each))
        .map(({ name, line }) => `${file.path}:${line} imports ${name}`);
    });
  },
};

export const modelClock = {
  why: 'sync-model takes time and randomness in as arguments: the same input always gives the same output',
  breaches(files) {
    return modelFiles(files)
      .filter((file) => !isTest(file))
      .flatMap((file) => {
        const found = [];
        eachNode(file, (node) => {
          if (readsClockOrChance(node))
            found.push(`${file.path}:${lineOf(file, node)} has ${node.getText().slice(0, 40)}`);
        });
        return found;
      });
  },
};

function modelFiles(files) {
  return files.filter((file) => HOME.test(file.path) && isTypeScript(file));
}

function readsClockOrChance(node) {
  if (ts.isPropertyAccessExpression(node))
    return BANNED_READS.includes(node.getText().replace(/^globalThis\./, ''));
  const isDate =
    (ts.isNewExpression(node) || ts.isCallExpression(node)) && node.expression.getText() === 'Date';
  return isDate && (ts.isCallExpression(node) || (node.arguments ?? []).length === 0);
}

function packageOf(name) {
  return name
    .split('/')
    .slice(0, name.startsWith('@') ? 2 : 1)
    .join('/');
}
