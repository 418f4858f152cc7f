/** The time as the server knows it; injected, so that a test can let time pass. */
export abstract class Clock {
  /** Milliseconds UTC since 1970. */
  abstract nowMs(): number;
}

export class SystemClock extends Clock {
  override nowMs(): number {
    return Date.now();
  }
}
