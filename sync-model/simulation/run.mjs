// npm run simulate -- --seeds N --from S: runs the fleet simulation with seeds S … S + N − 1.
import { spawnSync } from 'node:child_process';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { parseArgs } from 'node:util';

const { values } = parseArgs({
  options: { seeds: { type: 'string', default: '20000' }, from: { type: 'string', default: '1' } },
});
for (const [name, text] of Object.entries(values)) {
  if (!/^[0-9]+$/.test(text)) {
    console.error(`--${name} must be a whole number, not “${text}”.`);
    process.exit(1);
  }
}
const packageFolder = join(dirname(fileURLToPath(import.meta.url)), '..');
const vitest = join(dirname(createRequire(import.meta.url).resolve('vitest/package.json')), 'vitest.mjs');
const { status } = spawnSync(process.execPath, [vitest, 'run', 'simulation/fleet'], {
  cwd: packageFolder,
  env: { ...process.env, SEEDS: values.seeds, FROM: values.from },
  stdio: 'inherit',
});
process.exit(status ?? 1);
