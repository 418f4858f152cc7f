import type { StoredRecord } from '../src/device/stored-record.js';
import { CLUB, idOf } from './people.js';
import { read, type Act, type Phone } from './phone.js';
import type { Random } from './random.js';
import { SAMPLES, TEXT_FIELDS } from './sample-fields.js';

/** Makes ids and texts that no other act of the run has used. */
export type Novelty = { id(): string; text(): string };

export function noveltyOf(): Novelty {
  let made = 0x1000;
  return { id: () => idOf((made += 1)), text: () => `t${(made += 1)}` };
}

type ActKind = 'reception' | 'edit' | 'delete' | 'move' | 'gear' | 'site' | 'list' | 'publish' | 'target';

const WEIGHTS: Readonly<Record<ActKind, number>> = {
  reception: 3,
  edit: 10,
  delete: 2,
  move: 1,
  gear: 1,
  site: 1,
  list: 0.5,
  publish: 0.7,
  target: 1,
};

/** Few records are made and few fields touched, so that the phones meet on them. */
const RECORDS_MAX = 14;

/** One act of a person on what their phone holds, or null where there is nothing to do it with. */
export function chooseAct(phone: Phone, random: Random, novelty: Novelty): Act | null {
  const clubIds = [...phone.disk.state.clubs.keys()];
  if (clubIds.length === 0) return null;
  const clubId = clubIds.includes(CLUB) && random.chance(0.85) ? CLUB : random.pick(clubIds);
  const held = phone.records().filter((record) => record.clubId === clubId);
  const kind = random.weighted(WEIGHTS);
  const isFull = held.filter(({ type }) => type !== 'history').length >= RECORDS_MAX;
  if (isFull || kind === 'edit' || kind === 'delete' || kind === 'move' || kind === 'publish') {
    return changing(kind, phone, held, random, novelty);
  }
  const act = making(kind, clubId, held, random, novelty);
  // A form that was open when the club left the phone is not saved into it any more.
  return async (tx, write) => {
    if ((await tx.clubs()).some((club) => club.clubId === clubId)) await act(tx, write);
  };
}

function making(
  kind: ActKind,
  clubId: string,
  held: readonly StoredRecord[],
  random: Random,
  novelty: Novelty,
): Act {
  const [text, first, second, third] = [novelty.text(), novelty.id(), novelty.id(), novelty.id()];
  const one = (type: StoredRecord['type']) => {
    const found = held.filter((record) => record.type === type && record.fields.deleted !== true);
    return found.length > 0 ? random.pick(found).id : null;
  };
  const list = one('target-list');
  if (kind === 'site' || !one('site')) {
    // Sometimes a name that no server takes: what is logged there is held until the name is mended.
    const name = random.chance(0.2) ? text.padEnd(61, '.') : text;
    return async (tx, { make }) => tx.putRecords([make(clubId, 'site', first, SAMPLES.site(name))]);
  }
  if (kind === 'gear' || !one('setup')) {
    return async (tx, { make }) =>
      tx.putRecords([
        make(clubId, 'receiver', first, SAMPLES.receiver(text)),
        make(clubId, 'antenna', second, SAMPLES.antenna(text)),
        make(clubId, 'setup', third, SAMPLES.setup(first, second)),
      ]);
  }
  if (kind === 'list' || (kind === 'target' && !list)) {
    return async (tx, { make }) =>
      tx.putRecords([make(clubId, 'target-list', first, SAMPLES['target-list'](text))]);
  }
  if (kind === 'target' && list) {
    return async (tx, { make }) => tx.putRecords([make(clubId, 'target', first, SAMPLES.target(text, list))]);
  }
  const [siteId, setupId] = [one('site')!, one('setup')!];
  return async (tx, { make }) =>
    tx.putRecords([make(clubId, 'reception', first, SAMPLES.reception(siteId, setupId))]);
}

function changing(
  kind: ActKind,
  phone: Phone,
  held: readonly StoredRecord[],
  random: Random,
  novelty: Novelty,
): Act | null {
  const mine = held.filter((record) => mayEdit(phone, record, held));
  const wanted = mine.filter(({ type }) => fits(kind, type));
  if (wanted.length === 0) return null;
  const record = random.chance(0.7) ? oldestOf(random.pick(wanted).type, wanted) : random.pick(wanted);
  const refused = wanted.find(({ debt }) => debt?.code === 'invalid');
  if (refused && random.chance(0.5)) return mending(refused, novelty);
  const patch = patchOf(kind, record, held, random, novelty);
  return async (tx, { edit }) => {
    const now = await read(tx, record);
    if (now) await tx.putRecords([edit(now, patch)]);
  };
}

/** Most edits go to the oldest record of a type, so that the phones meet there. */
function oldestOf(type: string, records: readonly StoredRecord[]): StoredRecord {
  return records
    .filter((record) => record.type === type)
    .reduce((first, one) => (one.id < first.id ? one : first));
}

/** A person gives a refused site a name that the server takes. */
function mending(record: StoredRecord, novelty: Novelty): Act {
  const name = novelty.text();
  return async (tx, { edit }) => {
    const now = await read(tx, record);
    if (now) await tx.putRecords([edit(now, { name })]);
  };
}

function fits(kind: ActKind, type: string): boolean {
  if (kind === 'move') return type === 'reception';
  if (kind === 'publish') return type === 'target-list';
  return type in TEXT_FIELDS;
}

/** As the screens do it: own records, targets of published lists, and of one's own drafts. */
function mayEdit(phone: Phone, record: StoredRecord, held: readonly StoredRecord[]): boolean {
  if (record.type === 'target' || record.type === 'target-list') {
    const listId = record.type === 'target' ? record.fields.listId : record.id;
    const list = held.find(({ type, id }) => type === 'target-list' && id === listId);
    return (
      list !== undefined && (typeof list.fields.publishedAt === 'number' || list.ownerId === phone.accountId)
    );
  }
  return record.type !== 'history' && record.ownerId === phone.accountId;
}

function patchOf(
  kind: ActKind,
  record: StoredRecord,
  held: readonly StoredRecord[],
  random: Random,
  novelty: Novelty,
): Record<string, unknown> {
  if (kind === 'delete') return { deleted: record.fields.deleted !== true };
  if (kind === 'publish') return { publishedAt: 1_700_000_000_000 };
  if (kind === 'move') {
    return { siteId: random.pick(held.filter(({ type }) => type === 'site')).id, remarks: novelty.text() };
  }
  const fields = TEXT_FIELDS[record.type]!;
  return { [random.chance(0.5) ? fields[0]! : random.pick(fields)]: novelty.text() };
}
