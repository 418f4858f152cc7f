import fs from 'node:fs';
import path from 'node:path';

/** Prints where everything is: lines of [label, value], then the demo's sign-ins of each role. */
export function announce(lines, dataFolder) {
  console.log('\nHarkmoor is ready.\n');
  printTable(lines);
  const signIns = demoSignIns(dataFolder);
  if (signIns.length > 0) {
    console.log('\n  Demo sign-ins');
    printTable([
      ['role', 'name', 'e-mail', 'password'],
      ...signIns.map((s) => [s.role, s.name, s.email, s.password]),
    ]);
  }
  console.log('\nCtrl-C stops everything and keeps the data.\n');
}

/** What the demo wrote down: [{ role, email, password, name }], or nothing. */
function demoSignIns(dataFolder) {
  const file = path.join(dataFolder, 'demo-sign-ins.json');
  return fs.existsSync(file) ? JSON.parse(fs.readFileSync(file, 'utf8')) : [];
}

function printTable(rows) {
  const widths = rows[0].map((_, column) => Math.max(...rows.map((row) => row[column].length)));
  for (const row of rows)
    console.log(
      `  ${row
        .map((cell, column) => cell.padEnd(widths[column]))
        .join('  ')
        .trimEnd()}`,
    );
}
