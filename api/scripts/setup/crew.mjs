import { setTimeout as sleep } from 'node:timers/promises';
import { PlainFailure, printFailure } from './plain-failure.mjs';
import { endChild, startCommand } from './processes.mjs';

const STOP_SIGNALS = ['SIGINT', 'SIGTERM', 'SIGHUP'];

/** What one script started: ended in reverse order when the script is asked to end, so that nobody loses its server first. */
export class Crew {
  #members = [];
  #stopping = null;

  /** Adds a running part; `stop` ends it and resolves when it is gone. */
  add(stop) {
    this.#members.push(stop);
  }

  addChild(child) {
    this.add(() => endChild(child));
    return child;
  }

  /** Runs a command to its end; fails with a sentence when it fails. While the crew ends, it never resolves. */
  async run([command, ...args], name, env = {}) {
    const child = this.addChild(startCommand(command, args, { env }));
    const code = await child.done;
    if (this.#stopping) await new Promise(() => {});
    if (code !== 0) throw new PlainFailure(`${name} failed (${code}); the lines above say why.`);
  }

  get isStopping() {
    return this.#stopping !== null;
  }

  /** Ends all, then this process. A second call changes nothing. */
  stop(exitCode) {
    this.#stopping ??= this.#endAll().then(() => process.exit(exitCode));
    return this.#stopping;
  }

  async #endAll() {
    for (const stop of this.#members.reverse()) await stop().catch(printFailure);
  }
}

/**
 * Runs `work(crew)`. A signal, a failure, or the end of `work` ends the crew and the process: exit code 0 after a signal,
 * what `work` returned, or 1 after a failure, whose sentence is printed.
 */
export async function withCrew(work) {
  const crew = new Crew();
  // a closed terminal must not keep the rest from ending in order
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {});
  for (const signal of STOP_SIGNALS) process.on(signal, () => void crew.stop(0));
  void stopWithNpm(crew);
  try {
    await crew.stop(await work(crew));
  } catch (error) {
    if (!crew.isStopping) printFailure(error); // while all is ending, a part that ends is no failure
    await crew.stop(1);
  }
}

/** Under `npm run`, a killed npm would leave this script running: a new parent says that the old one is gone. */
async function stopWithNpm(crew) {
  const parent = process.ppid;
  if (!process.env.npm_lifecycle_event) return;
  while (process.ppid === parent) await sleep(1_000, undefined, { ref: false });
  await crew.stop(0);
}
