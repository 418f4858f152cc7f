import type { Random } from './random.js';

/** One run of one machine, from its start to its crash. What belongs to a dead life never goes on. */
export type Life = { readonly name: string; isDead: boolean };

/** Where every port call waits for its turn. */
export type Steps = { step(life: Life, label: string): Promise<void> };

/** Nothing waits: for tests of one thing at a time. */
export const NO_WAITING: Steps = { step: () => Promise.resolve() };

type Step = { readonly life: Life; readonly label: string; readonly resume: () => void };

/**
 * Owns every resolution of every port call. Each awaited port call of every machine is one step here; the
 * seed decides which goes next, so that any interleaving, and a crash between any two calls, can happen.
 */
export class Scheduler implements Steps {
  private steps: Step[] = [];
  private hash = 0x811c9dc5;
  count = 0;

  constructor(private readonly random: Random) {}

  /** Waits for its turn; for ever where the machine has died. */
  step(life: Life, label: string): Promise<void> {
    return new Promise((resolve) => {
      if (!life.isDead) this.steps.push({ life, label, resume: resolve });
    });
  }

  get waiting(): number {
    return this.steps.length;
  }

  kill(life: Life): void {
    life.isDead = true;
    this.steps = this.steps.filter((step) => step.life !== life);
    this.note(`kill ${life.name}`);
  }

  /** Lets one waiting step go on, and waits until everything that follows of it waits again. */
  async runOne(): Promise<void> {
    const index = this.random.below(this.steps.length);
    const step = this.steps[index]!;
    this.steps[index] = this.steps.at(-1)!;
    this.steps.pop();
    this.note(`${step.life.name}:${step.label}`);
    this.count += 1;
    step.resume();
    await settled();
  }

  /** Adds to the trace, which must be the same whenever the seed is. */
  note(text: string): void {
    for (let i = 0; i < text.length; i += 1) {
      this.hash = Math.imul(this.hash ^ text.charCodeAt(i), 0x01000193) >>> 0;
    }
  }

  get traceHash(): string {
    return this.hash.toString(16).padStart(8, '0');
  }
}

/** Resolves when no promise is left that could go on by itself. */
export function settled(): Promise<void> {
  return new Promise((resolve) => setImmediate(resolve));
}
