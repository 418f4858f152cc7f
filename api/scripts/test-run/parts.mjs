import path from 'node:path';

const VITEST = 'node_modules/vitest/vitest.mjs';
const JEST = 'node_modules/jest/bin/jest.js';

/**
 * The parts of `npm test`: a command, the folder it runs in, how long it may take, and how its counts are read.
 * `report` is where the runner writes its JSON; a part without one prints its counts as its last line.
 */
export function testParts(root, reportFolder) {
  const vitest = (name, limitMinutes) => {
    const report = path.join(reportFolder, `${name}.json`);
    const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
    return {
      name,
      folder: name,
      command: [process.execPath, path.join(root, VITEST), 'run', ...reporters],
      report,
      limitMinutes,
    };
  };
  const apiReport = path.join(reportFolder, 'api.json');
  const jest = [process.execPath, '--experimental-vm-modules', '--no-warnings', path.join(root, JEST)];
  return [
    vitest('sync-model', 7),
    vitest('pwa', 6),
    {
      name: 'api',
      folder: 'api',
      command: [...jest, '--json', `--outputFile=${apiReport}`],
      report: apiReport,
      limitMinutes: 8,
    },
    {
      name: 'journeys',
      folder: '.',
      command: [process.execPath, path.join(root, 'pwa/e2e/run.mjs')],
      report: null,
      limitMinutes: 10,
    },
  ];
}
