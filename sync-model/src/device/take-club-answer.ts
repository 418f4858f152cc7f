import type { SyncClubAnswer } from '../protocol/messages.js';
import { isWritableType, parentsOf } from '../records/record-types.js';
import { owedAnew } from './owed-change.js';
import type { ClubState, RecordKey, StoreTransaction } from './ports.js';
import type { SentClub } from './prepare-round.js';
import type { StoredRecord } from './stored-record.js';
import { withPulled } from './take-record.js';
import { withResult } from './take-result.js';

export type TakenClub = {
  /** Another round would bring or send something now. */
  readonly more: boolean;
  /** Every change that was pending when the round began is answered, and no page is left. */
  readonly complete: boolean;
};

export type TakenWith = {
  readonly accountId: string;
  readonly deviceNowMs: number;
  readonly serverTimeMs: number;
};

/**
 * Stores one club's answer: results, page, cursor and card, all in the transaction that is handed in. Nothing
 * is stored of a club that has left the phone meanwhile.
 */
export async function takeClubAnswer(
  tx: StoreTransaction,
  answer: SyncClubAnswer,
  sent: SentClub | undefined,
  taken: TakenWith,
): Promise<TakenClub> {
  const club = (await tx.clubs()).find(({ clubId }) => clubId === answer.clubId);
  if (!sent) return takeNewClub(tx, answer, club);
  if (!club) return { more: false, complete: false };
  const records = await touchedRecords(tx, answer, sent);
  const hasOwedAnew = takeResults(records, answer, sent, taken);
  takePage(records, answer, taken.accountId);
  const states = [...records.values()].filter((record) => record !== undefined);
  if (states.length > 0) await tx.putRecords(states);
  const unsettled = sent.changes.map(
    ({ change }) => records.get(`${change.type}/${change.id}`)?.debt?.status,
  );
  const isWaiting = unsettled.includes('waiting') || sent.hasLeftover || hasOwedAnew;
  const isAnswered = !isWaiting && !sent.hasWaiting && !unsettled.includes('held');
  const complete = isAnswered && !answer.more;
  await tx.putClub({
    ...cardOf(answer),
    cursor: answer.cursor,
    completeAt: complete ? taken.serverTimeMs : club.completeAt,
  });
  return { more: answer.more || isWaiting, complete };
}

function cardOf({ clubId, role, card, historyId }: SyncClubAnswer) {
  return { clubId, role, card, historyId };
}

/** A club that was not asked for is new on this phone; its first page comes with the next round. */
async function takeNewClub(
  tx: StoreTransaction,
  answer: SyncClubAnswer,
  club: ClubState | undefined,
): Promise<TakenClub> {
  if (!club) await tx.putClub({ ...cardOf(answer), cursor: 0, completeAt: null });
  return { more: !club, complete: false };
}

type Touched = Map<string, StoredRecord | undefined>;

async function touchedRecords(
  tx: StoreTransaction,
  answer: SyncClubAnswer,
  sent: SentClub,
): Promise<Touched> {
  const { clubId } = answer;
  const keys = new Map<string, RecordKey>();
  const add = ({ type, id }: Omit<RecordKey, 'clubId'>) => keys.set(`${type}/${id}`, { clubId, type, id });
  for (const { change } of sent.changes) add(change);
  answer.results.forEach((result, index) => {
    if (result.status === 'held') for (const parent of neededParents(sent, index, result.needs)) add(parent);
  });
  for (const record of answer.records) add(record);
  const stored = await tx.records([...keys.values()]);
  return new Map([...keys.keys()].map((key, index) => [key, stored[index]]));
}

type Parent = { readonly type: RecordKey['type']; readonly id: string };

function neededParents(sent: SentClub, index: number, needs: string): Parent[] {
  const change = sent.changes[index]?.change;
  return change ? parentsOf(change.type, change.fields).filter(({ id }) => id === needs) : [];
}

/** Answers true where parents go again that the server once had. */
function takeResults(records: Touched, answer: SyncClubAnswer, sent: SentClub, taken: TakenWith): boolean {
  let hasOwedAnew = false;
  answer.results.forEach((result, index) => {
    const owed = sent.changes[index];
    if (owed?.change.type !== result.type || owed.change.id !== result.id) return;
    const key = `${result.type}/${result.id}`;
    const record = records.get(key);
    if (record) records.set(key, withResult(record, owed, result, taken));
    if (result.status !== 'held') return;
    const parents = neededParents(sent, index, result.needs);
    hasOwedAnew = parents.map((parent) => oweParent(records, parent, taken)).includes(true) || hasOwedAnew;
  });
  return hasOwedAnew;
}

/** A parent of ours that the server once had and does not know any more goes again, whole. */
function oweParent(records: Touched, { type, id }: Parent, taken: TakenWith): boolean {
  const parent = records.get(`${type}/${id}`);
  if (!parent || parent.seq === 0 || parent.debt || parent.ownerId !== taken.accountId) return false;
  records.set(`${type}/${id}`, owedAnew(parent, taken.deviceNowMs));
  return true;
}

function takePage(records: Touched, answer: SyncClubAnswer, accountId: string): void {
  for (const pulled of answer.records) {
    const key = `${pulled.type}/${pulled.id}`;
    const stored = withPulled(answer.clubId, accountId, records.get(key), pulled);
    const { type, debt } = stored;
    if (debt && !isWritableType(type)) throw new Error(`a record of type ${type} owes nothing`);
    records.set(key, stored);
  }
}
