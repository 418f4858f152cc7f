import fs from 'node:fs';
import path from 'node:path';
import ts from 'typescript';

const LEFT_OUT = new Set(['node_modules', 'dist', '.git', '.data', '.screens', '.bench']);
const TEXT =
  /\.(ts|tsx|mts|mjs|js|json|css|html|md|sql|svg|txt|csv|webmanifest)$|(^|\/)(\.[a-z]+|run|LICENSE)$/;

/** All text files of the project as { path, text }, what git ignores left out. Paths are relative, with forward slashes. */
export function readProject(root) {
  return walk(root, '').map((file) => ({ path: file, text: fs.readFileSync(path.join(root, file), 'utf8') }));
}

function walk(root, folder) {
  const entries = fs.readdirSync(path.join(root, folder), { withFileTypes: true });
  return entries.flatMap((entry) => {
    const place = folder === '' ? entry.name : `${folder}/${entry.name}`;
    if (LEFT_OUT.has(entry.name) || entry.name.endsWith('.tsbuildinfo')) return [];
    if (entry.isDirectory()) return walk(root, place);
    return TEXT.test(place) ? [place] : [];
  });
}

export function isTypeScript({ path: file }) {
  return /\.tsx?$/.test(file);
}

/** Tests, and what only tests use: they may reach further than the code that ships. */
export function isTest({ path: file }) {
  return /\.test\.tsx?$|\/test-[a-z-]+\.tsx?$|^api\/test\//.test(file);
}

const parsed = new WeakMap();

/** The syntax tree of a file, parsed once. */
export function treeOf(file) {
  if (!parsed.has(file))
    parsed.set(file, ts.createSourceFile(file.path, file.text, ts.ScriptTarget.Latest, true));
  return parsed.get(file);
}

/** Calls `visit` with every node of a file. */
export function eachNode(file, visit) {
  const step = (node) => {
    visit(node);
    ts.forEachChild(node, step);
  };
  step(treeOf(file));
}

export function lineOf(file, node) {
  return treeOf(file).getLineAndCharacterOfPosition(node.getStart()).line + 1;
}

/**
 * What a file imports, types too: static and dynamic imports, re-exports, import types, require.
 * Each as { name, target, line }: `target` is the project path that a relative import or one of the model reaches, without
 * its extension; null for a package.
 */
export function importsOf(file) {
  const found = [];
  eachNode(file, (node) => {
    const literal = importedLiteral(node);
    if (!literal || !ts.isStringLiteralLike(literal)) return;
    found.push({ name: literal.text, target: targetOf(file.path, literal.text), line: lineOf(file, node) });
  });
  return found;
}

function importedLiteral(node) {
  if (ts.isImportDeclaration(node) || ts.isExportDeclaration(node)) return node.moduleSpecifier;
  if (ts.isImportTypeNode(node)) return node.argument.literal;
  if (!ts.isCallExpression(node)) return undefined;
  const isImport = node.expression.kind === ts.SyntaxKind.ImportKeyword;
  return isImport || node.expression.getText() === 'require' ? node.arguments[0] : undefined;
}

function targetOf(from, name) {
  if (name.startsWith('.')) return withoutExtension(path.posix.join(path.posix.dirname(from), name));
  const model = /^@harkmoor\/sync-model\/(.+)$/.exec(name);
  return model ? `sync-model/src/${model[1]}` : null;
}

export function withoutExtension(file) {
  return file.replace(/\.(ts|tsx|js|jsx|mjs)$/, '');
}
