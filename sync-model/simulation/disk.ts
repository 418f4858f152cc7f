import type { ClubState, RecordKey, Store, StoreTransaction } from '../src/device/ports.js';
import type { StoredRecord } from '../src/device/stored-record.js';
import type { Life, Steps } from './scheduler.js';

/** What survives a crash of a phone: only what was committed. */
export type DiskState = {
  readonly clubs: ReadonlyMap<string, ClubState>;
  readonly records: ReadonlyMap<string, StoredRecord>;
  readonly settings: ReadonlyMap<string, unknown>;
};

/** Who commits: a person's act, or the sync engine. */
export type Writer = 'person' | 'engine';

export type CommitWatcher = (before: DiskState, after: DiskState, writer: Writer) => void;

export type Disk = { state: DiskState; readonly onCommit: CommitWatcher };

export function emptyDisk(onCommit: CommitWatcher): Disk {
  return { state: { clubs: new Map(), records: new Map(), settings: new Map() }, onCommit };
}

export function keyOf({ clubId, type, id }: RecordKey): string {
  return `${clubId}/${type}/${id}`;
}

/**
 * A phone's store in memory, for one life of the phone: atomic transactions, one after another, each call a
 * step of the scheduler. A crash leaves what was committed.
 */
export class MemoryStores {
  private queue: Promise<unknown> = Promise.resolve();

  constructor(
    private readonly disk: Disk,
    private readonly life: Life,
    private readonly scheduler: Steps,
  ) {}

  for(writer: Writer): Store {
    return { transaction: (work) => this.inTurn(() => this.transact(work, writer)) };
  }

  private inTurn<T>(work: () => Promise<T>): Promise<T> {
    const turn = this.queue.then(work);
    this.queue = turn.catch(() => undefined);
    return turn;
  }

  private async transact<T>(work: (tx: StoreTransaction) => Promise<T>, writer: Writer): Promise<T> {
    await this.scheduler.step(this.life, 'store begin');
    const before = this.disk.state;
    const draft = {
      clubs: new Map(before.clubs),
      records: new Map(before.records),
      settings: new Map(before.settings),
    };
    const result = await work(this.transactionOn(draft));
    await this.scheduler.step(this.life, 'store commit');
    this.disk.state = draft;
    this.disk.onCommit(before, draft, writer);
    return result;
  }

  private transactionOn(draft: {
    clubs: Map<string, ClubState>;
    records: Map<string, StoredRecord>;
    settings: Map<string, unknown>;
  }): StoreTransaction {
    const step = (label: string) => this.scheduler.step(this.life, `store ${label}`);
    return {
      clubs: async () => {
        await step('clubs');
        return [...draft.clubs.values()];
      },
      putClub: async (club) => {
        await step('putClub');
        draft.clubs.set(club.clubId, club);
      },
      removeClub: async (clubId) => {
        await step('removeClub');
        draft.clubs.delete(clubId);
        for (const [key, record] of draft.records) if (record.clubId === clubId) draft.records.delete(key);
      },
      records: async (keys) => {
        await step('records');
        return keys.map((key) => draft.records.get(keyOf(key)));
      },
      putRecords: async (records) => {
        await step('putRecords');
        for (const record of records) draft.records.set(keyOf(record), record);
      },
      owed: async (clubId) => {
        await step('owed');
        return [...draft.records.values()]
          .filter((record) => record.clubId === clubId && record.debt)
          .sort((a, b) => a.debt!.since - b.debt!.since);
      },
      setting: async <T>(name: string) => draft.settings.get(name) as T | undefined,
      putSetting: async (name, value) => {
        await step('putSetting');
        draft.settings.set(name, value);
      },
    };
  }
}
