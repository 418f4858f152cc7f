import ts from 'typescript';
import { API_DOORS } from './api-doors.mjs';
import { eachNode, importsOf, isTest, isTypeScript, withoutExtension } from './source-files.mjs';

/**
 * What a feature of the API shows to the others: its module file, the files of the classes in that module's
 * `exports: […]`, and the few files that api-doors.mjs names (what Nest cannot export: decorators, entities, types).
 */
export const apiFeatures = {
  why: "a feature of the API reaches another through its module's exports (or a door named in api/scripts/borders/api-doors.mjs)",
  breaches(files) {
    return crossings(files)
      .filter(
        ({ from, to, target }) => from !== 'sync' && to !== 'platform' && !doorsOf(files, to).has(target),
      )
      .map(({ text }) => text);
  },
};

export const apiSync = {
  why: 'the sync module imports no feature: features register their record types with it',
  breaches(files) {
    return crossings(files)
      .filter(({ from, to }) => from === 'sync' && to !== 'platform')
      .map(({ text }) => text);
  },
};

export const apiPlatform = {
  why: 'the platform of the API lies below the features and imports none',
  breaches(files) {
    return crossings(files)
      .filter(({ from }) => from === 'platform')
      .map(({ text }) => text);
  },
};

export const apiDirection = {
  why: 'the API knows nothing of the app, and entities nothing of HTTP',
  breaches(files) {
    return apiFiles(files).flatMap((file) =>
      importsOf(file)
        .filter(({ name, target }) => {
          const isApp = target?.startsWith('pwa/') || /^(react|@ionic|dexie|@harkmoor\/pwa)/.test(name);
          return isApp || (/\.(entity|row)\.ts$/.test(file.path) && name.startsWith('@nestjs'));
        })
        .map(({ name, line }) => `${file.path}:${line} imports ${name}`),
    );
  },
};

/** Imports from one folder of api/src into another, tests left out. */
function crossings(files) {
  return apiFiles(files)
    .filter((file) => !isTest(file))
    .flatMap((file) =>
      importsOf(file).flatMap(({ name, target, line }) => {
        const [from, to] = [folderOf(file.path), target && folderOf(target)];
        if (!from || !to || from === to) return [];
        return [{ from, to, target, text: `${file.path}:${line} imports ${name}` }];
      }),
    );
}

function apiFiles(files) {
  return files.filter((file) => file.path.startsWith('api/src/') && isTypeScript(file));
}

function folderOf(place) {
  return /^api\/src\/([^/]+)\/./.exec(place)?.[1];
}

function doorsOf(files, feature) {
  const home = `api/src/${feature}/`;
  const moduleFile = files.find(({ path }) => path === `${home}${feature}.module.ts`);
  const named = (API_DOORS[feature] ?? []).map((file) => withoutExtension(home + file));
  return new Set([`${home}${feature}.module`, ...named, ...(moduleFile ? exportedFiles(moduleFile) : [])]);
}

/** The files that hold the classes named in `exports: […]` of a module. */
function exportedFiles(moduleFile) {
  const exported = new Set();
  const origins = new Map();
  eachNode(moduleFile, (node) => {
    if (
      ts.isPropertyAssignment(node) &&
      node.name.getText() === 'exports' &&
      ts.isArrayLiteralExpression(node.initializer)
    ) {
      for (const element of node.initializer.elements) exported.add(element.getText());
    }
    if (ts.isImportSpecifier(node))
      origins.set(node.name.text, node.parent.parent.parent.moduleSpecifier.text);
  });
  const all = importsOf(moduleFile);
  return [...exported].flatMap((name) => all.find((each) => each.name === origins.get(name))?.target ?? []);
}
