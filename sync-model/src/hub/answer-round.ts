import { ROUND_LIMITS, type RoundLimits } from '../protocol/limits.js';
import type { SyncAnswer, SyncClubRequest, SyncRequest } from '../protocol/messages.js';
import { PROTOCOL_VERSION, PROTOCOL_VERSION_OLDEST } from '../protocol/version.js';
import { STAMP_AHEAD_MS_MAX, stampWallMs } from '../stamp/stamp.js';
import type { HubPorts } from './ports.js';
import { pullClubs } from './pull-clubs.js';
import { pushClub, type PushedClub } from './push-club.js';

/**
 * The server half of one sync round: takes the changes, then answers with what the caller does not hold yet.
 * `request` has passed the border's schema. Repeating a round changes nothing. Rejects only where the store
 * does; what was committed until then is answered as applied when the round comes again.
 */
export async function answerRound(
  ports: HubPorts,
  caller: { readonly accountId: string },
  request: SyncRequest,
  limits: RoundLimits = ROUND_LIMITS,
): Promise<SyncAnswer> {
  const serverTime = ports.nowMs();
  const envelope = { protocol: PROTOCOL_VERSION, serverTime };
  if (request.protocol < PROTOCOL_VERSION_OLDEST) {
    return { ...envelope, code: 'protocol-too-old', clubs: [], goneClubs: [] };
  }
  if (request.clubs.some((club) => isAhead(club, serverTime))) {
    return { ...envelope, code: 'clock-ahead', clubs: [], goneClubs: [] };
  }
  const pushed = new Map<string, PushedClub>();
  for (const club of request.clubs) {
    if (!club.changes?.length) continue;
    const result = await pushClub(ports, caller.accountId, club, limits);
    if (result) pushed.set(club.clubId, result);
  }
  const pulled = await ports.store.read((snapshot) =>
    pullClubs(snapshot, caller.accountId, request.clubs, pushed, limits),
  );
  return { ...envelope, ...pulled };
}

function isAhead(club: SyncClubRequest, serverTimeMs: number): boolean {
  const latestMs = serverTimeMs + STAMP_AHEAD_MS_MAX;
  return (club.changes ?? []).some(({ at, stamps }) =>
    [at, ...Object.values(stamps ?? {})].some((stamp) => stampWallMs(stamp) > latestMs),
  );
}
