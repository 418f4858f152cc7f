import type { Violation } from './oracle.js';
import type { RareState } from './rare-states.js';

/** What became of one seed. */
export type RunResult = {
  readonly seed: number;
  readonly violations: readonly Violation[];
  readonly reached: ReadonlySet<RareState>;
  readonly traceHash: string;
  readonly steps: number;
};
