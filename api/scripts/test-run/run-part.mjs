import fs from 'node:fs';
import path from 'node:path';
import { endChild, startCommand } from '../setup/processes.mjs';
import { countsOf } from './counts.mjs';

/**
 * Runs one part with its output shown as it comes. Resolves to { name, minutes, passed, failed, skipped, isLate }.
 */
export async function runPart(crew, root, part) {
  console.log(`\n── ${part.name}`);
  const startedMs = performance.now();
  if (part.report) fs.rmSync(part.report, { force: true });
  const { exitCode, lastLine, isLate } = await runCommand(crew, root, part);
  const counts = countsOf({ exitCode, reportPath: part.report, lastLine });
  if (isLate) console.error(`${part.name} took longer than its ${part.limitMinutes} minutes and was ended.`);
  return { name: part.name, minutes: (performance.now() - startedMs) / 60_000, ...counts };
}

async function runCommand(crew, root, { command: [program, ...args], folder, report, limitMinutes }) {
  const options = { folder: path.join(root, folder), output: report ? 'inherit' : 'pipe' };
  const child = crew.addChild(startCommand(program, args, options));
  const tail = child.stdout ? showAndKeepLastLine(child.stdout) : { lastLine: '' };
  let isLate = false;
  const limit = setTimeout(() => {
    isLate = true;
    void endChild(child);
  }, limitMinutes * 60_000);
  const exitCode = await child.done;
  clearTimeout(limit);
  await tail.ended;
  return { exitCode, lastLine: tail.lastLine, isLate };
}

/** Passes a stream on; its last line that is not empty is kept. */
function showAndKeepLastLine(stream) {
  const tail = { lastLine: '', ended: new Promise((resolve) => stream.once('close', resolve)) };
  let rest = '';
  stream.setEncoding('utf8').on('data', (text) => {
    process.stdout.write(text);
    const lines = (rest + text).split('\n');
    rest = lines.at(-1);
    tail.lastLine = lines.filter((line) => line.trim() !== '').at(-1) ?? tail.lastLine;
  });
  return tail;
}
