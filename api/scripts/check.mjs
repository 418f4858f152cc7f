// npm run check: types, lint, format and borders. All are run, so that one reading shows all that is to mend.
import './setup/node-version.mjs';
import path from 'node:path';
import { TSC } from './setup/build.mjs';
import { withCrew } from './setup/crew.mjs';
import { installPackages } from './setup/install.mjs';
import { startCommand } from './setup/processes.mjs';

const CHECKS = {
  types: [TSC, '-b'],
  lint: ['node_modules/eslint/bin/eslint.js', '--max-warnings', '0', '.'],
  format: ['node_modules/prettier/bin/prettier.cjs', '--check', '--log-level', 'warn', '.'],
  'borders, tested': ['api/scripts/borders/self-test.mjs'],
  borders: ['api/scripts/borders.mjs'],
};

const root = path.resolve(import.meta.dirname, '../..');
process.chdir(root);

await withCrew(async (crew) => {
  await installPackages(root, crew.run.bind(crew));
  const results = [];
  for (const [name, args] of Object.entries(CHECKS)) {
    const startedMs = performance.now();
    const exitCode = await crew.addChild(startCommand(process.execPath, args)).done;
    results.push({ name, exitCode, minutes: (performance.now() - startedMs) / 60_000 });
  }
  console.log('\n── minutes by check');
  for (const { name, exitCode, minutes } of results)
    console.log(
      `${name.padEnd(16)} ${minutes.toFixed(1).padStart(5)}   ${exitCode === 0 ? 'well' : 'FAILED'}`,
    );
  return results.every(({ exitCode }) => exitCode === 0) ? 0 : 1;
});
