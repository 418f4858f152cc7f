import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { WRITABLE_TYPES } from '@harkmoor/sync-model/records/record-types';
import { withUnsent } from '@harkmoor/sync-model/device/unsent-record';
import type { OpenLog } from '../../../store/open-log';
import { readOwed } from '../../../store/owed';

/** What an unsent-records file says of itself; read again by this application alone. */
const FORMAT = 'harkmoor-unsent';
const FORMAT_VERSION = 1;

type UnsentFile = {
  format: typeof FORMAT;
  version: number;
  accountId: string | null;
  madeAt: number;
  records: StoredRecord[];
};

/** The last resort: everything that is only here, as a file that this application reads in again. */
export async function unsentFile(
  log: OpenLog,
  madeAt: number,
): Promise<{ name: string; text: string; count: number }> {
  const records = await readOwed(log.database);
  const file: UnsentFile = {
    format: FORMAT,
    version: FORMAT_VERSION,
    accountId: log.account?.id ?? null,
    madeAt,
    records,
  };
  const day = new Date(madeAt).toISOString().slice(0, 10);
  return { name: `harkmoor-unsent-${day}.json`, text: JSON.stringify(file, null, 1), count: records.length };
}

export type ReadIn = { kind: 'read'; added: number; known: number } | { kind: 'refused'; message: string };

/**
 * Reads such a file into the open log. All or nothing: a file with one broken record changes nothing. What the phone
 * holds already keeps its later values and takes over those that were not sent.
 */
export async function readInUnsentFile(log: OpenLog, text: string): Promise<ReadIn> {
  const { wholeRecord } = await import('./unsent-schema');
  const file = parseFile(text, wholeRecord);
  if (typeof file === 'string') return { kind: 'refused', message: file };
  const accountId = log.account?.id ?? null;
  if (file.accountId !== null && file.accountId !== accountId) {
    return {
      kind: 'refused',
      message: 'This file belongs to another account. Sign in with that account, then read it in.',
    };
  }
  const clubIds = new Set((await log.database.clubs.toArray()).map((club) => club.clubId));
  const records = file.records.map((record) => ({
    ...record,
    // what the server never had becomes the reader's own; what it has keeps the owner that it told
    ownerId: record.seq === 0 ? accountId : record.ownerId,
    clubId: clubIds.has(record.clubId) ? record.clubId : log.myLogId,
  }));
  return takeIn(log, records);
}

async function takeIn(log: OpenLog, records: readonly StoredRecord[]): Promise<ReadIn> {
  let added = 0;
  await log.database.transaction(
    'rw',
    WRITABLE_TYPES.map((type) => log.database.recordTable(type)),
    async () => {
      for (const record of records) {
        const table = log.database.recordTable(record.type);
        const known = (await table.get([record.clubId, record.id])) as StoredRecord | undefined;
        const next = known ? withUnsent(known, record) : record;
        if (next === known) continue;
        await table.put(next as never);
        added += 1;
      }
    },
  );
  return { kind: 'read', added, known: records.length - added };
}

type ReadFile = { readonly accountId: string | null; readonly records: readonly StoredRecord[] };

function parseFile(text: string, wholeRecord: (value: unknown) => StoredRecord | null): ReadFile | string {
  let file: Partial<UnsentFile> | null;
  try {
    file = JSON.parse(text) as Partial<UnsentFile> | null;
  } catch {
    return 'This is not a whole file of unsent records: it cannot be read as JSON.';
  }
  if (file?.format !== FORMAT) return 'This is not a file of unsent records.';
  if (file.version !== FORMAT_VERSION)
    return 'This file was made by a newer version. Update the application first.';
  const { records: listed, accountId } = file as { records?: unknown; accountId?: unknown };
  if (!Array.isArray(listed)) return 'This file holds no list of records.';
  const records: StoredRecord[] = [];
  for (const value of listed) {
    const record = wholeRecord(value);
    if (!record) return `Record ${records.length + 1} of the file is broken; nothing was read in.`;
    records.push(record);
  }
  return { accountId: typeof accountId === 'string' ? accountId : null, records };
}
