import { execFileSync } from 'node:child_process';
import os from 'node:os';

/** On what and of what the figures are: a figure without its machine says nothing. */
export function machine(chromiumVersion) {
  return {
    date: new Date().toISOString(),
    commit: execFileSync('git', ['describe', '--always', '--dirty'], { encoding: 'utf8' }).trim(),
    cpu: `${os.cpus().length} × ${os.cpus()[0]?.model.trim()}`,
    memoryGiB: Math.round(os.totalmem() / 2 ** 30),
    loadBefore: os.loadavg().map((each) => Number(each.toFixed(1))),
    system: `${os.type()} ${os.release()}`,
    node: process.version,
    chromium: chromiumVersion,
  };
}
