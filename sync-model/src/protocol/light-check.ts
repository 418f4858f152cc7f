import { isRecordType, isWritableType } from '../records/record-types.js';
import { isStamp } from '../stamp/stamp.js';
import { CHANGES_PER_ROUND_MAX, RECORDS_PER_PAGE_MAX } from './limits.js';
import type { FeedRecord, SyncAnswer, SyncClubAnswer } from './messages.js';

type Parts = Readonly<Record<string, unknown>>;

const ROLES: readonly unknown[] = ['member', 'organizer', 'admin'];
const CODES: readonly unknown[] = [undefined, 'clock-ahead', 'protocol-too-old'];
const REFUSAL_CODES: readonly unknown[] = [
  'invalid',
  'forbidden',
  'not-found',
  'too-large',
  'whole-record-needed',
];
const KINDS: readonly unknown[] = ['club', 'my-log'];
const ID_LENGTH_MAX = 64;
const CLUBS_MAX = 1000;

/**
 * The body as a sync answer, or null where it is anything else: a captive portal's page, a truncated or
 * foreign body. Checks shape, stamps and sizes without a schema library, for the phone's first chunk. Values
 * of fields are the server's, which has checked them. Records of a type that this version does not know are
 * left out.
 */
export function asSyncAnswer(body: unknown): SyncAnswer | null {
  if (!isObject(body) || !isWhole(body.protocol, 1) || !isWhole(body.serverTime, 0)) return null;
  if (!CODES.includes(body.code) || !isListOf(body.clubs, CLUBS_MAX, isClubAnswer)) return null;
  if (!isListOf(body.goneClubs, CLUBS_MAX, isId)) return null;
  const answer = body as unknown as SyncAnswer;
  return { ...answer, clubs: answer.clubs.map(withKnownTypes) };
}

function withKnownTypes(club: SyncClubAnswer): SyncClubAnswer {
  const isKnown = ({ type }: FeedRecord) => isRecordType(type);
  return club.records.every(isKnown) ? club : { ...club, records: club.records.filter(isKnown) };
}

function isClubAnswer(club: unknown): boolean {
  if (!isObject(club) || !isId(club.clubId) || !ROLES.includes(club.role) || !isCard(club.card)) return false;
  const { historyId, headSeq, cursor, more, results, records } = club;
  if (!isId(historyId) || !isWhole(headSeq, 0) || !isWhole(cursor, 0) || cursor > headSeq) return false;
  if (typeof more !== 'boolean' || !isListOf(results, CHANGES_PER_ROUND_MAX, isResult)) return false;
  return isListOf(records, RECORDS_PER_PAGE_MAX, isFeedRecord);
}

function isCard(card: unknown): boolean {
  if (!isObject(card) || typeof card.name !== 'string' || typeof card.demo !== 'boolean') return false;
  return KINDS.includes(card.kind) && [1, 2, 3].includes(card.ituRegion as number);
}

function isResult(result: unknown): boolean {
  if (!isObject(result) || typeof result.type !== 'string' || !isWritableType(result.type)) return false;
  if (!isId(result.id)) return false;
  if (result.status === 'applied') return isWhole(result.seq, 1);
  if (result.status === 'held') return isId(result.needs);
  return (
    result.status === 'refused' && REFUSAL_CODES.includes(result.code) && typeof result.message === 'string'
  );
}

function isFeedRecord(record: unknown): boolean {
  if (!isObject(record) || typeof record.type !== 'string' || !isId(record.id)) return false;
  if (record.ownerId !== null && !isId(record.ownerId)) return false;
  if (!isWhole(record.seq, 1) || !isStamp(record.at) || !isObject(record.fields)) return false;
  return (
    record.stamps === undefined || (isObject(record.stamps) && Object.values(record.stamps).every(isStamp))
  );
}

function isObject(value: unknown): value is Parts {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function isId(value: unknown): value is string {
  return typeof value === 'string' && value.length > 0 && value.length <= ID_LENGTH_MAX;
}

function isWhole(value: unknown, least: number): value is number {
  return Number.isSafeInteger(value) && (value as number) >= least;
}

function isListOf(value: unknown, lengthMax: number, isItem: (item: unknown) => boolean): boolean {
  return Array.isArray(value) && value.length <= lengthMax && value.every(isItem);
}
