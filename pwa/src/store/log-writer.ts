import { editedRecord, newRecord } from '@harkmoor/sync-model/device/local-edit';
import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import type { FieldsByType } from '@harkmoor/sync-model/records/schemas';
import { WRITABLE_TYPES, type WritableType } from '@harkmoor/sync-model/records/record-types';
import { createStamper } from '@harkmoor/sync-model/stamp/device-clock';
import { v7 as uuidv7 } from 'uuid';
import type { HarkmoorDatabase } from './database';

type WritableFields<T extends WritableType> = FieldsByType[T];

/** One step of a write; all steps of one `apply` are stored together or not at all. */
export type WriteStep = {
  [T in WritableType]:
    | { kind: 'create'; type: T; fields: WritableFields<T>; id?: string; clubId?: string }
    | { kind: 'edit'; type: T; id: string; patch: Partial<WritableFields<T>>; clubId?: string };
}[WritableType];

/** The only way in which a screen changes a record: stamped, owed to the server, durable when it resolves. */
export type LogWriter = {
  newId(): string;
  create<T extends WritableType>(
    type: T,
    fields: WritableFields<T>,
    place?: { id?: string; clubId?: string },
  ): Promise<StoredRecord<T>>;
  /** Throws where the record is not on this phone: a screen edits only what it shows. */
  edit<T extends WritableType>(
    type: T,
    id: string,
    patch: Partial<WritableFields<T>>,
    place?: { clubId?: string },
  ): Promise<StoredRecord<T>>;
  apply(steps: readonly WriteStep[]): Promise<StoredRecord[]>;
  /** Called after each durable write; returns the way to stop. */
  onWrite(listener: () => void): () => void;
};

type WriterOptions = {
  database: HarkmoorDatabase;
  deviceId: string;
  ownerId: string | null;
  clubId: () => string;
  deviceNowMs: () => number;
  clockOffsetMs: () => number;
};

export function createLogWriter(options: WriterOptions): LogWriter {
  const { database, deviceId, ownerId, deviceNowMs } = options;
  const stamper = createStamper({ deviceId, nowMs: () => deviceNowMs() + options.clockOffsetMs() });
  const listeners = new Set<() => void>();
  const newId = () => uuidv7({ msecs: deviceNowMs() });

  async function applyStep(step: WriteStep): Promise<StoredRecord> {
    const clubId = step.clubId ?? options.clubId();
    const table = database.recordTable(step.type);
    if (step.kind === 'create') {
      const id = step.id ?? newId();
      const made = { clubId, type: step.type, id, ownerId, fields: step.fields, deviceNowMs: deviceNowMs() };
      const record = newRecord(
        made as Parameters<typeof newRecord<WritableType>>[0],
        stamper,
      ) as StoredRecord;
      await table.add(record as never);
      return record;
    }
    const current = (await table.get([clubId, step.id])) as StoredRecord<WritableType> | undefined;
    if (!current) throw new Error(`no ${step.type} ${step.id} on this phone`);
    const record = editedRecord(current, step.patch as never, deviceNowMs(), stamper) as StoredRecord;
    if (record !== (current as StoredRecord)) await table.put(record as never);
    return record;
  }

  /** A form may outlive its club: what it wrote then would be sent to nobody and seen by nobody. */
  async function mustHoldClubs(steps: readonly WriteStep[]): Promise<void> {
    for (const clubId of new Set(steps.map((step) => step.clubId ?? options.clubId()))) {
      if (!(await database.clubs.get(clubId))) throw new Error('this club is no longer on this phone');
    }
  }

  async function apply(steps: readonly WriteStep[]): Promise<StoredRecord[]> {
    const types = WRITABLE_TYPES.filter((type) => steps.some((step) => step.type === type));
    const tables = types.map((type) => database.recordTable(type));
    const records = await database.transaction('rw', [...tables, database.clubs], async () => {
      await mustHoldClubs(steps);
      const written: StoredRecord[] = [];
      for (const step of steps) written.push(await applyStep(step));
      return written;
    });
    for (const listener of listeners) listener();
    return records;
  }

  return {
    newId,
    apply,
    create: async (type, fields, place) => {
      const [record] = await apply([{ kind: 'create', type, fields, ...place } as WriteStep]);
      return record as never;
    },
    edit: async (type, id, patch, place) => {
      const [record] = await apply([{ kind: 'edit', type, id, patch, ...place } as WriteStep]);
      return record as never;
    },
    onWrite: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}
