import { Clock } from '../src/platform/clock/clock.js';

/** The real time, moved on by as much as a test lets pass. */
export class SettableClock extends Clock {
  private passedMs = 0;

  override nowMs(): number {
    return Date.now() + this.passedMs;
  }

  pass(ms: number): void {
    this.passedMs += ms;
  }
}
