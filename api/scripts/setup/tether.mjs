// Runs a command that knows nothing of its caller, and ends the command's process group when the caller asks or is gone.
import { spawn } from 'node:child_process';

const FORCE_AFTER_MS = 8_000;
const [command, ...args] = process.argv.slice(2);
// the IPC channel stays here: a command that inherited it would keep it open
const child = spawn(command, args, { stdio: ['ignore', 'inherit', 'inherit'], detached: true });

function signalGroup(signal) {
  try {
    process.kill(-child.pid, signal);
  } catch {
    // the group has already ended
  }
}

function end() {
  signalGroup('SIGTERM');
  setTimeout(() => signalGroup('SIGKILL'), FORCE_AFTER_MS).unref();
}

child.once('error', (error) => {
  console.error(String(error));
  process.exit(1);
});
child.once('exit', (code) => {
  signalGroup('SIGKILL'); // grandchildren that outlived the command
  process.exit(code ?? 1);
});
process.on('disconnect', end);
for (const signal of ['SIGTERM', 'SIGINT', 'SIGHUP']) process.on(signal, end);
if (!process.connected) end();
