import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { isWritableType, WRITABLE_TYPES } from '@harkmoor/sync-model/records/record-types';
import { isStamp } from '@harkmoor/sync-model/stamp/stamp';
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
 * Reads such a file into the open log. All or nothing: a file with one broken record changes nothing. A record that
 * is on the phone already is left as it is.
 */
export async function readInUnsentFile(log: OpenLog, text: string): Promise<ReadIn> {
  const file = parseFile(text);
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
    ownerId: accountId,
    clubId: clubIds.has(record.clubId) ? record.clubId : log.myLogId,
  }));
  return addAbsent(log, records);
}

async function addAbsent(log: OpenLog, records: readonly StoredRecord[]): Promise<ReadIn> {
  let added = 0;
  await log.database.transaction(
    'rw',
    WRITABLE_TYPES.map((type) => log.database.recordTable(type)),
    async () => {
      for (const record of records) {
        const table = log.database.recordTable(record.type);
        if (await table.get([record.clubId, record.id])) continue;
        await table.add(record as never);
        added += 1;
      }
    },
  );
  return { kind: 'read', added, known: records.length - added };
}

function parseFile(text: string): UnsentFile | string {
  let file: Partial<UnsentFile>;
  try {
    file = JSON.parse(text) as Partial<UnsentFile>;
  } catch {
    return 'This is not a whole file of unsent records: it cannot be read as JSON.';
  }
  if (file?.format !== FORMAT) return 'This is not a file of unsent records.';
  if (file.version !== FORMAT_VERSION)
    return 'This file was made by a newer version. Update the application first.';
  const records: unknown = file.records;
  if (!Array.isArray(records)) return 'This file holds no list of records.';
  const broken = records.findIndex((record) => !isStoredRecord(record));
  if (broken >= 0) return `Record ${broken + 1} of the file is broken; nothing was read in.`;
  return file as UnsentFile;
}

function isStoredRecord(value: unknown): value is StoredRecord {
  const record = value as Partial<StoredRecord> | null;
  return (
    typeof record === 'object' &&
    record !== null &&
    typeof record.type === 'string' &&
    isWritableType(record.type) &&
    typeof record.id === 'string' &&
    typeof record.clubId === 'string' &&
    isStamp(record.at) &&
    typeof record.fields === 'object' &&
    typeof record.debt?.since === 'number'
  );
}
