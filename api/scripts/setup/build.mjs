import { createHash } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';

const STAMP = 'node_modules/.harkmoor-build';
const OUTPUTS = ['sync-model/dist', 'api/dist/src/main.js', 'pwa/dist/index.html'];
const INPUTS = [
  ...['package-lock.json', 'tsconfig.base.json', '.browserslistrc'],
  ...['sync-model/package.json', 'sync-model/tsconfig.json', 'sync-model/src'],
  ...['api/package.json', 'api/tsconfig.json', 'api/src', 'api/migrations', 'api/scripts/demo'],
  ...['pwa/package.json', 'pwa/vite.config.ts', 'pwa/index.html', 'pwa/src', 'pwa/public'],
];

export const TSC = 'node_modules/typescript/bin/tsc';
export const VITE = 'node_modules/vite/bin/vite.js';

/**
 * Builds model, API and app when their inputs changed since the last build or an output is missing.
 * `run(command, name, env)` starts a command and resolves at its end, or rejects.
 */
export async function buildAll(root, run) {
  const stampPath = path.join(root, STAMP);
  const wanted = inputsDigest(root);
  const standing = OUTPUTS.every((output) => fs.existsSync(path.join(root, output)));
  if (standing && fs.existsSync(stampPath) && fs.readFileSync(stampPath, 'utf8') === wanted) return;
  console.log('Building …');
  fs.rmSync(stampPath, { force: true });
  await buildServer(run);
  // said here, because a NODE_ENV of the caller would otherwise bring React's slow build for development
  const env = { NODE_ENV: 'production' };
  await run([process.execPath, VITE, 'build', '--logLevel', 'warn', 'pwa'], 'the build of the app', env);
  fs.writeFileSync(stampPath, wanted);
}

/** Compiles the model and the API. */
export function buildServer(run) {
  return run([process.execPath, TSC, '-b', 'sync-model', 'api'], 'the build of the API');
}

function inputsDigest(root) {
  const hash = createHash('sha256');
  for (const file of INPUTS.flatMap((input) => filesOf(path.join(root, input)))) {
    hash
      .update(`${path.relative(root, file)}\0`)
      .update(fs.readFileSync(file))
      .update('\0');
  }
  return hash.digest('hex');
}

function filesOf(place) {
  if (!fs.existsSync(place)) return [];
  if (!fs.statSync(place).isDirectory()) return [place];
  const entries = fs.readdirSync(place, { recursive: true, withFileTypes: true });
  return entries
    .filter((entry) => entry.isFile())
    .map((entry) => path.join(entry.parentPath ?? entry.path, entry.name))
    .sort();
}
