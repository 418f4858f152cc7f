/** The header states whole seconds: the true moment lies somewhere within the one it names. */
const HEADER_STEP_MS = 1000;
const TIMEOUT_MS = 8000;

export type ServerTime = {
  /** Device time of the answer's middle, ms UTC. */
  deviceAt: number;
  /** true − device, ms. */
  offsetMs: number;
  uncertaintyMs: number;
};

/**
 * The device clock against the server's, by the date of an answer; null where no answer of the server comes. The
 * request is taken to have been dated half way, so half the way there and back is uncertain.
 */
export async function readServerTime(): Promise<ServerTime | null> {
  const sentAt = Date.now();
  const sentSteadyMs = performance.now();
  try {
    const signal = AbortSignal.timeout(TIMEOUT_MS);
    const response = await fetch('/api/health', { cache: 'no-store', signal });
    const tripMs = performance.now() - sentSteadyMs;
    const dated = Date.parse(response.headers.get('date') ?? '');
    // a captive portal answers too, but never with our content
    const isOurs = response.ok && (response.headers.get('content-type') ?? '').includes('json');
    if (!isOurs || Number.isNaN(dated)) return null;
    return serverTime({ sentAt, tripMs, dated });
  } catch {
    return null; // no network, or none within the time: the screen says so
  }
}

/** The offset from one dated answer: `sentAt` device ms, `tripMs` there and back, `dated` the server's second. */
export function serverTime(answer: { sentAt: number; tripMs: number; dated: number }): ServerTime {
  const deviceAt = Math.round(answer.sentAt + answer.tripMs / 2);
  return {
    deviceAt,
    offsetMs: answer.dated + HEADER_STEP_MS / 2 - deviceAt,
    uncertaintyMs: Math.round(HEADER_STEP_MS / 2 + answer.tripMs / 2),
  };
}
