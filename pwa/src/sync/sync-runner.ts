import type { DevicePorts } from '@harkmoor/sync-model/device/ports';
import { createSyncEngine } from '@harkmoor/sync-model/device/sync-round';
import { createDexieStore } from '../store/dexie-store';
import type { OpenLog } from '../store/open-log';
import { IDLE_SENDING, type SendingStatus } from '../platform/sending';
import { createHttpLink } from './http-link';
import { afterWriteDelayMs, nextRoundDelayMs, type RoundEnd } from './pacing';
import { followNotices } from './follow-notices';
import { createTabLock } from './tab-lock';

export type SyncRunner = {
  /** Asks for a round now; safe to call at any time. */
  request(): void;
  stop(): void;
};

/** Runs rounds for an account's log until stopped. A guest's log has nobody to send to and gets no runner. */
export function startSyncRunner(
  log: OpenLog,
  onStatus: (status: SendingStatus) => void,
  onRoundDone: () => void,
): SyncRunner {
  const accountId = log.account?.id;
  if (!accountId) throw new Error('a guest’s log is not sent');
  const engine = createSyncEngine(portsOf(log, accountId), { deviceId: log.deviceId, accountId });
  let status = IDLE_SENDING;
  let timer: ReturnType<typeof setTimeout> | undefined;
  let isStopped = false;
  let failures = 0;
  let isAskedMeanwhile = false;

  const tell = (change: Partial<SendingStatus>) => {
    status = { ...status, ...change };
    if (!isStopped) onStatus(status);
  };
  const wait = (delayMs: number | null) => {
    clearTimeout(timer);
    if (delayMs !== null && !isStopped) timer = setTimeout(() => void round(), delayMs);
  };

  async function round(): Promise<void> {
    if (isStopped) return;
    if (status.isRunning) {
      isAskedMeanwhile = true; // what was written since the round began may not be in it
      return;
    }
    clearTimeout(timer);
    tell({ isRunning: true });
    const watch = setInterval(() => tell({ inFlight: engine.inFlight() }), 250);
    const end = await runSafely(() => engine.runRound());
    clearInterval(watch);
    failures = end.kind === 'paused' && end.reason !== 'busy' ? failures + 1 : 0;
    const wasReached = end.kind === 'done';
    tell({
      isRunning: false,
      inFlight: new Set(),
      pause: end.kind === 'paused' ? end.reason : null,
      lastContactAt: wasReached ? Date.now() : status.lastContactAt,
    });
    if (wasReached && !isStopped) onRoundDone();
    const isWantedAgain = isAskedMeanwhile && wasReached;
    isAskedMeanwhile = false;
    wait(isWantedAgain ? 0 : nextRoundDelayMs(end, failures, Math.random()));
    if (wasReached) notices.follow();
  }

  const request = () => wait(0);
  const stopListening = listenForReasons(request, log, () => wait(afterWriteDelayMs()));
  // after a running round, since most notices tell of what that round itself sends and fetches
  const isReady = () => !isStopped && !status.isRunning && !isToldToWait(status.pause);
  const notices = followNotices(log, accountId, isReady, request);
  request();
  return {
    request,
    stop: () => {
      isStopped = true;
      clearTimeout(timer);
      stopListening();
      notices.stop();
    },
  };
}

function portsOf(log: OpenLog, accountId: string): DevicePorts {
  return {
    store: createDexieStore(log.database),
    link: createHttpLink(accountId),
    clock: { deviceNowMs: () => Date.now() },
    lock: createTabLock(log.database.name),
  };
}

/** Pauses that a notice must not cut short: the server asked for one, or a round cannot help. */
function isToldToWait(pause: SendingStatus['pause']): boolean {
  return pause === 'throttled' || pause === 'signed-out' || pause === 'protocol-too-old';
}

/** A fault of ours must never end the sending: it is shown, logged and tried again. */
async function runSafely(work: () => Promise<RoundEnd>): Promise<RoundEnd> {
  try {
    return await work();
  } catch (error) {
    console.error('a sync round failed', error);
    return { kind: 'paused', reason: 'failed' };
  }
}

function listenForReasons(request: () => void, log: OpenLog, afterWrite: () => void): () => void {
  const whenVisible = () => document.visibilityState === 'visible' && request();
  addEventListener('online', request);
  addEventListener('pageshow', request);
  document.addEventListener('visibilitychange', whenVisible);
  const stopWrites = log.writer.onWrite(afterWrite);
  return () => {
    removeEventListener('online', request);
    removeEventListener('pageshow', request);
    document.removeEventListener('visibilitychange', whenVisible);
    stopWrites();
  };
}
