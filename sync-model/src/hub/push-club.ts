import type { RoundLimits } from '../protocol/limits.js';
import type { Change, ChangeResult, Refusal, SyncClubRequest } from '../protocol/messages.js';
import { checkChange, isRefusal, type CheckedChange } from './check-change.js';
import type { HubPorts } from './ports.js';
import { writeChunk, type WrittenChange, type WrittenRecord } from './write-chunk.js';

export type PushedClub = {
  readonly results: ChangeResult[];
  /** Records that the caller holds exactly as the server now does, with their `seq`: they need no echo. */
  readonly heldByCaller: ReadonlyMap<string, number>;
};

/**
 * Takes the changes of one club in transactions of at most 250. What the schema refuses never reaches one.
 * Null where the caller is no member of the club.
 */
export async function pushClub(
  ports: HubPorts,
  accountId: string,
  request: SyncClubRequest,
  { changesPerTransaction }: RoundLimits,
): Promise<PushedClub | null> {
  const changes = request.changes ?? [];
  const checks = changes.map(checkChange);
  const accepted = checks.filter((check): check is CheckedChange => !isRefusal(check));
  const written: WrittenChange[] = [];
  const heldByCaller = new Map<string, number>();
  for (let start = 0; start < accepted.length; start += changesPerTransaction) {
    const part = accepted.slice(start, start + changesPerTransaction);
    const chunk = await writeChunk(ports, request.clubId, accountId, part);
    if (!chunk) return null;
    written.push(...chunk.changes);
    for (const record of chunk.written) noteHeld(heldByCaller, record, request.cursor);
  }
  return { results: resultsOf(changes, checks, written), heldByCaller };
}

/** The caller holds the merged form where it held the stored one and all that it sent has won. */
function noteHeld(held: Map<string, number>, record: WrittenRecord, cursor: number): void {
  const { keyText, seq, storedSeq, isAsSent } = record;
  const heldBefore = storedSeq === null || storedSeq <= cursor || held.get(keyText) === storedSeq;
  if (heldBefore && isAsSent) held.set(keyText, seq);
  else held.delete(keyText);
}

function resultsOf(
  changes: readonly Change[],
  checks: readonly (CheckedChange | Refusal)[],
  written: readonly WrittenChange[],
): ChangeResult[] {
  let next = 0;
  return changes.map((change, index) => {
    const check = checks[index]!;
    return isRefusal(check) ? refusedResult(change, check) : writtenResult(change, written[next++]!);
  });
}

function refusedResult({ type, id }: Change, { code, message }: Refusal): ChangeResult {
  return { type, id, status: 'refused', code, message };
}

function writtenResult(change: Change, { outcome, seq }: WrittenChange): ChangeResult {
  const { type, id } = change;
  if (outcome.status === 'held') return { type, id, status: 'held', needs: outcome.needs };
  if (outcome.status === 'refused') return refusedResult(change, outcome);
  if (seq === null) throw new Error(`the applied record ${type}/${id} has no seq`);
  return { type, id, status: 'applied', seq };
}
