// Holds the project against its borders (architecture as a test). Each breach is printed below the reason of its rule.
import path from 'node:path';
import { RULES } from './borders/rules.mjs';
import { readProject } from './borders/source-files.mjs';

const files = readProject(path.resolve(import.meta.dirname, '../..'));
let count = 0;
for (const { why, breaches } of Object.values(RULES)) {
  const found = [...new Set(breaches(files))];
  count += found.length;
  if (found.length > 0) console.error(`\n${why}:\n  ${found.join('\n  ')}`);
}
console.log(`${Object.keys(RULES).length} borders, ${files.length} files, ${count} breaches`);
process.exitCode = count > 0 ? 1 : 0;
