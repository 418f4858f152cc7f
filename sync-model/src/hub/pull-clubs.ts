import type { RoundLimits } from '../protocol/limits.js';
import type { SyncClubAnswer, SyncClubRequest } from '../protocol/messages.js';
import type { HubClub, HubSnapshot } from './ports.js';
import type { PushedClub } from './push-club.js';
import { keyText } from './working-set.js';
import { isWritableType } from '../records/record-types.js';
import type { Role } from '../records/member.js';

type Membership = { readonly clubId: string; readonly role: Role; readonly club: HubClub };

/**
 * What one snapshot holds for the caller: a page for each club that the request names, and the card alone of
 * each club that it does not. At most 1 000 records over all clubs, in the order of the request.
 */
export async function pullClubs(
  snapshot: HubSnapshot,
  accountId: string,
  requests: readonly SyncClubRequest[],
  pushed: ReadonlyMap<string, PushedClub>,
  limits: RoundLimits,
): Promise<{ clubs: SyncClubAnswer[]; goneClubs: string[] }> {
  const memberships = new Map((await snapshot.memberships(accountId)).map((one) => [one.clubId, one]));
  const clubs: SyncClubAnswer[] = [];
  const goneClubs: string[] = [];
  let budget = limits.recordsPerPage;
  for (const request of requests) {
    const membership = memberships.get(request.clubId);
    if (!membership) {
      goneClubs.push(request.clubId);
      continue;
    }
    memberships.delete(request.clubId);
    const from = pastOwn(startOf(request, membership.club), pushed.get(request.clubId));
    const page = await pageOf(snapshot, from, membership, budget);
    budget -= page.taken;
    clubs.push(answerOf(membership, page, pushed.get(request.clubId)));
  }
  for (const membership of memberships.values()) clubs.push(answerOf(membership, UNASKED, undefined));
  return { clubs, goneClubs };
}

type Page = Pick<SyncClubAnswer, 'records' | 'cursor' | 'more'> & { readonly taken: number };

const UNASKED: Page = { records: [], cursor: 0, more: true, taken: 0 };

async function pageOf(
  snapshot: HubSnapshot,
  from: number,
  { clubId, club }: Membership,
  limit: number,
): Promise<Page> {
  if (limit === 0 || from === club.seq) return { records: [], cursor: from, more: from < club.seq, taken: 0 };
  const records = await snapshot.page(clubId, from, limit);
  const isLast = records.length < limit;
  const cursor = isLast ? club.seq : records.at(-1)!.seq;
  return { records, cursor, more: cursor < club.seq, taken: records.length };
}

/** A cursor of another history, or one that this history has not reached, means nothing here: from the start. */
function startOf(request: SyncClubRequest, club: HubClub): number {
  const isOtherHistory = request.historyId !== null && request.historyId !== club.historyId;
  return isOtherHistory || request.cursor > club.seq ? 0 : request.cursor;
}

/**
 * Past what the caller wrote in this round right after its cursor: it holds those records, so they need not be
 * read. A place in the feed belongs to one record for ever; one that was left since has nothing to send.
 */
function pastOwn(from: number, pushed: PushedClub | undefined): number {
  if (!pushed) return from;
  const own = new Set(pushed.heldByCaller.values());
  let last = from;
  while (own.has(last + 1)) last += 1;
  return last;
}

function answerOf(
  { clubId, role, club }: Membership,
  page: Page,
  pushed: PushedClub | undefined,
): SyncClubAnswer {
  const { records, cursor, more } = page;
  return {
    clubId,
    role,
    card: club.card,
    historyId: club.historyId,
    headSeq: club.seq,
    results: pushed?.results ?? [],
    records: pushed ? records.filter((record) => !isEcho(record, pushed)) : records,
    cursor,
    more,
  };
}

function isEcho({ type, id, seq }: SyncClubAnswer['records'][number], pushed: PushedClub): boolean {
  return isWritableType(type) && pushed.heldByCaller.get(keyText({ type, id })) === seq;
}
