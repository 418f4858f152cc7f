import { ROUND_LIMITS, type RoundLimits } from '../protocol/limits.js';
import type { SyncAnswer } from '../protocol/messages.js';
import { learnClockOffset } from './clock-offset.js';
import { leaveClub } from './leave-club.js';
import type { DevicePorts, LinkAnswer, StoreTransaction } from './ports.js';
import { prepareRound, type PreparedRound } from './prepare-round.js';
import { restampedAhead } from './restamp.js';
import { takeClubAnswer, type TakenClub } from './take-club-answer.js';

export type PauseReason =
  'unreachable' | 'signed-out' | 'throttled' | 'server-error' | 'busy' | 'protocol-too-old';

export type RoundOutcome =
  /** `more`: another round would bring or send something now. `complete`: nothing was left out or unanswered. */
  | { readonly kind: 'done'; readonly more: boolean; readonly complete: boolean }
  | { readonly kind: 'paused'; readonly reason: PauseReason; readonly retryAfterMs?: number };

export type SyncEngine = {
  /** Runs one sync round. Rejects only where the store does; nothing unsent is lost by that. */
  runRound(): Promise<RoundOutcome>;
  /** Keys `clubId/type/id` of the records that are being sent now. */
  inFlight(): ReadonlySet<string>;
};

type Identity = { readonly deviceId: string; readonly accountId: string };
type Settings = Identity & { readonly limits: RoundLimits };

const ATTEMPTS_MAX = 3;
const NOTHING_IN_FLIGHT: ReadonlySet<string> = new Set();

/**
 * The device half of the sync round. No transaction is held while the server is asked; what it answers is
 * stored club by club, each with its cursor in one transaction, so that a crash anywhere repeats at most a round.
 */
export function createSyncEngine(
  ports: DevicePorts,
  identity: Identity,
  limits: RoundLimits = ROUND_LIMITS,
): SyncEngine {
  let inFlight = NOTHING_IN_FLIGHT;
  const setInFlight = (keys: ReadonlySet<string>) => {
    inFlight = keys;
  };
  return {
    inFlight: () => inFlight,
    runRound: async () => {
      const outcome = await ports.lock.exclusively(() =>
        runAttempts(ports, { ...identity, limits }, setInFlight),
      );
      return outcome === 'busy' ? { kind: 'paused', reason: 'busy' } : outcome;
    },
  };
}

async function runAttempts(
  ports: DevicePorts,
  settings: Settings,
  setInFlight: (keys: ReadonlySet<string>) => void,
): Promise<RoundOutcome> {
  for (let attempt = 0; attempt < ATTEMPTS_MAX; attempt += 1) {
    try {
      const outcome = await attemptRound(ports, settings, setInFlight);
      if (outcome !== 'clock-ahead') return outcome;
    } finally {
      setInFlight(NOTHING_IN_FLIGHT);
    }
  }
  return { kind: 'paused', reason: 'server-error' };
}

async function attemptRound(
  ports: DevicePorts,
  settings: Settings,
  setInFlight: (keys: ReadonlySet<string>) => void,
): Promise<RoundOutcome | 'clock-ahead'> {
  const { store, clock, link } = ports;
  const prepared = await store.transaction((tx) =>
    prepareRound(tx, settings, clock.deviceNowMs(), settings.limits),
  );
  setInFlight(keysOf(prepared));
  const answer = await link.exchange(prepared.request);
  if (answer.kind !== 'answer') return paused(answer);
  if (answer.body.code === 'protocol-too-old') return { kind: 'paused', reason: 'protocol-too-old' };
  if (answer.body.code === 'clock-ahead') {
    await setClockRight(ports, settings, answer.body.serverTime);
    return 'clock-ahead';
  }
  return takeAnswer(ports, settings, prepared, answer.body);
}

function keysOf({ sent }: PreparedRound): ReadonlySet<string> {
  const keys = [...sent.values()].flatMap(({ clubId, changes }) =>
    changes.map(({ change }) => `${clubId}/${change.type}/${change.id}`),
  );
  return new Set(keys);
}

function paused(answer: Exclude<LinkAnswer, { kind: 'answer' }>): RoundOutcome {
  if (answer.kind === 'unauthorized') return { kind: 'paused', reason: 'signed-out' };
  if (answer.kind === 'throttled') {
    return { kind: 'paused', reason: 'throttled', retryAfterMs: answer.retryAfterMs };
  }
  return { kind: 'paused', reason: answer.kind };
}

/** One transaction: the offset is kept and every unsent stamp that is ahead gets a new one. */
async function setClockRight({ store, clock }: DevicePorts, { deviceId }: Identity, serverTimeMs: number) {
  await store.transaction(async (tx: StoreTransaction) => {
    await learnClockOffset(tx, serverTimeMs, clock.deviceNowMs());
    const owed = [];
    for (const { clubId } of await tx.clubs()) owed.push(...(await tx.owed(clubId)));
    const restamped = restampedAhead(owed, deviceId, serverTimeMs);
    if (restamped.length > 0) await tx.putRecords(restamped);
  });
}

async function takeAnswer(
  { store, clock }: DevicePorts,
  { accountId }: Identity,
  { sent }: PreparedRound,
  body: SyncAnswer,
): Promise<RoundOutcome> {
  await store.transaction((tx) => learnClockOffset(tx, body.serverTime, clock.deviceNowMs()));
  const taken: TakenClub[] = [];
  for (const club of body.clubs) {
    const deviceNowMs = clock.deviceNowMs();
    const settings = { accountId, deviceNowMs, serverTimeMs: body.serverTime };
    taken.push(await store.transaction((tx) => takeClubAnswer(tx, club, sent.get(club.clubId), settings)));
  }
  for (const clubId of body.goneClubs) await store.transaction((tx) => leaveClub(tx, clubId));
  return {
    kind: 'done',
    more: taken.some(({ more }) => more),
    complete: taken.every(({ complete }) => complete),
  };
}
