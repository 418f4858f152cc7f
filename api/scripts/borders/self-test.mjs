// Shows that each border is seen when it is crossed: breaches are planted in small projects that live in memory.
import { PLANTED } from './planted-breaches.mjs';
import { RULES } from './rules.mjs';

const failures = [];
let count = 0;
for (const [name, rule] of Object.entries(RULES)) {
  const { breach = [], fine = [] } = PLANTED[name] ?? {};
  if (breach.length === 0) failures.push(`${name} has no planted breach`);
  for (const project of breach)
    if (!isBreached(rule, project)) failures.push(`${name} overlooks ${shown(project)}`);
  for (const project of fine)
    if (isBreached(rule, project)) failures.push(`${name} refuses ${shown(project)}`);
  count += breach.length + fine.length;
}
if (failures.length > 0) console.error(failures.join('\n'));
console.log(`${count} planted projects, ${failures.length} judged wrongly`);
process.exitCode = failures.length > 0 ? 1 : 0;

function isBreached(rule, project) {
  return rule.breaches(project.map(([path, text]) => ({ path, text }))).length > 0;
}

function shown(project) {
  const [path, text] = project.at(-1);
  return `${path}: ${text.slice(0, 90)}`;
}
